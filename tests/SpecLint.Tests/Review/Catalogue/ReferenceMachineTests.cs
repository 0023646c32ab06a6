using System.Text.Json;
using SpecLint.Review.Figures;
using SpecLint.Tests.Physics.Magnetics;

namespace SpecLint.Tests.Review.Catalogue;

/// <summary>
/// The machines of Reference/axial.json through the whole program, from spec text to figure. Their numbers come from magnetic
/// charges with images (ideal steel) and from three-dimensional finite elements (real discs).
/// </summary>
public sealed class ReferenceMachineTests
{
    private const string Steel = "finite_steel_mu_recoil_1p05_fe";
    private const string Saturable = "G1-01-block-ring";

    public static TheoryData<string> Axial => ReferenceCase.AxialIds;

    public static TheoryData<string> Every => [.. ReferenceCase.AxialIds.Select(r => r.Data), .. ReferenceCase.LinearIds.Select(r => r.Data)];

    /// <summary>Disc thickness [m] against the finite-element solution with a saturating steel.</summary>
    public static TheoryData<double, string> SaturatingDiscs => new()
    {
        { 8e-3, "finite_steel_saturating_8mm_disc_mu_recoil_1p05_fe" },
        { 5e-3, "finite_steel_saturating_5mm_disc_mu_recoil_1p05_fe" },
        { 3e-3, "finite_steel_saturating_3mm_disc_mu_recoil_1p05_fe" },
    };

    [Theory]
    [MemberData(nameof(Every))]
    public void Linkage_IdealSteel_FundamentalWithinOneInTenThousand(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);

