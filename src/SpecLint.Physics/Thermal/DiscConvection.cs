namespace SpecLint.Physics.Thermal;

/// <summary>Convection from rotating discs, free and facing a stator.</summary>
/// <seealso>E.C. Cobb, O.A. Saunders, Proc. Royal Society A 236, 1956 (free disc); J. Boutarfa, S. Harmand, Experiments in Fluids 38, 2005, 209 (rotor facing stator); D.A. Howey, P.R.N. Childs, A.S. Holmes, IEEE Trans. Industrial Electronics 59(3), 2012, 1367 (review). Constants from memory.</seealso>
public static class DiscConvection
{
    /// <summary>Rotational Reynolds number where a free disc's flow turns turbulent.</summary>
    public const double TransitionReynolds = 2.4e5;

    private const double LeastReynolds = 2e4;
    private const double MostReynolds = 1.8e5;
    private const double NarrowGap = 0.01;
    private const double MiddleGap = 0.02;
    private const double WideGap = 0.06;

    /// <summary>Rotational Reynolds number.</summary>
    /// <param name="speed">Mechanical angular speed [rad/s], >= 0.</param>
    /// <param name="radius">Outer radius [m], > 0.</param>
    /// <param name="fluid">Fluid.</param>
    /// <returns>omega R²/nu.</returns>
    public static double Reynolds(double speed, double radius, FluidProperties fluid) => speed * radius * radius / fluid.KinematicViscosity;

    /// <summary>Mean coefficient of a disc turning in free air.</summary>
    /// <param name="speed">Mechanical angular speed [rad/s], > 0.</param>
    /// <param name="radius">Outer radius [m], > 0.</param>
    /// <param name="fluid">Fluid.</param>
    /// <returns>Laminar Nu = 0.36 Re^0.5; beyond the transition Nu = 0.015 Re^0.8 - 100 Re_c/Re (laminar core; from memory, medium).</returns>
    public static HeatTransfer Free(double speed, double radius, FluidProperties fluid)
    {
        double reynolds = Reynolds(speed, radius, fluid);
        double nusselt = reynolds <= TransitionReynolds
            ? 0.36 * Math.Sqrt(reynolds)
            : 0.015 * Math.Pow(reynolds, 0.8) - 100.0 * TransitionReynolds / reynolds;
        return new HeatTransfer(nusselt * fluid.ThermalConductivity / radius, nusselt, CorrelationRange.Inside, 0.2);
    }

    /// <summary>Mean coefficient on a stator face swept by a rotor.</summary>
    /// <param name="speed">Mechanical angular speed [rad/s], > 0.</param>
    /// <param name="radius">Outer radius [m], > 0.</param>
    /// <param name="gap">Axial gap between rotor and stator [m], > 0.</param>
    /// <param name="fluid">Fluid.</param>
    /// <returns>
    /// Nusselt by gap ratio G = gap/R: 7.46 Re^0.32 at 0.01, 0.5 (1 + 5.47e-4 exp(112 G)) Re^0.5 from 0.02 to 0.06, 0.55 (1 + 0.462 exp(-13 G/3)) Re^0.5 above;
    /// straight between 0.01 and 0.02. Under 0.01 the lesser bound: conduction 1/G, or the value at 0.01 if that is larger.
    /// </returns>
    /// <remarks>
    /// Measured for Re 2e4 to 1.8e5; the range tells when the case lies outside in Reynolds number or gap. The usual 1 mm on 150 mm radius is below the range of
    /// gaps. Air that turns round in a closed gap warms, so heat to a hot rotor face meets less than this coefficient suggests.
    /// </remarks>
    public static HeatTransfer FacingStator(double speed, double radius, double gap, FluidProperties fluid)
    {
        double reynolds = Reynolds(speed, radius, fluid);
        double ratio = gap / radius;
        double nusselt = Math.Max(ByGap(ratio, reynolds), 1.0 / ratio);
        CorrelationRange range = reynolds > MostReynolds ? CorrelationRange.Above
            : reynolds < LeastReynolds || ratio < NarrowGap ? CorrelationRange.Below
            : CorrelationRange.Inside;
        return new HeatTransfer(nusselt * fluid.ThermalConductivity / radius, nusselt, range, 0.3);
    }

    private static double ByGap(double ratio, double reynolds)
    {
        double narrow = 7.46 * Math.Pow(reynolds, 0.32);
        if (ratio <= NarrowGap)
        {
            return narrow;
        }

        if (ratio < MiddleGap)
        {
            double share = (ratio - NarrowGap) / (MiddleGap - NarrowGap);
            return (1.0 - share) * narrow + share * Middle(MiddleGap, reynolds);
        }

        return ratio <= WideGap
            ? Middle(ratio, reynolds)
            : 0.55 * (1.0 + 0.462 * Math.Exp(-13.0 * ratio / 3.0)) * Math.Sqrt(reynolds);
    }

    private static double Middle(double ratio, double reynolds) =>
        0.5 * (1.0 + 5.47e-4 * Math.Exp(112.0 * ratio)) * Math.Sqrt(reynolds);
}
