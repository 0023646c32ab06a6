namespace SpecLint.Physics.Thermal;

/// <summary>Effective thermal conductivity of wire in resin, across the wires.</summary>
public static class WindingConductivity
{
    /// <summary>Typical conductivity of unfilled casting resin [W/(m K)], from memory (0.17 to 0.25).</summary>
    public const double UnfilledResin = 0.2;

    /// <summary>Conductivity of parallel round wires in a binder.</summary>
    /// <param name="fill">Copper area over cross-section, in [0, 1).</param>
    /// <param name="wireConductivity">Wire [W/(m K)], > 0.</param>
    /// <param name="binderConductivity">Resin and enamel [W/(m K)], > 0.</param>
    /// <returns>[W/(m K)]: k_b ((1 + f) k_w + (1 - f) k_b)/((1 - f) k_w + (1 + f) k_b).</returns>
    /// <remarks>Lower Hashin-Shtrikman bound in two dimensions, equal to Rayleigh's first approximation: wires do not touch. Without voids in the resin; hand-cast coils hold some, so expect up to 30 % less.</remarks>
    /// <seealso>Z. Hashin, S. Shtrikman, J. Applied Physics 33, 1962, 3125; N. Simpson, R. Wrobel, P.H. Mellor, IEEE Trans. Industry Applications 49(6), 2013, 2505 (windings); both from memory, high.</seealso>
    public static double Across(double fill, double wireConductivity, double binderConductivity) =>
        binderConductivity * ((1.0 + fill) * wireConductivity + (1.0 - fill) * binderConductivity)
        / ((1.0 - fill) * wireConductivity + (1.0 + fill) * binderConductivity);
}