        Machines.Near(c.Linkage(Ideal(c))[0], FiguresOf(c, ideal: true).Value("linkage.turn.fundamental"), 1e-4);
    }

    [Theory]
    [MemberData(nameof(Every))]
    public void Linkage_IdealSteel_SignedHarmonicsWithinFiveInTenThousandOfFundamental(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        double[] expected = c.Linkage(Ideal(c));
        FigureGraph figures = FiguresOf(c, ideal: true);

        for (int order = 3; order <= 15; order += 2)
        {
            Assert.Equal(expected[(order - 1) / 2] / expected[0], figures.Value($"linkage.turn.harmonic-{order}") / expected[0], 5e-4);
        }
    }

    [Theory]
    [MemberData(nameof(Axial))]
    public void Linkage_RealDiscs_WithinHalfAPercent(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);

        Machines.Near(c.Linkage(Steel)[0], FiguresOf(c, ideal: false).Value("linkage.turn.fundamental"), 5e-3);
    }

    [Theory]
    [MemberData(nameof(Axial))]
    public void Attraction_IdealSteelAndRealDiscs_WithinPromise(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        if (c.IsOpen)
        {
            Assert.Equal(OutcomeKind.NotApplicable, FiguresOf(c, ideal: true)["force.attraction"].Outcome.Kind);
            return;
        }

        Machines.Near(Force(c, Ideal(c)), FiguresOf(c, ideal: true).Value("force.attraction"), 1e-3);
        Machines.Near(Force(c, Steel), FiguresOf(c, ideal: false).Value("force.attraction"), 1.5e-2);
    }

    [Theory]
    [MemberData(nameof(Axial))]
    public void FieldAtCoilMiddle_IdealSteel_WithinOneInAThousand(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        string key = c.IsOpen ? "Bz_at_coil_mid_plane_pitch_radius_T" : "Bz_at_mid_gap_pitch_radius_T";
        double expected = c.Result(Ideal(c)).GetProperty(key).GetProperty("value")[0].GetDouble();

        Machines.Near(expected, FiguresOf(c, ideal: true).Value("field.mid-coil.centre"), 1e-3);
    }

    [Theory]
    [MemberData(nameof(Axial))]
    public void FieldThroughCoil_IdealSteel_SpansTheReferenceHeights(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        JsonElement through = c.Result(Ideal(c)).GetProperty("Bz_over_magnet_centre_through_coil_thickness_T");
        double[] values = [.. through.GetProperty("value").EnumerateArray().Select(v => v.GetDouble())];
        FigureGraph figures = FiguresOf(c, ideal: true);

        Machines.Near(values.Min(), figures.Value("field.coil.lowest"), 1e-3);
        Machines.Near(values.Max(), figures.Value("field.coil.highest"), 1e-3);
    }

    [Theory]
    [MemberData(nameof(Every))]
    public void EmfConstant_CoilsInStep_IsLinkageTimesOrderTurnsAndCoils(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        int coilsOfPhase = ReferenceMachine.PolePairs(c);
        double cycles = c.IsLinear ? Math.PI / c.Number("pole_pitch_m") : ReferenceMachine.PolePairs(c);
        double expected = cycles * ReferenceMachine.Turns * coilsOfPhase * c.Linkage(Ideal(c))[0];

        Machines.Near(expected, FiguresOf(c, ideal: true).Value("emf.constant.phase"), 1e-4);
    }

    [Theory]
    [MemberData(nameof(Axial))]
    public void PermeanceCoefficient_IdealSteel_FollowsFromMeanDemagnetisingFactor(string id)
    {
        ReferenceCase c = ReferenceCase.Load(id);
        double factor = c.Spread.GetProperty("mean_self_demagnetisation_factor_N").GetDouble();

        Machines.Near((1.0 - factor) / factor, FiguresOf(c, ideal: true).Value("permeance.coefficient"), 2e-3);
    }

    [Theory]
    [MemberData(nameof(Axial))]
    public void BackIronFlux_RealDiscs_CarriesHalfOfTheMeanFieldOverThePole(string id)
    {
        // The finite-element mean is good to 0.15 %; the program's linkage and flux to 0.5 %.
        ReferenceCase c = ReferenceCase.Load(id);
        string key = c.IsOpen ? "mean_Bz_at_coil_mid_plane_over_own_pole_of_magnet_annulus_T" : "mean_Bz_at_mid_gap_over_own_pole_of_magnet_annulus_T";
        double mean = c.Result(Steel).GetProperty(key).GetDouble();
        (double inner, double outer) = Annulus(c);
        double area = Math.PI * ((outer * outer) - (inner * inner)) / (2 * ReferenceMachine.PolePairs(c));
        double thickness = c.Inputs.GetProperty("finite_steel_only").GetProperty("magnet_disc_thickness_m").GetDouble();
        FigureGraph figures = FiguresOf(c, ideal: false);

        if (!c.IsOpen)
        {
            Machines.Near(0.5 * mean * area / (thickness * (outer - inner)), figures.Value("flux-density.back-iron"), 7e-3);
        }

        Assert.True(figures.Value("flux.pole") > mean * area * 0.993, "all radii carry less than the magnets' annulus");
    }

    [Theory]
    [InlineData(8e-3, 1.07)]
    [InlineData(5e-3, 1.72)]
    [InlineData(3e-3, 2.86)]
    public void BackIronFlux_SaturationStudy_GivesItsLinearEstimates(double thickness, double expected)
    {
        FigureGraph figures = Machines.Figures(ReferenceMachine.SpecOf(ReferenceCase.Load(Saturable), ideal: false, thickness));

        Assert.Equal(expected, figures.Value("flux-density.back-iron"), 0.01);
    }

    [Theory]
    [MemberData(nameof(SaturatingDiscs))]
    public void Linkage_SaturatingDiscs_LiesInsideTheStatedBand(double thickness, string result)
    {
        ReferenceCase c = ReferenceCase.Load(Saturable);
        FigureGraph figures = Machines.Figures(ReferenceMachine.SpecOf(c, ideal: false, thickness));
        Outcome linkage = figures["linkage.turn.fundamental"].Outcome;
        double expected = c.Linkage(result)[0];

        Assert.InRange(expected, linkage.Value - linkage.Uncertainty, linkage.Value + linkage.Uncertainty);
        Assert.Equal(thickness < 8e-3, figures["saturation.linkage-loss"].Outcome.HasValue);
    }

    [Theory]
    [InlineData(5e-3, "finite_steel_linear_5mm_disc_mu_recoil_1p05_fe")]
    [InlineData(3e-3, "finite_steel_linear_3mm_disc_mu_recoil_1p05_fe")]
    public void Linkage_ThinLinearDiscs_WithinHalfAPercent(double thickness, string result)
    {
        ReferenceCase c = ReferenceCase.Load(Saturable);
        FigureGraph figures = Machines.Figures(ReferenceMachine.SpecOf(c, ideal: false, thickness));

        Machines.Near(c.Linkage(result)[0], figures.Value("linkage.turn.fundamental"), 5e-3);
        Machines.Near(Force(c, result), figures.Value("force.attraction"), 1.5e-2);
    }

    private static FigureGraph FiguresOf(ReferenceCase c, bool ideal) => Machines.Figures(ReferenceMachine.SpecOf(c, ideal));

    private static string Ideal(ReferenceCase c) => c.IsLinear ? "mu_recoil_1" : "ideal_steel_mu_recoil_1";

    private static double Force(ReferenceCase c, string result) => c.Result(result).GetProperty("axial_attraction_force_N").GetDouble();

    private static (double Inner, double Outer) Annulus(ReferenceCase c)
    {
        if (c.Inputs.TryGetProperty("magnet_inner_radius_m", out JsonElement inner))
        {
            return (inner.GetDouble(), c.Number("magnet_outer_radius_m"));
        }

        double half = 0.5 * c.Number(c.Inputs.TryGetProperty("magnet_diameter_m", out _) ? "magnet_diameter_m" : "magnet_radial_length_m");
        return (c.Number("magnet_pitch_radius_m") - half, c.Number("magnet_pitch_radius_m") + half);
    }
}
