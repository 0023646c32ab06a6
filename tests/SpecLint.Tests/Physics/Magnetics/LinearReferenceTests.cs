using System.Text.Json;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;

namespace SpecLint.Tests.Physics.Magnetics;

public sealed class LinearReferenceTests
{
    private const string Ideal = "mu_recoil_1";

    public static TheoryData<string> Ids => ReferenceCase.LinearIds;

    [Theory]
    [MemberData(nameof(Ids))]
    public void FluxLinkage_UnitRecoil_AgreesWithReference(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        double[] expected = c.Linkage(Ideal);

        FluxLinkageHarmonics psi = c.Field(c.IdealStack(1.0)).IdealFluxLinkage(c.Remanence);

        for (int j = 0; j < expected.Length; j++)
        {
            Assert.Equal(expected[j] / expected[0], psi.Amplitudes[j] / expected[0], 2e-5);
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void FluxLinkage_UniformLayer_AgreesWithReference(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        MagneticLayers layers = c.IdealStack(1.05);

        double actual = c.Field(layers).FluxLinkageIn(layers).Fundamental * c.Remanence;

        Assert.Equal(1.0, actual / c.Linkage("mu_recoil_1p05_uniform_layer")[0], 2e-5);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void FluxLinkage_RecoilInMagnetsOnly_LiesBetweenUnitAndUniformLayer(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        SpectralField field = c.Field(c.IdealStack(1.05));

        double actual = field.FluxLinkage(c.Remanence).Fundamental;

        Assert.InRange(actual, c.Linkage("mu_recoil_1p05_uniform_layer")[0], c.Linkage(Ideal)[0]);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void NormalFluxDensity_OverMagnetAndAlong_AgreesWithReference(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        PoleCentreField centre = new(c.Field(c.IdealStack(1.0)));
        ImageField image = new(c.Magnets, c.IdealStack(1.0));
        JsonElement through = c.Result(Ideal).GetProperty("Bz_over_magnet_centre_through_coil_thickness_T");
        JsonElement along = c.Result(Ideal).GetProperty("Bz_at_coil_mid_plane_on_centre_line_T");

        for (int i = 0; i < through.GetProperty("value").GetArrayLength(); i++)
        {
            double height = through.GetProperty("height_above_magnet_face_m")[i].GetDouble();
            Assert.Equal(1.0, centre.At(height, c.Remanence) / through.GetProperty("value")[i].GetDouble(), 2e-5);
        }

        for (int i = 0; i < along.GetProperty("value").GetArrayLength(); i++)
        {
            double y = along.GetProperty("displacement_over_pole_pitch")[i].GetDouble() * c.Magnets.PolePitch;
            double actual = image.NormalFluxDensity(0.0, y, c.Layer.MidHeight, c.Remanence);
            Assert.Equal(along.GetProperty("value")[i].GetDouble(), actual, 1e-5);
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void PoleFlux_MeanOverPole_AgreesWithReference(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        PoleFlux flux = new(c.Field(c.IdealStack(1.0)));
        double expected = c.Result(Ideal).GetProperty("mean_abs_Bz_at_coil_mid_plane_over_pole_pitch_by_magnet_depth_T").GetDouble();

        Assert.Equal(1.0, flux.MeanOverAnnulus(c.Layer.MidHeight, c.Remanence) / expected, 1e-5);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void DemagnetisingFactor_SpectralAndSampled_Agree(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);

        double spectral = c.Field(c.IdealStack(1.0)).MeanDemagnetisingFactor;

        Assert.Equal(spectral, DemagnetisingField.Of(c.Magnets, c.IdealStack(1.0)).Mean, 1e-3 * spectral);
    }

    [Theory]
    [InlineData(0.018, 0.0, 0.5013)]
    [InlineData(0.016, 0.0, 0.5364)]
    [InlineData(0.016, 0.0065, 0.5627)]
    public void NormalFundamental_VeryLongMagnets_IsTwoDimensionalSolution(double gap, double fromMiddle, double expected)
    {
        // Bumby J.R., Martin R., IEE Proc. EPA 152(5), 2005: facing rotors, h 10 mm, tau 65.45 mm, width 30 mm, Br 1.25 T (printed to four digits).
        MagnetRow magnets = MagnetRow.LinearBlock(0.1250 * Math.PI / 6.0, 1.0, 0.030);
        CoilOutline coil = Coils.Rectangle(0.0, 0.03, 0.03, 0.015);
        WaveNumberGrid grid = WaveNumberGrid.For(magnets, coil);
        MagneticLayers layers = new()
        {
            MagnetThickness = 0.010, RecoilPermeability = 1.0, Gap = gap, Opposite = OppositeSide.Magnets, Behind = SteelPlate.Ideal,
        };
        CoilLayer layer = new() { MidHeight = 0.5 * gap, Thickness = 0.013 };
        SpectralField field = new(new MagnetTransform(magnets, grid), new CoilTransform(coil, grid), layers, layer);

        double actual = new WindingField(field).NormalFundamental(0.0, (0.5 * gap) + fromMiddle, 1.25);

        Assert.Equal(expected, actual, 2e-4);
    }

    [Fact]
    public void DemagnetisingFactor_LonelyCube_IsOneThird()
    {
        Assert.Equal(1.0 / 3.0, LonelyBlock(0.01, 0.01, 0.01), 5e-4);
    }

    [Fact]
    public void DemagnetisingFactor_LonelyBlockOverThreeAxes_SumsToOne()
    {
        // Any uniformly magnetised body: the trace of its magnetometric tensor is 1 (Aharoni A., J. Appl. Phys. 83, 1998, 3432-3434).
        double sum = LonelyBlock(0.02, 0.01, 0.006) + LonelyBlock(0.006, 0.02, 0.01) + LonelyBlock(0.01, 0.006, 0.02);

        Assert.Equal(1.0, sum, 2e-3);
    }

    private static double LonelyBlock(double length, double width, double thickness)
    {
        MagnetRow magnets = MagnetRow.LinearBlock(0.3, length, width);
        CoilOutline coil = Coils.Round(0.0, 0.002, 0.005);
        WaveNumberGrid grid = WaveNumberGrid.For(magnets, coil);
        MagneticLayers layers = new()
        {
            MagnetThickness = thickness, RecoilPermeability = 1.0, Opposite = OppositeSide.Open, Behind = SteelPlate.None,
        };
        CoilLayer layer = new() { MidHeight = 0.003, Thickness = 0.002 };
        return new SpectralField(new MagnetTransform(magnets, grid), new CoilTransform(coil, grid), layers, layer).MeanDemagnetisingFactor;
    }
}
