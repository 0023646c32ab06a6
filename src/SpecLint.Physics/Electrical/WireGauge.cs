namespace SpecLint.Physics.Electrical;

/// <summary>American wire gauge and sections of round wire.</summary>
public static class WireGauge
{
    private const double AnchorDiameter = 127e-6;

    /// <summary>Bare diameter of an American wire gauge number.</summary>
    /// <param name="number">Gauge number; 0, -1, -2, -3 for 0, 00, 000, 0000.</param>
    /// <returns>[m]: 0.127 mm times 92^((36 - n)/39).</returns>
    /// <seealso>ASTM B258, Standard Specification for Standard Nominal Diameters and Cross-Sectional Areas of AWG Sizes of Solid Round Wires.</seealso>
    public static double DiameterOfAwg(int number) => AnchorDiameter * Math.Pow(92.0, (36 - number) / 39.0);

    /// <summary>Section of a round wire.</summary>
    /// <param name="diameter">Diameter [m], >= 0.</param>
    /// <returns>[m²].</returns>
    public static double Section(double diameter) => 0.25 * Math.PI * diameter * diameter;
}
