using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;

namespace SpecLint.Tests.Physics.Magnetics;

public sealed class InstalledMagnetTests
{
    [Theory]
    [InlineData("G1-01-block-ring")]
    [InlineData("G2-01-block-ring")]
    [InlineData("G3-02-round-ring")]
    [InlineData("G4-02-nosteel-rect")]
    public void ExceededInOnePercent_AgreesWithFineSampling(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        ImageField image = new(c.Magnets, c.IdealStack(1.0));
        double h = c.IdealStack(1.0).MagnetThickness;
        bool bare = c.IdealStack(1.0).Behind.IsAbsent;
        List<(double Value, double Weight)> samples = [];
        const int Layers = 24;
        for (int q = 0; q < Layers; q++)
        {
            double s = (q + 0.5) / Layers;
            double depth = bare ? s * s * (3.0 - (2.0 * s)) : s * s;
            double weight = bare ? 6.0 * s * (1.0 - s) : 2.0 * s;
            foreach ((double x, double y) in Face(c.Magnets, 12))
            {
                double value = image.OpposingField(x, y, -h * depth);
                samples.Add((value, weight));
            }
        }

        double total = samples.Sum(v => v.Weight);
        double above = 0.0;
        double quantile = samples.OrderByDescending(v => v.Value).First(v => (above += v.Weight) > 0.01 * total).Value;
        DemagnetisingField actual = DemagnetisingField.Of(c.Magnets, c.IdealStack(1.0));

        Assert.Equal(c.Field(c.IdealStack(1.0)).MeanDemagnetisingFactor, actual.Mean, 0.003 * actual.Mean);
        Assert.Equal(quantile, actual.ExceededInOnePercent, 0.01);
        Assert.True(actual.ExceededInOnePercent > actual.Mean);
    }

    [Theory]
    [InlineData("G1-05-block-rect")]
    [InlineData("G2-03-sector-keystone")]
    [InlineData("G4-01-steel-rect")]
    public void WindingField_Legs_AgreesWithFourierAnalysisOfImageField(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        WindingFieldSquares legs = new WindingField(c.Field(c.IdealStack(1.0))).Legs(1.0);
        ImageField image = new(c.Magnets, c.IdealStack(1.0));
        double normal = 0.0;
        double along = 0.0;
        double across = 0.0;
        const int Lengths = 12;
        const int Heights = 32;
        for (int i = 0; i < Lengths; i++)
        {
            double x = c.Coil.PitchRadius + (c.Coil.HoleLength * (((i + 0.5) / Lengths) - 0.5));
            double aside = c.Coil.Shape == CoilShape.Keystone ? x * Math.Tan(CoilGeometry.LegHalfAngle(c.Coil)) : 0.5 * (c.Coil.HoleWidth + c.Coil.LegWidth);
            double place = c.IsLinear ? x : double.Hypot(x, aside);
            for (int j = 0; j < Heights; j++)
            {
                double z = c.Layer.MidHeight + (c.Layer.Thickness * (((j + 0.5) / Heights) - 0.5));
                (double n, double t, double r) = Squares(image, c.Magnets, place, z);
                normal += n / (Lengths * Heights);
                along += t / (Lengths * Heights);
                across += r / (Lengths * Heights);
            }
        }

        Assert.Equal(1.0, legs.Normal / normal, 0.01);
        Assert.Equal(1.0, legs.AlongMotion / along, 0.015);
        Assert.Equal(1.0, legs.AcrossMotion / across, 0.10);
        Assert.InRange(legs.AcrossWire, legs.Normal, legs.Normal + legs.AlongMotion + legs.AcrossMotion);
    }

    [Fact]
    public void NormalFundamental_AgreesWithFourierAnalysisOfImageField()
    {
        ReferenceCase c = ReferenceCase.Load("G1-01-block-ring");
        ImageField image = new(c.Magnets, c.IdealStack(1.0));
        double fundamental = 0.0;
        const int Steps = 96;
        for (int i = 0; i < Steps; i++)
        {
            double electrical = Math.PI * (i + 0.5) / Steps;
            (double sine, double cosine) = Math.SinCos(electrical / c.Magnets.PolePairs);
            double r = c.Magnets.PitchRadius;
            fundamental += 2.0 / Steps * Math.Cos(electrical) * image.NormalFluxDensity(r * cosine, r * sine, 0.0085, c.Remanence);
        }

        double actual = new WindingField(c.Field(c.IdealStack(1.0))).NormalFundamental(c.Magnets.PitchRadius, 0.0085, c.Remanence);

        Assert.Equal(1.0, actual / fundamental, 5e-4);
    }

