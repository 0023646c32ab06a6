using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Windings;

/// <summary>Winding factor: distribution of the phase's coils times the coil's own pitch and spread.</summary>
public static class WindingFactor
{
    /// <summary>Winding factor of coreless coils in a disc machine.</summary>
    /// <param name="layout">Layout.</param>
    /// <param name="coil">Buildable outline with a pitch radius > 0.</param>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <param name="radius">Radius at which the legs are looked at [m]; usually the pitch radius.</param>
    /// <returns>Magnitude in [0, 1], mean over the phases.</returns>
    /// <seealso>Pyrhonen, Jokinen, Hrabovcova, Design of Rotating Electrical Machines, 2nd ed. 2013, chapter 2.</seealso>
    public static double OfDisc(WindingLayout layout, in CoilOutline coil, int order, double radius)
    {
        ArgumentNullException.ThrowIfNull(layout);
        return DistributionFactor.Mean(layout, order) * Math.Abs(CoilSpanFactor.OfDiscCoil(coil, order, layout.PolePairs, radius));
    }

    /// <summary>Winding factor of coreless coils over a straight row of magnets.</summary>
    /// <param name="layout">Layout.</param>
    /// <param name="coil">Buildable rectangle or ring.</param>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <param name="polePitch">Pole pitch [m], > 0.</param>
    /// <returns>Magnitude in [0, 1], mean over the phases.</returns>
    public static double OfLinear(WindingLayout layout, in CoilOutline coil, int order, double polePitch) =>
        DistributionFactor.Mean(layout, order) * Math.Abs(CoilSpanFactor.OfLinearCoil(coil, order, polePitch));

    /// <summary>Winding factor of coils that span whole slots.</summary>
    /// <param name="layout">Layout.</param>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <param name="span">Coil span in slots, >= 1.</param>
    /// <param name="slots">Slots round the machine, > span.</param>
    /// <returns>Magnitude in [0, 1], mean over the phases.</returns>
    public static double OfSlots(WindingLayout layout, int order, int span, int slots)
    {
        ArgumentNullException.ThrowIfNull(layout);
        return DistributionFactor.Mean(layout, order) * Math.Abs(CoilSpanFactor.OfSlots(order, layout.PolePairs, span, slots));
    }
}
