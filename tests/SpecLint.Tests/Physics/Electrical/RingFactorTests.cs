using MathNet.Numerics;
using SpecLint.Physics.Electrical;
using SpecLint.Physics.Geometry;

namespace SpecLint.Tests.Physics.Electrical;

/// <summary>The ring's Bessel functions through what is public: the dipole field of two distant thin rings and a thin ring's self term.</summary>
public sealed class RingFactorTests
{
    // Mutual inductance of two thin rings by the spectral integral with library Bessel functions, between planes so that it converges fast.
    [Theory]
    [InlineData(0.05)]
    [InlineData(0.09)]
    [InlineData(0.30)]
    public void Row_RingsBetweenPlanes_MatchLibraryBessel(double distance)
    {
        const double inner = 0.010;
        const double outer = 0.020;
        const double thickness = 0.010;
        var planes = new IronPlanes(0.002, 0.003);
        CoilOutline coil = CoilOutline.Round(inner, outer, thickness, 0.0);
        double Integrand(double k)
        {
            double mean = Integrate.GaussLegendre(r => r * SpecialFunctions.BesselJ(1, k * r), inner, outer, 32) / (outer - inner);
            double transform = 2.0 * Math.PI * mean / k;
            return k * transform * transform * SpecialFunctions.BesselJ(0, k * distance) * CoilLayerResponse.Of(k, thickness, planes);
        }

        double expected = 0.0;
        for (int panel = 0; panel < 60; panel++)
        {
            expected += Integrate.GaussLegendre(Integrand, 20.0 * panel + 1e-9, 20.0 * (panel + 1), 16);
        }

        CoilInductances row = CoilMutualInductance.Row(coil, 1.0, planes, new CoilRow(2, distance));

        Assert.Equal(2e-7 * expected, row.BySeparation[1], 5e-5 * row.Self);
    }

    private static class Integrate
    {
        public static double GaussLegendre(Func<double, double> f, double from, double to, int order) =>
            MathNet.Numerics.Integration.GaussLegendreRule.Integrate(f, from, to, order);
    }
}
