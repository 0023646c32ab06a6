using System.Numerics;

namespace SpecLint.Physics.Windings;

/// <summary>How well the coils of a phase add up, for any electrical order.</summary>
public static class DistributionFactor
{
    /// <summary>Sum of the signed unit phasors of a phase's coils.</summary>
    /// <param name="layout">Layout.</param>
    /// <param name="phase">Phase, from 0.</param>
    /// <param name="order">Electrical order; 1 has the machine's pole pairs.</param>
    /// <returns>Sum of s exp(j order p angle); its size is the number of coils when all are in phase.</returns>
    public static Complex PhasorSum(WindingLayout layout, int phase, int order)
    {
        ArgumentNullException.ThrowIfNull(layout);
        Complex sum = Complex.Zero;
        for (int coil = 0; coil < layout.Coils; coil++)
        {
            if (layout.CoilPhases[coil] == phase)
            {
                sum += Complex.FromPolarCoordinates(layout.CoilSenses[coil], order * layout.PolePairs * layout.CoilAngles[coil]);
            }
        }

        return sum;
    }

    /// <summary>Distribution factor of a phase.</summary>
    /// <param name="layout">Layout.</param>
    /// <param name="phase">Phase, from 0.</param>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <returns>Size of the phasor sum over the number of coils, in [0, 1]; 0 for a phase without coils.</returns>
    /// <seealso>Pyrhonen, Jokinen, Hrabovcova, Design of Rotating Electrical Machines, 2nd ed. 2013, section 2.3.</seealso>
    public static double Of(WindingLayout layout, int phase, int order)
    {
        ArgumentNullException.ThrowIfNull(layout);
        int coils = layout.CoilsOfPhase(phase);
        return coils == 0 ? 0.0 : Complex.Abs(PhasorSum(layout, phase, order)) / coils;
    }

    /// <summary>Mean of the distribution factor over the phases, for layouts that are not balanced.</summary>
    /// <param name="layout">Layout.</param>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <returns>In [0, 1].</returns>
    public static double Mean(WindingLayout layout, int order)
    {
        ArgumentNullException.ThrowIfNull(layout);
        double sum = 0.0;
        for (int phase = 0; phase < layout.Phases; phase++)
        {
            sum += Of(layout, phase, order);
        }

        return sum / layout.Phases;
    }
}