    [Theory]
    [InlineData("G1-01-block-ring")]
    [InlineData("G2-03-sector-keystone")]
    [InlineData("G4-02-nosteel-rect")]
    public void PoleFlux_ThroughPlane_AgreesWithQuadratureOfImageField(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        ImageField image = new(c.Magnets, c.IdealStack(1.0));
        double height = c.Layer.MidHeight;
        double flux = 0.0;
        const int Across = 80;
        const int Along = 16;
        for (int i = 0; i < Across; i++)
        {
            for (int j = 0; j < Along; j++)
            {
                double share = (j + 0.5) / Along;
                if (c.IsLinear)
                {
                    double depth = 8.0 * c.Magnets.Length;
                    double x = depth * (((i + 0.5) / Across) - 0.5);
                    double b = image.NormalFluxDensity(x, 0.5 * c.Magnets.PolePitch * share, height, 1.0);
                    flux += b * depth * c.Magnets.PolePitch / (Across * Along);
                }
                else
                {
                    double outer = 2.2 * c.Magnets.Reach;
                    double r = outer * (i + 0.5) / Across;
                    double half = Math.PI / (2.0 * c.Magnets.PolePairs);
                    double b = image.NormalFluxDensity(r * Math.Cos(half * share), r * Math.Sin(half * share), height, 1.0);
                    flux += 2.0 * b * r * half * outer / (Across * Along);
                }
            }
        }

        Assert.Equal(1.0, new PoleFlux(c.Field(c.IdealStack(1.0))).ThroughPlane(height, 1.0) / flux, 2e-3);
    }

    [Fact]
    public void ThroughWinding_ThreeTenthsOfMillimetreClearance_IsDirectImageSum()
    {
        MagnetRow magnets = MagnetRow.AxialBlock(6, 0.12, 0.046, 0.03);
        CoilOutline coil = Coils.Round(0.12, 0.012, 0.032);
        WaveNumberGrid grid = WaveNumberGrid.For(magnets, coil);
        MagneticLayers layers = new()
        {
            MagnetThickness = 0.01,
            RecoilPermeability = 1.0,
            Gap = 0.0136,
            Opposite = OppositeSide.Plate,
            Behind = SteelPlate.Ideal,
            OppositePlate = SteelPlate.Ideal,
        };
        CoilLayer layer = new() { MidHeight = 0.0068, Thickness = 0.013 };
        SpectralField field = new(new MagnetTransform(magnets, grid), new CoilTransform(coil, grid), layers, layer);

        (double lowest, double highest) = new PoleCentreField(field).ThroughWinding(1.3);

        Assert.Equal(1.3 * DirectSum.NormalField(magnets, layers, 0.12, 0.0, 0.0003), highest, 1e-4);
        Assert.InRange(lowest, 0.1, highest);
        Assert.InRange(field.IdealFluxLinkage(1.0).NumericalError / field.IdealFluxLinkage(1.0).Fundamental, 0.0, 1e-5);
    }

    private static IEnumerable<(double X, double Y)> Face(MagnetRow g, int steps)
    {
        for (int i = 0; i < steps; i++)
        {
            for (int j = 0; j < steps; j++)
            {
                double u = (i + 0.5) / steps;
                double v = (j + 0.5) / steps;
                double rho = 0.5 * g.Length * Math.Sqrt(u);
                yield return g.Shape == MagnetShape.Disc
                    ? (g.PitchRadius + (rho * Math.Cos(Math.PI * v)), rho * Math.Sin(Math.PI * v))
                    : (g.PitchRadius + (g.Length * (u - 0.5)), 0.5 * g.Width * v);
            }
        }
    }

    /// <summary>Fourier analysis of the image field along a quarter of the electrical period.</summary>
    private static (double Normal, double Along, double Across) Squares(ImageField image, MagnetRow g, double place, double z)
    {
        const int Steps = 40;
        const int Harmonics = 16;
        double[] bz = new double[Harmonics];
        double[] bt = new double[Harmonics];
        double[] br = new double[Harmonics];
        for (int i = 0; i < Steps; i++)
        {
            double electrical = 0.5 * Math.PI * (i + 0.5) / Steps;
            double turn = g.IsLinear ? 0.0 : electrical / g.PolePairs;
            (double sine, double cosine) = Math.SinCos(turn);
            (double hx, double hy, double hz) = g.IsLinear
                ? image.FieldStrength(place, electrical * g.PolePitch / Math.PI, z)
                : image.FieldStrength(place * cosine, place * sine, z);
            for (int j = 0; j < Harmonics; j++)
            {
                double n = (2 * j) + 1;
                double even = 2.0 / Steps * Math.Cos(n * electrical);
                bz[j] += even * hz;
                br[j] += even * ((hx * cosine) + (hy * sine));
                bt[j] += 2.0 / Steps * Math.Sin(n * electrical) * ((hy * cosine) - (hx * sine));
            }
        }

        return (Weighted(bz), Weighted(bt), Weighted(br));
    }

    private static double Weighted(double[] amplitudes)
    {
        double sum = 0.0;
        for (int j = 0; j < amplitudes.Length; j++)
        {
            sum += Math.Pow(((2 * j) + 1) * amplitudes[j], 2.0);
        }

        return sum;
    }
}
