using System.Globalization;
using System.Text;
using SpecLint.Review.Catalogue;
using SpecLint.Review.Figures;
using SpecLint.Spec.Documents;

namespace SpecLint.Tests.Review.Catalogue;

/// <summary>Machines written as specs and read as any other, so that a test judges what the program says of them.</summary>
internal static class Machines
{
    /// <summary>The figures of a spec's text; the text must be without fault.</summary>
    public static FigureGraph Figures(string text)
    {
        SpecDocument spec = SpecReader.Read("machine.yaml", Encoding.UTF8.GetBytes(text));
        Assert.True(spec.Faults.IsEmpty, string.Join("; ", spec.Faults.Select(f => f.Message)));
        return new FigureGraph(spec, OurFigures.Catalogue);
    }

    /// <summary>The figures of a spec under <c>Specs</c>.</summary>
    public static FigureGraph FiguresOf(string file) => Figures(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Specs", file)));

    /// <summary>A figure's value; it must have one.</summary>
    public static double Value(this FigureGraph figures, string name)
    {
        Outcome outcome = figures[name].Outcome;
        Assert.True(outcome.HasValue, $"{name}: {outcome.Kind} {outcome.Reason} {string.Join(", ", outcome.MissingKeys)}");
        return outcome.Value;
    }

    /// <summary>Asserts that a figure lies within a relative tolerance.</summary>
    public static void Near(double expected, double actual, double relative) =>
        Assert.True(
            Math.Abs(actual - expected) <= relative * Math.Abs(expected),
            string.Create(CultureInfo.InvariantCulture, $"{actual:G9} is {(actual / expected) - 1:P4} from {expected:G9}; {relative:P4} is allowed"));

    /// <summary>A length as a spec states it.</summary>
    public static string Millimetres(double metres) => string.Create(CultureInfo.InvariantCulture, $"{metres * 1e3:0.#########} mm");

    /// <summary>Text with numbers in the invariant culture.</summary>
    public static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
