using MathNet.Numerics;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Numerics;

namespace SpecLint.Physics.Windings;

/// <summary>Share of a full-pitch, concentrated coil's linkage that one coil reaches, for any electrical order.</summary>
public static class CoilSpanFactor
{
    private static readonly (double[] Nodes, double[] Weights) Rule = GaussLegendreRule.Create(10);

    /// <summary>Factor of a coil that spans whole slots.</summary>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <param name="polePairs">Pole pairs, >= 1.</param>
    /// <param name="span">Coil span in slots, >= 1.</param>
    /// <param name="slots">Slots round the machine, > span.</param>
    /// <returns>sin(order p pi span/slots), signed.</returns>
    /// <seealso>Pyrhonen, Jokinen, Hrabovcova, Design of Rotating Electrical Machines, 2nd ed. 2013, section 2.4 (pitch factor).</seealso>
    public static double OfSlots(int order, int polePairs, int span, int slots) =>
        Math.Sin(Math.PI * ((long)order * polePairs * span % (2L * slots)) / slots);

    /// <summary>Pitch factor of two concentrated legs.</summary>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <param name="electricalSpan">Electrical angle between leg centres [rad].</param>
    /// <returns>sin(order span/2), signed.</returns>
    public static double Pitch(int order, double electricalSpan) => Math.Sin(0.5 * order * electricalSpan);

    /// <summary>Factor of a coreless coil in a disc machine at one radius, mean over its turns.</summary>
    /// <param name="coil">Buildable outline with a pitch radius > 0.</param>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <param name="polePairs">Pole pairs, >= 1.</param>
    /// <param name="radius">Radius at which the legs are looked at [m]; usually the pitch radius.</param>
    /// <returns>Signed, in [-1, 1]; pitch and spread together. NaN where the circle misses a leg.</returns>
    /// <remarks>
    /// Keystone: each turn's leg lies parallel to the ray at (s - w/2), at angle b + asin((s - w/2)/r). Rectangle: at
    /// asin((h/2 + s)/r). Round: <see cref="OfRing"/> with wave number order p/R. Ten-point Gauss mean over the turns.
    /// </remarks>
    public static double OfDiscCoil(in CoilOutline coil, int order, int polePairs, double radius)
    {
        if (coil.Shape == CoilShape.Round)
        {
            return OfRing(coil, order * polePairs / radius);
        }

        double halfAngle = CoilGeometry.LegHalfAngle(coil);
        double start = coil.Shape == CoilShape.Keystone ? -0.5 * coil.LegWidth : 0.5 * coil.HoleWidth;
        double sum = 0.0;
        for (int node = 0; node < Rule.Nodes.Length; node++)
        {
            double offset = start + 0.5 * coil.LegWidth * (1.0 + Rule.Nodes[node]);
            sum += Rule.Weights[node] * Math.Sin(order * polePairs * (halfAngle + Math.Asin(offset / radius)));
        }

        return 0.5 * sum;
    }

    /// <summary>Factor of a rectangular or round coil over a straight row of magnets, mean over its turns.</summary>
    /// <param name="coil">Buildable rectangle or ring.</param>
    /// <param name="order">Electrical order, >= 1.</param>
    /// <param name="polePitch">Pole pitch [m], > 0.</param>
    /// <returns>Signed: sin(k span/2) sin(k w/2)/(k w/2) with k = order pi/pole pitch; a ring by <see cref="OfRing"/>.</returns>
    public static double OfLinearCoil(in CoilOutline coil, int order, double polePitch)
    {
        double waveNumber = order * Math.PI / polePitch;
        if (coil.Shape == CoilShape.Round)
        {
            return OfRing(coil, waveNumber);
        }

        double half = 0.5 * waveNumber * coil.LegWidth;
        return Math.Sin(0.5 * waveNumber * (coil.HoleWidth + coil.LegWidth)) * Trig.Sinc(half / Math.PI);
    }

    /// <summary>Factor of a ring coil in a field that varies along the motion only.</summary>
    /// <param name="coil">Round outline.</param>
    /// <param name="waveNumber">Wave number along the motion [1/m], > 0.</param>
    /// <returns>Signed: (pi/2) mean(rho J1(k rho))/mean(rho), relative to straight full-pitch turns of the same extent across the motion.</returns>
    /// <remarks>A circle of radius rho links 2 pi rho J1(k rho)/k of a unit cosine field; a straight full-pitch turn of length 2 rho links 4 rho/k. At most 0.914.</remarks>
    public static double OfRing(in CoilOutline coil, double waveNumber)
    {
        double inner = 0.5 * coil.HoleWidth;
        double sum = 0.0;
        for (int node = 0; node < Rule.Nodes.Length; node++)
        {
            double radius = inner + 0.5 * coil.LegWidth * (1.0 + Rule.Nodes[node]);
            sum += 0.5 * Rule.Weights[node] * radius * FirstKindBessel.J1(waveNumber * radius);
        }

        return 0.5 * Math.PI * sum / (inner + 0.5 * coil.LegWidth);
    }
}
