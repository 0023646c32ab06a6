using System.Collections.Immutable;
using System.Globalization;
using SpecLint.Physics.Windings;
using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>The winding's layout and connection, shared by the figures.</summary>
internal static class WindingParts
{
    /// <summary>Which coil belongs to which phase.</summary>
    public static PartDefinition<WindingLayout> Layout { get; } = new("star of coil axes", ReadLayout);

    /// <summary>Parallel paths as listed, or shared out evenly.</summary>
    public static PartDefinition<WindingPaths> Paths { get; } = new("paths of the winding", ReadPaths);

    /// <summary>Parallel paths of each phase: stated, from the list of paths, or one.</summary>
    /// <param name="x">The evaluation.</param>
    public static int ParallelPaths(Evaluation x)
    {
        if (x.Optional("winding.parallel-paths") is { } stated)
        {
            return Math.Max(1, (int)stated);
        }

        int phases = x.Count("machine.phases");
        int listed = x.Find("winding.paths")?.Count ?? 0;
        return phases > 0 && listed >= phases ? listed / phases : 1;
    }

    private static WindingLayout? ReadLayout(Evaluation x)
    {
        double pairs = x.Figure("machine.pole-pairs");
        int coils = x.Count("winding.coils");
        int phases = x.Count("machine.phases");
        return x.Incomplete || phases < 1 || coils < phases ? null : StarOfSlots.EquallySpaced(coils, (int)pairs, phases);
    }

    private static WindingPaths? ReadPaths(Evaluation x)
    {
        int parallel = ParallelPaths(x);
        WindingLayout? layout = x.Part(Layout);
        int listed = x.Find("winding.paths")?.Count ?? 0;
        if (layout is null)
        {
            return null;
        }

        WindingPaths? paths;
        if (listed > 0)
        {
            return PathConnection.TryListed(layout, ListedPaths(x, listed), out paths) ? paths : null;
        }

        return PathConnection.TryRegular(layout, parallel, out paths) ? paths : null;
    }

    private static ImmutableArray<ImmutableArray<int>> ListedPaths(Evaluation x, int count)
    {
        var paths = ImmutableArray.CreateBuilder<ImmutableArray<int>>(count);
        for (int path = 0; path < count; path++)
        {
            string key = string.Create(CultureInfo.InvariantCulture, $"winding.paths[{path}]");
            int coils = x.Find(key)?.Count ?? 0;
            var numbers = ImmutableArray.CreateBuilder<int>(coils);
            for (int coil = 0; coil < coils; coil++)
            {
                numbers.Add(x.Count(string.Create(CultureInfo.InvariantCulture, $"{key}[{coil}]")));
            }

            paths.Add(numbers.MoveToImmutable());
        }

        return paths.MoveToImmutable();
    }
}
