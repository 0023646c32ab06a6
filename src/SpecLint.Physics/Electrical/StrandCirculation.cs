namespace SpecLint.Physics.Electrical;

/// <summary>Loss of currents that circulate between strands in hand which are not transposed.</summary>
public static class StrandCirculation
{
    /// <summary>Circulating loss of one coil.</summary>
    /// <param name="bundle">Strands.</param>
    /// <param name="electricalSpeed">Angular frequency of the fundamental [rad/s], >= 0.</param>
    /// <param name="fieldPeak">Fundamental of the normal field at the legs [T], peak.</param>
    /// <param name="electricalSpan">Electrical angle between leg centres [rad].</param>
    /// <returns>[W], for the worst order: every turn laid with the same strand innermost, strands joined at the coil's ends.</returns>
    /// <remarks>
    /// Moving a turn outward by x on both legs changes its linkage by 2 l B cos(span/2) x, so strand j sees the EMF difference
    /// omega N 2 l B cos(span/2) x_j, x_j from the middle; each drives its own current through its own resistance, their leakage
    /// inductance left out. With n strands s apart the sum of x_j² is s² n (n² - 1)/12. A coil of full pitch has none from the
    /// fundamental. Strands that wander as hand winding lays them circulate less, so this is an upper estimate, by a factor of 2 and more;
    /// joining strands only at the phase's ends leaves it unchanged when all coils are laid alike.
    /// </remarks>
    /// <seealso>Derived; the effect is described by R.-J. Wang, M.J. Kamper, Calculation of eddy current loss in axial field permanent-magnet machine with coreless stator, IEEE Trans. Energy Conversion 19(3), 2004 (from a summary).</seealso>
    public static double LossOfCoil(in StrandBundle bundle, double electricalSpeed, double fieldPeak, double electricalSpan)
    {
        double gradient = 2.0 * bundle.Turns * bundle.LegLength * fieldPeak * Math.Cos(0.5 * electricalSpan);
        double n = bundle.Strands;
        double spread = bundle.StrandPitch * bundle.StrandPitch * n * (n * n - 1.0) / 12.0;
        double emf = electricalSpeed * gradient;
        return 0.5 * emf * emf * spread / bundle.StrandResistance;
    }
}
