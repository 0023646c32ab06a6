namespace SpecLint.Physics.Electrical;

/// <summary>Thickness-mean flux density that a uniformly wound layer raises in itself, wave number by wave number.</summary>
public static class CoilLayerResponse
{
    /// <summary>Response of a coil layer between iron planes.</summary>
    /// <param name="waveNumber">Wave number in the plane [1/m], > 0.</param>
    /// <param name="thickness">Thickness of the layer [m], > 0.</param>
    /// <param name="planes">Iron planes.</param>
    /// <returns>
    /// G [1/m]: mean normal flux density over the thickness is mu0 N I G W^(k). k/2 for a thin or long-waved layer in air,
    /// 1/(distance of the planes) for long waves between two planes, 1/thickness for short waves.
    /// </returns>
    /// <remarks>
    /// The layer equals a slab magnetised N I W/t. Its face charges, at heights a and b over the lower plane, sit
    /// between planes of zero potential D apart with g(z, z') = sinh(k z) sinh(k(D - z'))/(k sinh(k D)), z below z';
    /// then t G = 1 - (g(a,a) + g(b,b) - 2 g(a,b))/t. Written in decaying exponentials, so any k and infinite distances are safe.
    /// </remarks>
    /// <seealso>W.G. Hurley, M.C. Duffy, Calculation of self and mutual impedances in planar magnetic structures, IEEE Trans. Magn. 31(4), 1995, 2416-2422 (spectral form for coils on magnetic substrates; pages from memory).</seealso>
    public static double Of(double waveNumber, double thickness, IronPlanes planes)
    {
        double k = waveNumber;
        double t = thickness;
        double below = Math.Exp(-2.0 * k * planes.Below);
        double above = Math.Exp(-2.0 * k * planes.Above);
        double through = Math.Exp(-k * t);
        double squared = through * through;
        double closed = 1.0 - below * above * squared;
        double lower = (1.0 - below) * (1.0 - above * squared);
        double upper = (1.0 - above) * (1.0 - below * squared);
        double cross = through * (1.0 - below) * (1.0 - above);
        double potential = 0.5 * (lower + upper - 2.0 * cross) / (k * closed);
        return (1.0 - potential / t) / t;
    }
}
