namespace SpecLint.Physics.Electrical;

/// <summary>Eddy-current loss in round strands that lie across an alternating field.</summary>
/// <seealso>C.R. Sullivan, Optimal choice for number of strands in a litz-wire transformer winding, IEEE Trans. Power Electronics 14(2), 1999, appendix (constant from memory, re-derived).</seealso>
public static class StrandEddyLoss
{
    /// <summary>Loss per volume of metal.</summary>
    /// <param name="electricalSpeed">Angular frequency of the fundamental [rad/s], >= 0.</param>
    /// <param name="weightedSquare">Sum over orders of (n B_n)², both components across the wire, peak values [T²], >= 0; its mean over the wire's length where the field varies.</param>
    /// <param name="diameter">Bare strand diameter [m], > 0.</param>
    /// <param name="resistivity">[ohm m], > 0.</param>
    /// <returns>[W/m³]: omega² (sum) d²/(32 rho).</returns>
    /// <remarks>
    /// Low-frequency limit: the strand does not shield itself; judge by <see cref="DiameterOverSkinDepth"/>. From a sheet of width dy at distance y from the
    /// strand's axis, E = omega B y, mean of y² = d²/16, half of E²/rho. The loss falls as 1/rho when the wire warms. Published
    /// comparisons put the simple formula up to 40 % off in machines, mostly because the field is not known.
    /// </remarks>
    public static double PerVolume(double electricalSpeed, double weightedSquare, double diameter, double resistivity) =>
        electricalSpeed * electricalSpeed * weightedSquare * diameter * diameter / (32.0 * resistivity);

    /// <summary>Loss per length of one strand.</summary>
    /// <param name="electricalSpeed">Angular frequency of the fundamental [rad/s], >= 0.</param>
    /// <param name="weightedSquare">Sum over orders of (n B_n)², peak values [T²], >= 0.</param>
    /// <param name="diameter">Bare strand diameter [m], > 0.</param>
    /// <param name="resistivity">[ohm m], > 0.</param>
    /// <returns>[W/m]: pi omega² (sum) d⁴/(128 rho).</returns>
    public static double PerLength(double electricalSpeed, double weightedSquare, double diameter, double resistivity) =>
        WireGauge.Section(diameter) * PerVolume(electricalSpeed, weightedSquare, diameter, resistivity);

    /// <summary>Strand diameter that would halve the loss at the same copper section.</summary>
    /// <param name="diameter">Present bare diameter [m].</param>
    /// <returns>[m]: d/sqrt(2); twice as many strands.</returns>
    public static double HalvingDiameter(double diameter) => diameter * Math.Sqrt(0.5);

    /// <summary>Validity figure of the low-frequency limit.</summary>
    /// <param name="diameter">Bare diameter [m].</param>
    /// <param name="skinDepth">Skin depth at the highest order that matters [m], > 0.</param>
    /// <returns>Diameter over skin depth; up to 1 the limit overstates the loss by less than 1 %, at 2 by about a tenth.</returns>
    /// <remarks>Next term of the Bessel series: factor 1 - (11/96)(r/delta)⁴ with r the radius (derived from the loss of a cylinder, proportional to Im(J2/J0) of (1 - j) r/delta).</remarks>
    public static double DiameterOverSkinDepth(double diameter, double skinDepth) => diameter / skinDepth;
}
