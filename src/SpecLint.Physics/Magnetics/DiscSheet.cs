namespace SpecLint.Physics.Magnetics;

/// <summary>Uniform charge on a disc.</summary>
/// <remarks>
/// The sheet's normal field is that of a half-infinite cylindrical magnet outside it: half the remanence over the face less the odd end term of
/// the finite solenoid.
/// </remarks>
/// <seealso>Derby N., Olbert S., Cylindrical magnets and ideal solenoids, Am. J. Phys. 78(3), 2010, 229-235, DOI 10.1119/1.3256157.</seealso>
internal sealed class DiscSheet : IChargeSheet
{
    private const double RimNudge = 1e-12;
    private readonly double _centre;
    private readonly double _radius;

    /// <summary>Describes the disc.</summary>
    /// <param name="centre">Position of its centre along x [m].</param>
    /// <param name="radius">Radius [m].</param>
    public DiscSheet(double centre, double radius)
    {
        _centre = centre;
        _radius = radius;
    }

    /// <inheritdoc/>
    public double SolidAngle(double x, double y, double z)
    {
        double rho = double.Hypot(x - _centre, y);
        double inside = rho < _radius ? 2.0 * Math.PI : 0.0;
        return inside - (4.0 * Math.PI * EndTerm(_radius, rho, Math.Abs(z)));
    }

    /// <inheritdoc/>
    public (double X, double Y) InPlane(double x, double y, double z)
    {
        double dx = x - _centre;
        double rho = double.Hypot(dx, y);
        if (!(rho > 0.0))
        {
            return (0.0, 0.0);
        }

        double scale = -4.0 * Math.PI * RadialTerm(_radius, rho, z) / rho;
        return (scale * dx, scale * y);
    }

    /// <summary>Normal flux density of one end of a cylindrical solenoid of unit surface polarisation.</summary>
    /// <param name="radius">Radius of the cylinder [m].</param>
    /// <param name="rho">Distance from its axis [m].</param>
    /// <param name="z">Height over its end [m].</param>
    /// <returns>Flux density over remanence [-], odd in the height.</returns>
    public static double EndTerm(double radius, double rho, double z)
    {
        double r = Math.Abs(rho - radius) < RimNudge * radius ? radius * (1.0 + RimNudge) : rho;
        double sum = radius + r;
        double gamma = (radius - r) / sum;
        double far = (z * z) + (sum * sum);
        double kc = Math.Sqrt(((z * z) + ((radius - r) * (radius - r))) / far);
        double beta = z / Math.Sqrt(far);
        return radius * beta * EllipticIntegral.Complete(kc, gamma * gamma, 1.0, gamma) / (Math.PI * sum);
    }

    /// <summary>Radial flux density of one end of a cylindrical solenoid of unit surface polarisation.</summary>
    /// <param name="radius">Radius of the cylinder [m].</param>
    /// <param name="rho">Distance from its axis [m].</param>
    /// <param name="z">Height over its end [m].</param>
    /// <returns>Flux density over remanence [-], even in the height; logarithmically infinite on the rim.</returns>
    public static double RadialTerm(double radius, double rho, double z)
    {
        double sum = radius + rho;
        double far = (z * z) + (sum * sum);
        double kc = Math.Sqrt(((z * z) + ((radius - rho) * (radius - rho))) / far);
        return radius / Math.Sqrt(far) * EllipticIntegral.Complete(kc, 1.0, 1.0, -1.0) / Math.PI;
    }
}
