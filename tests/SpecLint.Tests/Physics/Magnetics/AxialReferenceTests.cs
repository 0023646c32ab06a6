using System.Text.Json;
using SpecLint.Physics.Magnetics;

namespace SpecLint.Tests.Physics.Magnetics;

/// <summary>All axial machines of Reference/axial.json; limits are those promised for the kernels, not fitted to the cases.</summary>
public sealed class AxialReferenceTests
{
    private const string Ideal = "ideal_steel_mu_recoil_1";
    private const string Steel = "finite_steel_mu_recoil_1p05_fe";

    public static TheoryData<string> Ids => ReferenceCase.AxialIds;

    [Theory]
    [MemberData(nameof(Ids))]
    public void FluxLinkage_IdealSteel_AgreesWithImageMethod(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        double[] expected = c.Linkage(Ideal);

        FluxLinkageHarmonics psi = c.Field(c.IdealStack(1.0)).IdealFluxLinkage(c.Remanence);

        Assert.Equal(1.0, psi.Fundamental / expected[0], 2e-5);
        for (int j = 1; j < expected.Length; j++)
        {
            Assert.Equal(expected[j] / expected[0], psi.Harmonic((2 * j) + 1) / expected[0], 2e-5);
        }

        Assert.InRange(psi.NumericalError, 0.0, 1e-6 * expected[0]);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void FluxLinkage_UniformLayerBetweenSlabs_AgreesWithSpectralReference(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        double expected = c.Linkage("infinite_slab_steel_mu_recoil_1p05_uniform_layer")[0];
        MagneticLayers layers = c.SteelStack(1.05);

        double actual = c.Field(layers).FluxLinkageIn(layers).Fundamental * c.Remanence;

        Assert.Equal(1.0, actual / expected, 1e-5);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void FluxLinkage_RecoilInMagnetsOnly_AgreesWithFiniteElements(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        double expected = c.Linkage("ideal_steel_mu_recoil_1p05_magnets_only_fe")[0];

        double actual = c.Field(c.IdealStack(1.05)).FluxLinkage(c.Remanence).Fundamental;

        Assert.Equal(1.0, actual / expected, 1.5e-3);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void FluxLinkage_RealDiscs_AgreesWithFiniteElementsWithinHalfPercent(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        double expected = c.Linkage(Steel)[0];

        double actual = c.Field(c.SteelStack(1.05)).FluxLinkage(c.Remanence).Fundamental;

        Assert.Equal(1.0, actual / expected, 5e-3);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void AttractionForce_AgreesWithReferences(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        if (c.IsOpen)
        {
            Assert.True(double.IsNaN(c.Field(c.IdealStack(1.0)).IdealAttractionForce(c.Remanence)));
            return;
        }

        double ideal = c.Result(Ideal).GetProperty("axial_attraction_force_N").GetDouble();
        double steel = c.Result(Steel).GetProperty("axial_attraction_force_N").GetDouble();

        Assert.Equal(1.0, c.Field(c.IdealStack(1.0)).IdealAttractionForce(c.Remanence) / ideal, 2e-5);
        Assert.Equal(1.0, c.Field(c.SteelStack(1.05)).AttractionForce(c.Remanence) / steel, 1e-2);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void DemagnetisingFactor_AgreesWithReference(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        double expected = c.Spread.GetProperty("mean_self_demagnetisation_factor_N").GetDouble();
        SpectralField field = c.Field(c.IdealStack(1.0));

        Assert.Equal(1.0, field.MeanDemagnetisingFactor / expected, 5e-4);
        Assert.Equal((1.0 - expected) / expected, field.PermeanceCoefficient, 3e-3);
        Assert.Equal(1.0, DemagnetisingField.Of(c.Magnets, c.IdealStack(1.0)).Mean / expected, 5e-3);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void NormalFluxDensity_OverMagnetAndRound_AgreesWithReference(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        PoleCentreField centre = new(c.Field(c.IdealStack(1.0)));
        ImageField image = new(c.Magnets, c.IdealStack(1.0));
        JsonElement through = c.Result(Ideal).GetProperty("Bz_over_magnet_centre_through_coil_thickness_T");
        JsonElement round = c.Result(Ideal).GetProperty(c.IsOpen ? "Bz_at_coil_mid_plane_pitch_radius_T" : "Bz_at_mid_gap_pitch_radius_T");

        for (int i = 0; i < through.GetProperty("value").GetArrayLength(); i++)
        {
            double height = through.GetProperty("height_above_magnet_face_m")[i].GetDouble();
            Assert.Equal(1.0, centre.At(height, c.Remanence) / through.GetProperty("value")[i].GetDouble(), 2e-5);
        }

        for (int i = 0; i < round.GetProperty("value").GetArrayLength(); i++)
        {
            double angle = round.GetProperty("angle_from_magnet_centre_electrical_deg")[i].GetDouble() * Math.PI / (180.0 * c.Magnets.PolePairs);
            (double sine, double cosine) = Math.SinCos(angle);
            double r = c.Magnets.PitchRadius;
            double actual = image.NormalFluxDensity(r * cosine, r * sine, c.Layer.MidHeight, c.Remanence);
            Assert.Equal(round.GetProperty("value")[i].GetDouble(), actual, 1e-5);
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void PoleFlux_MeanOverAnnulus_AgreesWithReferences(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        string key = c.IsOpen
            ? "mean_Bz_at_coil_mid_plane_over_own_pole_of_magnet_annulus_T"
            : "mean_Bz_at_mid_gap_over_own_pole_of_magnet_annulus_T";
        PoleFlux ideal = new(c.Field(c.IdealStack(1.0)));
        PoleFlux steel = new(c.Field(c.SteelStack(1.05)));

        double expectedIdeal = c.Result(Ideal).GetProperty(key).GetDouble();
        double expectedSteel = c.Result(Steel).GetProperty(key).GetDouble();

        Assert.Equal(1.0, ideal.MeanOverAnnulus(ideal.ReferenceHeight, c.Remanence) / expectedIdeal, 2e-5);
        Assert.Equal(1.0, steel.MeanOverAnnulus(steel.ReferenceHeight, c.Remanence) / expectedSteel, 6e-3);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void PoleCentreField_RealDiscs_WithinOnePercentOfFiniteElements(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        string key = c.IsOpen ? "Bz_at_coil_mid_plane_over_magnet_centre_T" : "Bz_at_mid_gap_over_magnet_centre_T";
        double expected = c.Result(Steel).GetProperty(key).GetDouble();

        double actual = new PoleCentreField(c.Field(c.SteelStack(1.05))).At(c.Layer.MidHeight, c.Remanence);

        Assert.Equal(1.0, actual / expected, 1.2e-2);
    }

    [Fact]
    public void PlateFluxDensity_NamedDiscs_GivesStatedEstimates()
    {
        // The estimates named beside the saturation study of the reference notes: 1.07, 1.72 and 2.86 T for 8, 5 and 3 mm.
        ReferenceCase c = ReferenceCase.Load("G1-01-block-ring");
        PoleFlux flux = new(c.Field(c.SteelStack(1.05)));

        Assert.Equal(1.07, flux.PlateFluxDensity(0.008, c.Remanence), 0.01);
        Assert.Equal(1.72, flux.PlateFluxDensity(0.005, c.Remanence), 0.01);
        Assert.Equal(2.86, flux.PlateFluxDensity(0.003, c.Remanence), 0.01);
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void FluxLinkage_Derivative_GivesReferenceEmfPeakAndRms(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        FluxLinkageHarmonics psi = c.Field(c.IdealStack(1.0)).IdealFluxLinkage(c.Remanence);
        double p = c.Magnets.PolePairs;
        double sum = 0.0;
        double peak = 0.0;
        for (int n = 1; n <= 15; n += 2)
        {
            sum += 0.5 * Math.Pow(n * p * psi.Harmonic(n), 2.0);
        }

        for (int i = 0; i <= 3600; i++)
        {
            double emf = 0.0;
            for (int n = 1; n <= 15; n += 2)
            {
                emf += n * p * psi.Harmonic(n) * Math.Sin(n * i * Math.PI / 3600.0);
            }

            peak = Math.Max(peak, Math.Abs(emf));
        }

        Assert.Equal(1.0, Math.Sqrt(sum) / c.Result(Ideal).GetProperty("emf_per_turn_rms_V_per_mech_rad_per_s").GetDouble(), 5e-5);
        Assert.Equal(1.0, peak / c.Result(Ideal).GetProperty("emf_per_turn_peak_V_per_mech_rad_per_s").GetDouble(), 3e-3);
    }
}
