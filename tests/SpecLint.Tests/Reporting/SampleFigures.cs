using SpecLint.Review.Figures;
using SpecLint.Spec.Units;

namespace SpecLint.Tests.Reporting;

/// <summary>A catalogue of a few figures with every kind of outcome, chained through a part.</summary>
internal static class SampleFigures
{
    public static readonly Dimension Metre = new(1, 0, 0, 0, 0);
    public static readonly Dimension Tesla = new(0, 1, -2, -1, 0);
    public static readonly Dimension Weber = new(2, 1, -2, -1, 0);
    public static readonly Dimension Volt = new(2, 1, -3, -1, 0);
    public static readonly Dimension Hertz = new(0, 0, -1, 0, 0);
    public static readonly Dimension Kelvin = new(0, 0, 0, 0, 1);

    private static readonly PartDefinition<string> Transform = new("field.transform", e => double.IsNaN(e.Number("magnets.width")) ? null : "transform");

    public static FigureCatalogue Catalogue() => new([
        new FigureDefinition
        {
            Name = "gap.magnetic", UnitOfMeasure = new FigureUnit("m", "mm", Metre), Meaning = "magnet face to opposite magnet face",
            Formula = "{winding.coil.thickness} + 2 · {gap.clearance}", Basis = new Basis(BasisKind.Derived, "sum of the stack"),
            Compute = e => e.Value(e.Number("winding.coil.thickness") + (2 * e.Number("gap.clearance")), 0.2e-3),
        },
        new FigureDefinition
        {
            Name = "field.mid-coil.fundamental", UnitOfMeasure = new FigureUnit("T", "T", Tesla), Meaning = "fundamental of the field at the coil's middle",
            Formula = "harmonic solution between iron planes", Basis = new Basis(BasisKind.Published, "a textbook of field computation, chapter 3"), MethodUncertainty = 0.01,
            Compute = e => e.Part(Transform) is null ? e.Stop() : e.Value(0.41 * e.Number("magnets.remanence") * (0.016 / e.Figure("gap.magnetic"))),
        },
        new FigureDefinition
        {
            Name = "coil.hole.extent", UnitOfMeasure = new FigureUnit("m", "mm", Metre), Meaning = "width of the hole along the motion",
            Formula = "{winding.coil.hole-width}", Basis = new Basis(BasisKind.Derived, "geometry"),
            Compute = e => e.Value(e.Number("winding.coil.hole-width")),
        },
        new FigureDefinition
        {
            Name = "linkage.coil.fundamental", UnitOfMeasure = new FigureUnit("Wb", "mWb", Weber), Meaning = "peak fundamental flux linkage of one coil",
            Formula = "{winding.turns} · {field.mid-coil.fundamental} · {coil.hole.extent}²", Basis = new Basis(BasisKind.Derived, "definition of linkage"),
            Compute = e => e.Value(e.Number("winding.turns") * e.Figure("field.mid-coil.fundamental") * Math.Pow(e.Figure("coil.hole.extent"), 2)),
        },
        new FigureDefinition
        {
            Name = "frequency", UnitOfMeasure = new FigureUnit("Hz", "Hz", Hertz), Meaning = "electrical frequency at rated speed",
            Formula = "{machine.poles} / 2 · {ratings.speed} / 2π", Basis = new Basis(BasisKind.Derived, "definition"),
            Compute = e => e.Value(e.Count("machine.poles") / 2.0 * e.Number("ratings.speed") / (2 * Math.PI)),
        },
        new FigureDefinition
        {
            Name = "emf.phase.rms", UnitOfMeasure = new FigureUnit("V", "V", Volt), Meaning = "phase voltage, rated speed, open circuit",
            Formula = "√2 · π · {frequency} · {linkage.coil.fundamental} · {winding.coils} / 3", Basis = new Basis(BasisKind.Derived, "induction law"),
            Compute = e => e.Value(Math.Sqrt(2) * Math.PI * e.Figure("frequency") * e.Figure("linkage.coil.fundamental") * e.Count("winding.coils") / 3),
        },
        new FigureDefinition
        {
            Name = "ambient.temperature", UnitOfMeasure = new FigureUnit("K", "°C", Kelvin), Meaning = "air round the machine",
            Formula = "{environment.ambient}", Basis = new Basis(BasisKind.Standard, "IEC 60034-1:2022, clause 6.4"),
            Compute = e => e.Optional("environment.ambient") is { } stated ? e.Value(stated, 0) : e.Assume(313.15, "40 °C is usual where no ambient is stated"),
        },
        new FigureDefinition
        {
            Name = "temperature.winding.mean", UnitOfMeasure = new FigureUnit("K", "°C", Kelvin), Meaning = "mean winding temperature at the rating", IsCoarse = true,
            Formula = "{ambient.temperature} + rise of the thermal network", Basis = new Basis(BasisKind.Derived, "lumped network"),
            Compute = e => e.Value(e.Figure("ambient.temperature") + 71.4, 21),
        },
        new FigureDefinition
        {
            Name = "current.phase.rms", UnitOfMeasure = new FigureUnit("A", "A", new Dimension(0, 0, 0, 1, 0)), Meaning = "phase current at the rating",
            Formula = "{ratings.power} / (3 · {emf.phase.rms})", Basis = new Basis(BasisKind.Derived, "power balance"),
            Compute = e => e.Value(e.Number("ratings.power") / (3 * e.Figure("emf.phase.rms"))),
        },
        new FigureDefinition
        {
            Name = "flux-density.tooth", UnitOfMeasure = new FigureUnit("T", "T", Tesla), Meaning = "field in the teeth",
            Formula = "flux of a slot pitch through a tooth", Basis = new Basis(BasisKind.Derived, "continuity of flux"),
            Compute = e => e.NotApplicable("a coreless stator has no teeth"),
        },
        new FigureDefinition
        {
            Name = "speed.charging", UnitOfMeasure = new FigureUnit("rad/s", "rpm", Hertz), Meaning = "where charging begins",
            Formula = "speed at which the line voltage reaches the load", Basis = new Basis(BasisKind.Derived, "rectifier conduction"),
            Compute = e => e.OutOfDomain("the load voltage is never reached"),
        },
    ]);
}
