using SpecLint.Physics.Electrical;

namespace SpecLint.Physics.Thermal;

/// <summary>Steady temperature of a winding as one node cooled through both faces, and its adiabatic heating.</summary>
public static class WindingTemperature
{
    /// <summary>Uncertainty to be put on every rise, relative.</summary>
    public const double RiseUncertainty = 0.3;

    /// <summary>Rise above ambient beyond which no solution is looked for [K].</summary>
    public const double LargestRise = 2000.0;

    private const double RelativeTolerance = 1e-12;
    private const int MostSteps = 200;

    /// <summary>Steady temperatures.</summary>
    /// <param name="heat">Heat and way out.</param>
    /// <param name="temperatures">The temperatures; default on failure.</param>
    /// <returns>False when the loss outgrows the cooling with temperature (thermal runaway), up to <see cref="LargestRise"/>.</returns>
    /// <remarks>
    /// Loss P is spread evenly over the thickness t and leaves by both faces of area A. The parabola of temperature has its mean
    /// P t/(12 k A) above the faces and its middle P t/(24 k A) above the mean; cover and air film follow in series.
    /// The balance rise/R = P(T), P = P_copper (1 + alpha (T - 20 C)) + P_eddy/(1 + alpha (T - 20 C)), is bisected between ambient and the largest rise.
    /// Coil ends, leads, radiation and the frame are left out; the rise is good to plus or minus 30 %.
    /// </remarks>
    /// <seealso>Carslaw, Jaeger, Conduction of Heat in Solids, 2nd ed. 1959, section 3.14 (slab with heat produced evenly; section from memory).</seealso>
    public static bool TrySteady(in WindingHeat heat, out WindingTemperatures temperatures)
    {
        temperatures = default;
        double resistance = ThermalResistance(heat);
        double low = heat.Ambient;
        double high = heat.Ambient + LargestRise;
        if (!(Surplus(heat, resistance, high) <= 0.0) || !double.IsFinite(resistance))
        {
            return false;
        }

        for (int step = 0; step < MostSteps && high - low > RelativeTolerance * high; step++)
        {
            double middle = 0.5 * (low + high);
            if (Surplus(heat, resistance, middle) > 0.0)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        double loss = LossAt(heat, high);
        double flux = 0.5 * loss / heat.FaceArea;
        temperatures = new WindingTemperatures(
            Mean: high,
            HotSpot: high + flux * heat.Thickness / (12.0 * heat.WindingConductivity),
            Surface: heat.Ambient + flux / heat.SurfaceCoefficient,
            Loss: loss);
        return true;
    }

    /// <summary>Resistance from the winding's mean to the air, both faces.</summary>
    /// <param name="heat">Way out.</param>
    /// <returns>[K/W]: (t/(6 k) + cover/k_cover + 1/h)/(2 A).</returns>
    public static double ThermalResistance(in WindingHeat heat) =>
        0.5 * (heat.Thickness / (6.0 * heat.WindingConductivity) + heat.CoverThickness / heat.CoverConductivity + 1.0 / heat.SurfaceCoefficient)
        / heat.FaceArea;

    /// <summary>Loss at a winding temperature.</summary>
    /// <param name="heat">Heat.</param>
    /// <param name="temperature">Mean temperature [K].</param>
    /// <returns>[W].</returns>
    public static double LossAt(in WindingHeat heat, double temperature)
    {
        double factor = 1.0 + heat.TemperatureCoefficient * (temperature - ConductorMaterial.ReferenceTemperature);
        return heat.CopperLossCold * factor + heat.EddyLossCold / factor;
    }

    /// <summary>Heating rate of a conductor that gives no heat away.</summary>
    /// <param name="material">Metal.</param>
    /// <param name="currentDensity">Rms current density [A/m²].</param>
    /// <param name="temperature">Temperature [K].</param>
    /// <returns>[K/s]: rho J²/(density c).</returns>
    public static double AdiabaticRate(in ConductorMaterial material, double currentDensity, double temperature) =>
        material.ResistivityAt(temperature) * currentDensity * currentDensity / (material.Density * material.SpecificHeat);

    /// <summary>Time for a conductor that gives no heat away to warm from one temperature to another.</summary>
    /// <param name="material">Metal with a temperature coefficient > 0.</param>
    /// <param name="currentDensity">Rms current density [A/m²], > 0.</param>
    /// <param name="from">Start [K].</param>
    /// <param name="to">End [K], >= start.</param>
    /// <returns>[s]: density c/(rho20 alpha J²) ln(rho(to)/rho(from)). A lower bound: resin and air take heat too.</returns>
    /// <seealso>IEC 60949 (adiabatic short-circuit heating; its equation is this integral, from memory).</seealso>
    public static double AdiabaticTime(in ConductorMaterial material, double currentDensity, double from, double to) =>
        material.Density * material.SpecificHeat / (material.Resistivity * material.TemperatureCoefficient * currentDensity * currentDensity)
        * Math.Log(material.ResistivityAt(to) / material.ResistivityAt(from));

    private static double Surplus(in WindingHeat heat, double resistance, double temperature) =>
        LossAt(heat, temperature) - (temperature - heat.Ambient) / resistance;
}
