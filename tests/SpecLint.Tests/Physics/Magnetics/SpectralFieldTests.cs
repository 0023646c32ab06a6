using CsCheck;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;
using SpecLint.Tests.Physics.Electrical;

namespace SpecLint.Tests.Physics.Magnetics;

public sealed class SpectralFieldTests
{
    private const string Seed = "0000000000001";

    /// <summary>Sane machines of every stack, magnet and coil: numbers drawn relative to the pole pitch.</summary>
    private static readonly Gen<Machine> Machines =
        from polePairs in Gen.Int[2, 14]
        from radius in Gen.Double[0.04, 0.25]
        from shape in Gen.Enum<MagnetShape>()
        from coil in Gen.Enum<CoilShape>()
        from opposite in Gen.Enum<OppositeSide>()
        from steel in Gen.Bool
        from u in Gen.Double[0.0, 1.0].Array[6]
        select Machine.Draw(polePairs, radius, (shape, coil), (opposite, steel), u);

    public static TheoryData<OppositeSide, CoilShape> Combinations => new()
    {
        { OppositeSide.Magnets, CoilShape.Round },
        { OppositeSide.Plate, CoilShape.Keystone },
        { OppositeSide.Open, CoilShape.Rectangle },
    };

    [Theory]
    [MemberData(nameof(Combinations))]
    public void FluxLinkage_AgreesWithDirectImageSum(OppositeSide opposite, CoilShape shape)
    {
        MagnetRow magnets = MagnetRow.AxialBlock(3, 0.06, 0.03, 0.028);
        CoilOutline coil = shape switch
        {
            CoilShape.Round => Coils.Round(0.062, 0.008, 0.022),
            CoilShape.Keystone => Coils.Keystone(0.061, 0.028, 0.02, 0.012),
            _ => Coils.Rectangle(0.059, 0.028, 0.02, 0.012),
        };
        MagneticLayers layers = Layers(opposite, 0.012);
        CoilLayer layer = new() { MidHeight = 0.006, Thickness = 0.008 };

        double spectral = Field(magnets, coil, layers, layer).IdealFluxLinkage(1.0).Fundamental;

        Assert.Equal(1.0, spectral / DirectSum.Fundamental(magnets, layers, coil, layer), 1e-3);
    }

    [Theory]
    [InlineData(OppositeSide.Magnets)]
    [InlineData(OppositeSide.Plate)]
    [InlineData(OppositeSide.Open)]
    public void ImageField_AgreesWithDirectImageSum(OppositeSide opposite)
    {
        MagnetRow magnets = MagnetRow.AxialBlock(4, 0.08, 0.035, 0.03);
        MagneticLayers layers = Layers(opposite, 0.011);
        ImageField image = new(magnets, layers);

        foreach ((double x, double y, double z) in new[] { (0.08, 0.0, 0.0003), (0.07, 0.012, 0.004), (0.1, 0.02, 0.009) })
        {
            double expected = DirectSum.NormalField(magnets, layers, x, y, z);
            Assert.Equal(expected, image.NormalFluxDensity(x, y, z, 1.0), 2e-6);
        }
    }

    [Fact]
    public void FluxLinkage_GridRefined_StaysWithinErrorEstimate() => Machines.Sample(
        m =>
        {
            WaveNumberGrid grid = WaveNumberGrid.For(m.Magnets, m.Coil);
            FluxLinkageHarmonics coarse = m.FieldOn(grid).IdealFluxLinkage(1.0);
            FluxLinkageHarmonics fine = m.FieldOn(grid.Refined()).IdealFluxLinkage(1.0);
            for (int j = 0; j < FluxLinkageHarmonics.Count; j++)
            {
                if (!(Math.Abs(coarse.Amplitudes[j] - fine.Amplitudes[j]) <= coarse.NumericalError + fine.NumericalError))
                {
                    return false;
                }
            }

            return coarse.NumericalError < 1e-5 * m.Scale;
        },
        seed: Seed,
        iter: 30,
        threads: 1);

