using SpecLint.Physics.Electrical;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Thermal;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Electrical;

/// <summary>The parts together on one machine, and against the published ferrite machine.</summary>
public sealed class WholeMachineTests
{
    private static readonly CoilOutline Coil = new()
    {
        Shape = CoilShape.Keystone,
        HoleLength = 0.046,
        HoleWidth = 0.026,
        LegWidth = 0.016,
        Thickness = 0.013,
        PitchRadius = 0.115,
    };

    // Nine coils, twelve poles, 55 turns of two strands AWG 16; linkage of the size that 46 x 30 x 10 mm magnets give.
    [Fact]
    public void NineCoilsTwelvePoles_FiguresAgreeWithEachOther()
    {
        WindingLayout layout = StarOfSlots.EquallySpaced(9, 6, 3);
        Assert.True(PathConnection.TryRegular(layout, 1, out WindingPaths? paths));
        var wire = new WindingWire
        {
            Material = ConductorMaterial.Copper,
            StrandDiameter = WireGauge.DiameterOfAwg(16),
            Strands = 2,
            MeanTurnLength = CoilGeometry.MeanTurnLength(Coil),
            Turns = 55.0,
        };
        var linkage = new CoilLinkage { PerTurn = [0.6e-3, -0.02e-3, 0.004e-3], Turns = 55.0 };
        HarmonicWaveform phase = PhaseEmf.OfPhase(linkage, paths, 0);
        HarmonicWaveform line = PhaseEmf.StarLine(phase, PhaseEmf.OfPhase(linkage, paths, 1));
        var space = new WireSpace
        {
            Width = 0.016,
            Thickness = 0.013,
            BareDiameter = wire.StrandDiameter,
            OverallDiameter = 1.39e-3,
        };

        Assert.Equal(3.0 * 55.0 * 6.0 * 0.6e-3, phase.Fundamental, 1e-12);
        Assert.Equal(Math.Sqrt(3.0) * phase.Fundamental, line.Fundamental, 1e-12);
        Assert.Equal(
            WireLay.CopperFill(space, 110.0) * CoilGeometry.WindingVolume(Coil), WindingResistance.CoilVolume(wire), 1e-12);
        double copperPower = WindingResistance.OfCoil(wire, 293.15) * 100.0;
        double density = WindingResistance.CurrentDensity(10.0, 1, wire);
        Assert.Equal(copperPower, density * density * 1.7241e-8 * WindingResistance.CoilVolume(wire), 1e-9);
    }

    // Ferrite machine of H. Piggott, The Permanent Magnet Generator, 2001: 100 turns, mean turn 0.25 m, two coils in series, about 2 mH a phase inferred from its
    // output. The outline is assumed: 50 mm magnets, 20 mm leg and stator; iron 21 mm behind, over 20 mm of ferrite and 1 mm of air.
    [Fact]
    public void FerriteMachine_Inductance_IsAboutTheInferredOne()
    {
        var coil = new CoilOutline
        {
            Shape = CoilShape.Rectangle,
            HoleLength = 0.050,
            HoleWidth = 0.035,
            LegWidth = 0.020,
            Thickness = 0.020,
            PitchRadius = 0.120,
        };
        Assert.Equal(0.25, CoilGeometry.MeanTurnLength(coil), 1e-12);
        Assert.True(PathConnection.TryRegular(StarOfSlots.EquallySpaced(6, 4, 3), 1, out WindingPaths? paths));

        PhaseInductance phase = SynchronousInductance.Of(
            CoilMutualInductance.Ring(coil, 100.0, new IronPlanes(0.021, 0.021), 6), paths);

        TestContext.Current.SendDiagnosticMessage($"ferrite machine: {1e3 * phase.Synchronous:F3} mH synchronous, {1e3 * phase.Self:F3} self");
        Assert.InRange(phase.Synchronous, 1.5e-3, 3.0e-3);
    }

    [Fact]
    public void NineCoils_Temperature_IsWarmNotAbsurd()
    {
        double turn = CoilGeometry.MeanTurnLength(Coil);
        HeatTransfer film = DiscConvection.FacingStator(300.0 * Math.PI / 30.0, 0.145, 0.0015, FluidProperties.Air);
        var heat = new WindingHeat
        {
            CopperLossCold = 9.0 * 6.0,
            TemperatureCoefficient = 0.00393,
            FaceArea = 9.0 * turn * Coil.LegWidth,
            Thickness = Coil.Thickness,
            WindingConductivity = WindingConductivity.Across(0.55, 390.0, WindingConductivity.UnfilledResin),
            CoverThickness = 0.5e-3,
            CoverConductivity = 0.25,
            SurfaceCoefficient = film.Coefficient,
            Ambient = 313.15,
        };

        Assert.True(WindingTemperature.TrySteady(heat, out WindingTemperatures result));
        Assert.InRange(result.Mean - heat.Ambient, 10.0, 60.0);
        Assert.Equal(result.Loss, (result.Mean - heat.Ambient) / WindingTemperature.ThermalResistance(heat), 1e-6);
    }
}
