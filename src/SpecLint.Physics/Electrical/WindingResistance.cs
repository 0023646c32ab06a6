using SpecLint.Physics.Magnetics;

namespace SpecLint.Physics.Electrical;

/// <summary>Resistance, conductor mass, current density and skin depth.</summary>
/// <remarks>Direct-current values; lead ends are not included. Wire wound hard measures 1 to 3 % above nominal.</remarks>
/// <seealso>IEC 60028 (resistance of copper and its temperature law).</seealso>
public static class WindingResistance
{
    /// <summary>Resistance of one coil.</summary>
    /// <param name="wire">Wire; strands in hand are parallel.</param>
    /// <param name="temperature">[K].</param>
    /// <returns>[ohm].</returns>
    public static double OfCoil(in WindingWire wire, double temperature) =>
        wire.Material.ResistivityAt(temperature) * wire.Turns * wire.MeanTurnLength / wire.TurnSection;

    /// <summary>Resistance of a phase.</summary>
    /// <param name="coilResistance">Resistance of one coil [ohm].</param>
    /// <param name="seriesCoils">Coils in series in one path, >= 1.</param>
    /// <param name="parallelPaths">Parallel paths of the phase, >= 1.</param>
    /// <returns>[ohm].</returns>
    public static double OfPhase(double coilResistance, int seriesCoils, int parallelPaths) =>
        coilResistance * seriesCoils / parallelPaths;

    /// <summary>Conductor volume of one coil, bare metal.</summary>
    /// <param name="wire">Wire.</param>
    /// <returns>[m³].</returns>
    public static double CoilVolume(in WindingWire wire) => wire.TurnSection * wire.Turns * wire.MeanTurnLength;

    /// <summary>Conductor mass of one coil, bare metal.</summary>
    /// <param name="wire">Wire.</param>
    /// <returns>[kg].</returns>
    public static double CoilMass(in WindingWire wire) =>
        wire.Material.Density * CoilVolume(wire);

    /// <summary>Current density in a strand.</summary>
    /// <param name="phaseRms">Phase current [A].</param>
    /// <param name="parallelPaths">Parallel paths, >= 1.</param>
    /// <param name="wire">Wire.</param>
    /// <returns>[A/m²], even share between paths and strands.</returns>
    public static double CurrentDensity(double phaseRms, int parallelPaths, in WindingWire wire) =>
        phaseRms / (parallelPaths * wire.TurnSection);

    /// <summary>Skin depth.</summary>
    /// <param name="resistivity">[ohm m], > 0.</param>
    /// <param name="electricalSpeed">Angular frequency [rad/s], > 0.</param>
    /// <returns>[m]: sqrt(2 rho/(omega mu0)), non-magnetic metal; infinity at rest.</returns>
    /// <seealso>Stoll, The Analysis of Eddy Currents, 1974, section 1 (from memory).</seealso>
    public static double SkinDepth(double resistivity, double electricalSpeed) =>
        Math.Sqrt(2.0 * resistivity / (electricalSpeed * MagneticConstant.Mu0));
}
