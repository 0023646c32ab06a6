namespace SpecLint.Physics.Magnetics;

/// <summary>Generalised complete elliptic integral.</summary>
internal static class EllipticIntegral
{
    private const double Tolerance = 1e-8;
    private const int StepCap = 40;

    /// <summary>Integral over 0 to pi/2 of (c cos^2 + s sin^2)/((cos^2 + p sin^2) sqrt(cos^2 + kc^2 sin^2)).</summary>
    /// <param name="kc">Complementary modulus [-], not zero.</param>
    /// <param name="p">Characteristic [-], > 0.</param>
    /// <param name="c">Weight of cos^2 [-].</param>
    /// <param name="s">Weight of sin^2 [-].</param>
    /// <returns>The integral [-], to about 1e-15; positive infinity or NaN where it diverges.</returns>
    /// <seealso>Bulirsch R., Numerical calculation of elliptic integrals and elliptic functions III, Numer. Math. 13, 1969, 305-315;
    /// used for magnets by Derby N., Olbert S., Am. J. Phys. 78(3), 2010, 229-235, DOI 10.1119/1.3256157.</seealso>
    public static double Complete(double kc, double p, double c, double s)
    {
        double k = Math.Abs(kc);
        double kk = k;
        double em = 1.0;
        double pp = Math.Sqrt(p);
        double cc = c;
        double ss = s / pp;
        for (int step = 0; step < StepCap; step++)
        {
            double f = cc;
            cc += ss / pp;
            double g = kk / pp;
            ss = 2.0 * (ss + (f * g));
            pp = g + pp;
            g = em;
            em = k + em;
            if (Math.Abs(g - k) <= g * Tolerance)
            {
                break;
            }

            k = 2.0 * Math.Sqrt(kk);
            kk = k * em;
        }

        return 0.5 * Math.PI * (ss + (cc * em)) / (em * (em + pp));
    }
}
