namespace SpecLint.Physics.Electrical;

/// <summary>Three-phase six-pulse diode bridge with smooth direct current.</summary>
/// <seealso>Mohan, Undeland, Robbins, Power Electronics, 3rd ed. 2003, chapter 5 (three-phase bridge, commutation; from memory).</seealso>
public static class BridgeRectifier
{
    /// <summary>Mean bridge voltage over rms line voltage: 3 sqrt(2)/pi = 1.3505.</summary>
    public const double MeanOverLineRms = 1.3504744742356594;

    /// <summary>Rms line current over direct current: sqrt(2/3) = 0.8165.</summary>
    public const double LineRmsOverDirect = 0.816496580927726;

    /// <summary>Rms of the line current's fundamental over direct current: sqrt(6)/pi = 0.7797.</summary>
    public const double FundamentalOverDirect = 0.7796968012336761;

    /// <summary>Mean voltage drop of commutation per phase reactance and direct current: 3/pi.</summary>
    public const double CommutationFactor = 3.0 / Math.PI;

    /// <summary>Mean direct voltage at a direct current.</summary>
    /// <param name="source">Source.</param>
    /// <param name="directCurrent">Smooth direct current [A], >= 0.</param>
    /// <returns>[V]: 1.3505 E_line - 2 V_diode - 2 R I - 3 omega L I/pi; negative where the source cannot drive that current.</returns>
    /// <remarks>Continuous conduction, at most two phases commutating (overlap under 60 degrees), sinusoidal EMF. Near the start of charging use the peak condition.</remarks>
    public static double MeanVoltage(in BridgeSource source, double directCurrent) =>
        MeanOverLineRms * source.LineEmfRms - 2.0 * source.DiodeDrop - directCurrent * InternalResistance(source);

    /// <summary>Slope of the direct voltage against current.</summary>
    /// <param name="source">Source.</param>
    /// <returns>[ohm]: 2 R + 3 omega L/pi.</returns>
    public static double InternalResistance(in BridgeSource source) =>
        2.0 * source.PhaseResistance + CommutationFactor * source.ElectricalSpeed * source.PhaseInductance;

    /// <summary>Direct current into a constant voltage.</summary>
    /// <param name="source">Source.</param>
    /// <param name="loadVoltage">Voltage of the load, such as a battery [V], >= 0.</param>
    /// <returns>[A], 0 when the mean voltage does not reach the load; NaN without any internal resistance.</returns>
    public static double CurrentInto(in BridgeSource source, double loadVoltage)
    {
        double surplus = MeanVoltage(source, 0.0) - loadVoltage;
        return surplus <= 0.0 ? 0.0 : surplus / PositiveOrNaN(InternalResistance(source));
    }

    /// <summary>Overlap angle of commutation.</summary>
    /// <param name="source">Source.</param>
    /// <param name="directCurrent">Direct current [A], >= 0.</param>
    /// <returns>[rad] from cos(u) = 1 - 2 omega L I/(sqrt(2) E_line); NaN when no such angle exists. Above pi/3 the mean-voltage formula no longer holds.</returns>
    public static double OverlapAngle(in BridgeSource source, double directCurrent) =>
        Math.Acos(1.0 - 2.0 * source.ElectricalSpeed * source.PhaseInductance * directCurrent / (Math.Sqrt(2.0) * source.LineEmfRms));

    /// <summary>Peak line EMF at which charging begins.</summary>
    /// <param name="loadVoltage">Voltage of the load [V], >= 0.</param>
    /// <param name="diodeDrop">Drop of one diode [V], >= 0.</param>
    /// <returns>[V]: load voltage plus two diodes.</returns>
    public static double PeakLineAtStart(double loadVoltage, double diodeDrop) => loadVoltage + 2.0 * diodeDrop;

    /// <summary>Mechanical speed at which charging begins.</summary>
    /// <param name="loadVoltage">Voltage of the load [V], >= 0.</param>
    /// <param name="diodeDrop">Drop of one diode [V], >= 0.</param>
    /// <param name="linePeakPerSpeed">Peak line EMF per mechanical speed [V s/rad], > 0.</param>
    /// <returns>[rad/s].</returns>
    public static double SpeedAtStart(double loadVoltage, double diodeDrop, double linePeakPerSpeed) =>
        PeakLineAtStart(loadVoltage, diodeDrop) / linePeakPerSpeed;

    /// <summary>Copper loss of the three phases at a direct current.</summary>
    /// <param name="phaseResistance">Resistance of one phase, star equivalent [ohm], >= 0.</param>
    /// <param name="directCurrent">Smooth direct current [A].</param>
    /// <returns>[W]: 3 (2/3) I² R = 2 I² R.</returns>
    public static double CopperLoss(double phaseResistance, double directCurrent) => 2.0 * phaseResistance * directCurrent * directCurrent;

    private static double PositiveOrNaN(double value) => value > 0.0 ? value : double.NaN;
}
