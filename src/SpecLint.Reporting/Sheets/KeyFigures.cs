using System.Collections.Immutable;
using SpecLint.Review.Figures;

namespace SpecLint.Reporting.Sheets;

/// <summary>The figures that a sheet shows, in groups.</summary>
internal static class KeyFigures
{
    private static readonly (string Group, string[] Names)[] Groups =
    [
        ("field", [
            "gap.magnetic", "magnet.surface-field.centre", "field.mid-coil.centre", "field.mid-coil.fundamental", "field.coil.lowest",
            "field.coil.highest", "flux.pole", "permeance.coefficient", "flux-density.back-iron", "flux-density.tooth", "flux-density.yoke"]),
        ("EMF", [
            "linkage.coil.fundamental", "emf.constant.phase", "emf.phase.rms", "emf.line.rms", "emf.line.peak", "emf.line.distortion",
            "frequency", "speed.charging", "voltage.overspeed.line-peak"]),
        ("winding", [
            "winding.factor-1", "fill.copper", "resistance.phase.cold", "resistance.phase.hot", "inductance.phase", "current.phase.rms",
            "current.density", "mass.copper"]),
        ("heat", [
            "loss.copper", "loss.winding-eddy", "loss.iron", "loss.bridge", "loss.mechanical", "efficiency.rating",
            "temperature.winding.mean", "temperature.winding.hot-spot", "temperature.magnet", "temperature.surface", "demagnetisation.margin"]),
        ("forces", [
            "force.attraction", "deflection.disc", "stress.magnet-retention", "stress.disc", "speed.burst", "mass.magnets"]),
    ];

    /// <summary>The groups with those of their figures that the catalogue has.</summary>
    /// <param name="graph">The machine.</param>
    public static IEnumerable<(string Group, ImmutableArray<Figure> Figures)> Of(FigureGraph graph) => Groups
        .Select(group => (group.Group, group.Names.Where(name => graph.Catalogue.Find(name) is not null).Select(name => graph[name]).ToImmutableArray()))
        .Where(group => !group.Item2.IsEmpty);

    /// <summary>The names of key figures with a value that a spec key moves, in the order of the groups.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="key">Dotted key.</param>
    public static IEnumerable<string> MovedBy(FigureGraph graph, string key) => Of(graph)
        .SelectMany(group => group.Figures)
        .Where(figure => figure.Outcome.HasValue && graph.KeysBehind(figure.Name).Contains(key))
        .Select(figure => figure.Name);

    /// <summary>The assumed defaults that given figures rest on, in ordinal order of their names.</summary>
    /// <param name="graph">The machine.</param>
    /// <param name="names">The figures.</param>
    public static IReadOnlyList<Figure> AssumedBehind(FigureGraph graph, IEnumerable<string> names)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        var assumed = new SortedDictionary<string, Figure>(StringComparer.Ordinal);
        var open = new Stack<FigureInput>(names.Where(n => graph.Catalogue.Find(n) is not null).Select(n => new FigureInput(FigureInputKind.Figure, n)));
        while (open.TryPop(out FigureInput input))
        {
            if (input.Kind == FigureInputKind.Key || !seen.Add(input.Name))
            {
                continue;
            }

            Figure? figure = input.Kind == FigureInputKind.Figure ? graph[input.Name] : null;
            if (figure is { Outcome.IsAssumed: true })
            {
                assumed[figure.Name] = figure;
            }

            foreach (FigureInput below in figure?.Inputs ?? graph.PartInputs(input.Name))
            {
                open.Push(below);
            }
        }

        return [.. assumed.Values];
    }
}
