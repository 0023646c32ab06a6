using SpecLint.Spec.Units;

namespace SpecLint.Review.Figures;

/// <summary>How a figure's value is written: its SI unit, the unit people read, and its dimension.</summary>
/// <param name="Si">SI unit in JSON output.</param>
/// <param name="Display">Unit in text output.</param>
/// <param name="Dimension">Exponents of the SI base units.</param>
public sealed record FigureUnit(string Si, string Display, Dimension Dimension)
{
    /// <summary>A pure number.</summary>
    public static FigureUnit Ratio { get; } = new("1", "", Dimension.None);

    /// <summary>A pure number shown in percent.</summary>
    public static FigureUnit Percent { get; } = new("1", "%", Dimension.None);

    /// <summary>A length shown in millimetres.</summary>
    public static FigureUnit Metre { get; } = new("m", "mm", new Dimension(1, 0, 0, 0, 0));

    /// <summary>A length shown in metres.</summary>
    public static FigureUnit Distance { get; } = new("m", "m", new Dimension(1, 0, 0, 0, 0));

    /// <summary>Unit of: area.</summary>
    public static FigureUnit Area { get; } = new("m²", "mm²", new Dimension(2, 0, 0, 0, 0));

    /// <summary>Unit of: tesla.</summary>
    public static FigureUnit Tesla { get; } = new("T", "T", new Dimension(0, 1, -2, -1, 0));

    /// <summary>Unit of: weber.</summary>
    public static FigureUnit Weber { get; } = new("Wb", "mWb", new Dimension(2, 1, -2, -1, 0));

    /// <summary>Unit of: field strength.</summary>
    public static FigureUnit FieldStrength { get; } = new("A/m", "kA/m", new Dimension(-1, 0, 0, 1, 0));

    /// <summary>Unit of: volt.</summary>
    public static FigureUnit Volt { get; } = new("V", "V", new Dimension(2, 1, -3, -1, 0));

    /// <summary>Unit of: emf constant rotary.</summary>
    public static FigureUnit EmfConstantRotary { get; } = new("V·s/rad", "V·s/rad", new Dimension(2, 1, -2, -1, 0));

    /// <summary>Unit of: emf constant linear.</summary>
    public static FigureUnit EmfConstantLinear { get; } = new("V·s/m", "V·s/m", new Dimension(1, 1, -2, -1, 0));

    /// <summary>Unit of: ohm.</summary>
    public static FigureUnit Ohm { get; } = new("Ω", "Ω", new Dimension(2, 1, -3, -2, 0));

    /// <summary>Unit of: henry.</summary>
    public static FigureUnit Henry { get; } = new("H", "mH", new Dimension(2, 1, -2, -2, 0));

    /// <summary>Unit of: ampere.</summary>
    public static FigureUnit Ampere { get; } = new("A", "A", new Dimension(0, 0, 0, 1, 0));

    /// <summary>Unit of: current density.</summary>
    public static FigureUnit CurrentDensity { get; } = new("A/m²", "A/mm²", new Dimension(-2, 0, 0, 1, 0));

    /// <summary>Unit of: watt.</summary>
    public static FigureUnit Watt { get; } = new("W", "W", new Dimension(2, 1, -3, 0, 0));

    /// <summary>Unit of: joule.</summary>
    public static FigureUnit Joule { get; } = new("J", "J", new Dimension(2, 1, -2, 0, 0));

    /// <summary>Unit of: newton metre.</summary>
    public static FigureUnit NewtonMetre { get; } = new("N·m", "N·m", new Dimension(2, 1, -2, 0, 0));

    /// <summary>Unit of: newton.</summary>
    public static FigureUnit Newton { get; } = new("N", "N", new Dimension(1, 1, -2, 0, 0));

    /// <summary>Unit of: kilogram.</summary>
    public static FigureUnit Kilogram { get; } = new("kg", "kg", new Dimension(0, 1, 0, 0, 0));

    /// <summary>Unit of: kelvin.</summary>
    public static FigureUnit Kelvin { get; } = new("K", "°C", new Dimension(0, 0, 0, 0, 1));

    /// <summary>Unit of: hertz.</summary>
    public static FigureUnit Hertz { get; } = new("Hz", "Hz", new Dimension(0, 0, -1, 0, 0));

    /// <summary>Unit of: angular speed.</summary>
    public static FigureUnit AngularSpeed { get; } = new("rad/s", "rpm", new Dimension(0, 0, -1, 0, 0));

    /// <summary>Unit of: velocity.</summary>
    public static FigureUnit Velocity { get; } = new("m/s", "m/s", new Dimension(1, 0, -1, 0, 0));

    /// <summary>Unit of: second.</summary>
    public static FigureUnit Second { get; } = new("s", "s", new Dimension(0, 0, 1, 0, 0));
}