    [Fact]
    public void Results_LengthsScaled_FollowDimensions() => Machines.Sample(
        m =>
        {
            const double S = 1.7;
            SpectralField field = m.FieldOn(WaveNumberGrid.For(m.Magnets, m.Coil));
            Machine big = m.Scaled(S);
            SpectralField scaled = big.FieldOn(WaveNumberGrid.For(big.Magnets, big.Coil));
            double force = m.Layers.Opposite == OppositeSide.Open ? 1.0 : scaled.IdealAttractionForce(1.2) / field.IdealAttractionForce(1.2) / (S * S);
            return Near(1.0, scaled.IdealFluxLinkage(1.2).Fundamental / field.IdealFluxLinkage(1.2).Fundamental / (S * S), 1e-5)
                && Near(1.0, force, 1e-5)
                && Near(1.0, scaled.MeanDemagnetisingFactor / field.MeanDemagnetisingFactor, 1e-3)
                && Near(1.0, scaled.CoilWeightedDemagnetisingFactor / field.CoilWeightedDemagnetisingFactor, 1e-3)
                && Near(1.0, new PoleCentreField(scaled).At(m.Layer.MidHeight * S, 1.0) / new PoleCentreField(field).At(m.Layer.MidHeight, 1.0), 1e-4);
        },
        seed: Seed,
        iter: 20,
        threads: 1);

    [Fact]
    public void Results_RemanenceScaled_FollowDimensions()
    {
        ReferenceCase c = ReferenceCase.Load("G1-03-sector-keystone");
        SpectralField field = c.Field(c.SteelStack(1.05));

        Assert.Equal(2.0, field.FluxLinkage(1.2).Fundamental / field.FluxLinkage(0.6).Fundamental, 1e-12);
        Assert.Equal(4.0, field.AttractionForce(1.2) / field.AttractionForce(0.6), 1e-12);
    }

    [Fact]
    public void Results_GapWidened_Fall() => Machines.Sample(
        m =>
        {
            if (m.Layers.Opposite == OppositeSide.Open)
            {
                return true;
            }

            SpectralField near = m.FieldOn(WaveNumberGrid.For(m.Magnets, m.Coil));
            SpectralField far = new(near.Magnets, near.Coil, m.Layers with { Gap = 1.3 * m.Layers.Gap }, m.Layer);
            return far.IdealFluxLinkage(1.0).Fundamental < near.IdealFluxLinkage(1.0).Fundamental
                && far.IdealAttractionForce(1.0) < near.IdealAttractionForce(1.0)
                && far.MeanDemagnetisingFactor > near.MeanDemagnetisingFactor;
        },
        seed: Seed,
        iter: 20,
        threads: 1);

    [Fact]
    public void Plate_MovedFarAway_IsOpenStack()
    {
        MagnetRow magnets = MagnetRow.AxialBlock(6, 0.11, 0.04, 0.025);
        CoilOutline coil = Coils.Round(0.11, 0.01, 0.027);
        CoilLayer layer = new() { MidHeight = 0.006, Thickness = 0.009 };
        SpectralField open = Field(magnets, coil, Layers(OppositeSide.Open, 0.0), layer);
        SpectralField plate = Field(magnets, coil, Layers(OppositeSide.Plate, 0.3), layer);

        Assert.Equal(1.0, plate.IdealFluxLinkage(1.0).Fundamental / open.IdealFluxLinkage(1.0).Fundamental, 1e-6);
        Assert.InRange(plate.IdealAttractionForce(1.0), 0.0, 1e-3);
    }

    [Fact]
    public void FacingMagnets_EqualHalfGapPlate_InEveryHarmonic()
    {
        // The plane midway between facing magnets is an equipotential.
        MagnetRow magnets = MagnetRow.AxialDisc(4, 0.0925, 0.045);
        CoilOutline coil = Coils.Round(0.0925, 0.014, 0.033);
        CoilLayer layer = new() { MidHeight = 0.004, Thickness = 0.005 };
        double[] twin = [.. Field(magnets, coil, Layers(OppositeSide.Magnets, 0.016), layer).IdealFluxLinkage(1.0).Amplitudes];
        double[] plate = [.. Field(magnets, coil, Layers(OppositeSide.Plate, 0.008), layer).IdealFluxLinkage(1.0).Amplitudes];

        for (int j = 0; j < twin.Length; j++)
        {
            Assert.Equal(twin[j] / twin[0], plate[j] / twin[0], 1e-12);
        }
    }

    [Fact]
    public void CoilWeightedFactor_TinyRecoil_IsDerivativeOfFiniteElementLinkage()
    {
        // Finite elements, recoil 1.05 over recoil 1 on the same mesh: the mesh error cancels, so the correction alone is tested.
        foreach (Xunit.ITheoryDataRow row in ReferenceCase.AxialIds)
        {
            ReferenceCase c = ReferenceCase.Load((string)row.GetData()[0]!);
            double expected = c.Linkage("finite_steel_mu_recoil_1p05_fe")[0] / c.Linkage("finite_steel_mu_recoil_1_fe")[0];
            Assert.Equal(expected, c.Field(c.IdealStack(1.05)).RecoilFactor, 2e-4);
        }
    }

