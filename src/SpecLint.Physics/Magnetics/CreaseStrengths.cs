using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>Gradient jump times length of the creases of a turn density, one side of its axis of symmetry [-].</summary>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct CreaseStrengths
{
    /// <summary>Hole edge along the leg [-].</summary>
    public required double HoleLeg { get; init; }

    /// <summary>Outer edge along the leg [-].</summary>
    public required double OuterLeg { get; init; }

    /// <summary>Mitre at the inner end [-].</summary>
    public required double InnerMitre { get; init; }

    /// <summary>Mitre at the outer end [-].</summary>
    public required double OuterMitre { get; init; }

    /// <summary>Strengths of a coil's creases.</summary>
    /// <param name="o">The coil's outline.</param>
    /// <returns>The strengths.</returns>
    public static CreaseStrengths Of(in CoilOutline o)
    {
        double w = o.LegWidth;
        (double sine, double cosine) = Math.SinCos(o.LegHalfAngle);
        double hole = double.Hypot(o.OuterEnd - o.InnerEnd, o.OuterEndHalfWidth - o.InnerEndHalfWidth);
        double outer = double.Hypot(o.OuterEndOuter - o.InnerEndOuter, o.OuterEndOuterHalfWidth - o.InnerEndOuterHalfWidth);
        double innerMitre = double.Hypot(w, o.InnerEndOuterHalfWidth - o.InnerEndHalfWidth);
        double outerMitre = double.Hypot(w, o.OuterEndOuterHalfWidth - o.OuterEndHalfWidth);
        return new CreaseStrengths
        {
            HoleLeg = -hole / w,
            OuterLeg = outer / w,
            InnerMitre = -double.Hypot(1.0 - sine, cosine) * innerMitre / w,
            OuterMitre = -double.Hypot(1.0 + sine, cosine) * outerMitre / w,
        };
    }
}
