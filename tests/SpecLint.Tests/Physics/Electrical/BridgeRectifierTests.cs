using SpecLint.Physics.Electrical;

namespace SpecLint.Tests.Physics.Electrical;

public sealed class BridgeRectifierTests
{
    private static readonly BridgeSource Source = new()
    {
        LineEmfRms = 40.0,
        PhaseResistance = 0.3,
        PhaseInductance = 1e-3,
        ElectricalSpeed = 180.0,
        DiodeDrop = 0.7,
    };

    // Textbook figures of the six-pulse bridge.
    [Fact]
    public void Constants_MatchPublished()
    {
        Assert.Equal(1.3505, BridgeRectifier.MeanOverLineRms, 5e-5);
        Assert.Equal(BridgeRectifier.MeanOverLineRms, 3.0 * Math.Sqrt(2.0) / Math.PI, 1e-14);
        Assert.Equal(0.8165, BridgeRectifier.LineRmsOverDirect, 5e-5);
        Assert.Equal(BridgeRectifier.LineRmsOverDirect, Math.Sqrt(2.0 / 3.0), 1e-14);
        Assert.Equal(0.7797, BridgeRectifier.FundamentalOverDirect, 5e-5);
        Assert.Equal(BridgeRectifier.FundamentalOverDirect, Math.Sqrt(6.0) / Math.PI, 1e-14);
        Assert.Equal(0.955, BridgeRectifier.FundamentalOverDirect / BridgeRectifier.LineRmsOverDirect, 5e-4);
    }

    [Fact]
    public void CopperLoss_IsThreePhasesAtLineRms() =>
        Assert.Equal(
            3.0 * Math.Pow(BridgeRectifier.LineRmsOverDirect * 15.0, 2) * 0.475, BridgeRectifier.CopperLoss(0.475, 15.0), 1e-9);

    // H. Piggott, The Permanent Magnet Generator, 2001, measured output of the ferrite machine: at 420 rpm 34.2 V rectified, 13.5 V battery and 1.4 V of diodes leave 19.3 V; 15 A needs 1.29 ohm, 0.95 of it copper,
    // the rest commutation of about 2 mH a phase at 4 pole pairs.
    [Fact]
    public void Current_PublishedFerriteMachine_NeedsItsInductance()
    {
        var source = new BridgeSource
        {
            LineEmfRms = 34.2 / BridgeRectifier.MeanOverLineRms,
            PhaseResistance = 0.475,
            PhaseInductance = 2e-3,
            ElectricalSpeed = 4.0 * 420.0 * Math.PI / 30.0,
            DiodeDrop = 0.7,
        };

        Assert.Equal(15.0, BridgeRectifier.CurrentInto(source, 13.5), 0.2);
        Assert.InRange(BridgeRectifier.CurrentInto(source with { PhaseInductance = 0.0 }, 13.5), 20.0, 25.0);
    }

    [Fact]
    public void Voltage_NoLoadFigure_IsMeanLessDiodes() =>
        Assert.Equal(1.3504744742356594 * 40.0 - 1.4, BridgeRectifier.MeanVoltage(Source, 0.0), 1e-12);

    [Fact]
    public void Current_RoundTrip_ReproducesVoltage()
    {
        double current = BridgeRectifier.CurrentInto(Source, 30.0);

        Assert.Equal(30.0, BridgeRectifier.MeanVoltage(Source, current), 1e-12);
        Assert.Equal(0.0, BridgeRectifier.CurrentInto(Source, 60.0));
        Assert.True(double.IsNaN(BridgeRectifier.CurrentInto(Source with { PhaseResistance = 0.0, PhaseInductance = 0.0 }, 30.0)));
    }

    // Commutation: the voltage lost equals (3/pi) times half the volt-seconds between cos 0 and cos u.
    [Fact]
    public void Overlap_MatchesVoltageLost()
    {
        double angle = BridgeRectifier.OverlapAngle(Source, 20.0);
        double lost = 3.0 / Math.PI * Math.Sqrt(2.0) * 40.0 * (1.0 - Math.Cos(angle)) / 2.0;

        Assert.Equal(BridgeRectifier.CommutationFactor * 180.0 * 1e-3 * 20.0, lost, 1e-12);
        Assert.InRange(angle, 0.0, Math.PI / 3.0);
    }

    // Same source: charging at 170 rpm needs 14.0 to 14.6 V of line peak for 12.6 to 13.2 V.
    [Fact]
    public void Start_TwelveVoltBattery_IsPublishedPeak()
    {
        Assert.Equal(14.0, BridgeRectifier.PeakLineAtStart(12.6, 0.7), 1e-12);
        Assert.Equal(14.6, BridgeRectifier.PeakLineAtStart(13.2, 0.7), 1e-12);
        Assert.Equal(14.0 / 0.8, BridgeRectifier.SpeedAtStart(12.6, 0.7, 0.8), 1e-12);
    }
}