    [Fact]
    public void Constructor_ForeignGrid_Throws()
    {
        MagnetRow magnets = MagnetRow.AxialDisc(4, 0.0925, 0.045);
        CoilOutline coil = Coils.Round(0.0925, 0.014, 0.033);
        CoilOutline wide = Coils.Round(0.0925, 0.014, 0.06);
        MagnetTransform m = new(magnets, WaveNumberGrid.For(magnets, coil));
        CoilTransform c = new(wide, WaveNumberGrid.For(magnets, wide));

        Assert.Throws<ArgumentException>(() => new SpectralField(m, c, Layers(OppositeSide.Magnets, 0.015), new CoilLayer { MidHeight = 0.0075, Thickness = 0.01 }));
        Assert.Throws<ArgumentException>(() => new MagnetTransform(magnets with { Outline = magnets.Outline with { Length = -1.0 } }, m.Grid));
    }

    private static bool Near(double expected, double actual, double tolerance) => Math.Abs(expected - actual) <= tolerance;

    private static MagneticLayers Layers(OppositeSide opposite, double gap) => new()
    {
        MagnetThickness = 0.01,
        RecoilPermeability = 1.0,
        Gap = gap,
        Opposite = opposite,
        Behind = SteelPlate.Ideal,
        OppositePlate = opposite == OppositeSide.Plate ? SteelPlate.Ideal : SteelPlate.None,
    };

    private static SpectralField Field(in MagnetRow magnets, in CoilOutline coil, in MagneticLayers layers, in CoilLayer layer)
    {
        WaveNumberGrid grid = WaveNumberGrid.For(magnets, coil);
        return new SpectralField(new MagnetTransform(magnets, grid), new CoilTransform(coil, grid), layers, layer);
    }

    /// <summary>A random machine.</summary>
    private sealed record Machine(MagnetRow Magnets, CoilOutline Coil, MagneticLayers Layers, CoilLayer Layer)
    {
        public double Scale => FieldOn(WaveNumberGrid.For(Magnets, Coil)).Magnets.Row.FaceArea;

        public static Machine Draw(
            int polePairs, double radius, (MagnetShape Magnet, CoilShape Coil) shapes, (OppositeSide Opposite, bool Steel) sides, double[] u)
        {
            double pitch = Math.PI * radius / polePairs;
            double length = Math.Min(pitch * (0.6 + u[0]), radius);
            double width = pitch * (0.45 + (0.4 * u[1]));
            MagnetRow magnets = shapes.Magnet switch
            {
                MagnetShape.Block => MagnetRow.AxialBlock(polePairs, radius, length, width),
                MagnetShape.Disc => MagnetRow.AxialDisc(polePairs, radius, width),
                _ => MagnetRow.AxialSector(polePairs, radius - (0.5 * length), radius + (0.5 * length), 0.5 + (0.4 * u[1])),
            };
            double leg = pitch * (0.2 + (0.2 * u[2]));
            CoilOutline coil = shapes.Coil switch
            {
                CoilShape.Round => Coils.Round(radius, 0.3 * pitch, (0.3 * pitch) + leg),
                CoilShape.Keystone => Coils.Keystone(radius, 0.8 * length, 0.95 * pitch, leg),
                _ => Coils.Rectangle(radius, length, 0.6 * pitch, leg),
            };
            double gap = pitch * (0.2 + (0.3 * u[3]));
            CoilLayer layer = new() { MidHeight = 0.5 * gap, Thickness = gap * (0.6 + (0.25 * u[4])) };
            MagneticLayers layers = new()
            {
                MagnetThickness = pitch * (0.1 + (0.2 * u[5])),
                RecoilPermeability = 1.0,
                Gap = gap,
                Opposite = sides.Opposite,
                Behind = sides.Steel ? SteelPlate.Ideal : SteelPlate.None,
                OppositePlate = sides.Opposite == OppositeSide.Plate ? SteelPlate.Ideal : SteelPlate.None,
            };
            return new Machine(magnets, coil, layers, layer);
        }

        public SpectralField FieldOn(WaveNumberGrid grid) =>
            new(new MagnetTransform(Magnets, grid), new CoilTransform(Coil, grid), Layers, Layer);

        public Machine Scaled(double s) => new(
            Magnets with
            {
                Outline = Magnets.Outline with { PitchRadius = Magnets.PitchRadius * s, Length = Magnets.Length * s, Width = Magnets.Width * s },
            },
            CoilSelfInductanceTests.Scaled(Coil, s),
            Layers with { MagnetThickness = Layers.MagnetThickness * s, Gap = Layers.Gap * s },
            new CoilLayer { MidHeight = Layer.MidHeight * s, Thickness = Layer.Thickness * s });
    }
}
