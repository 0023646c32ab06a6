using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>A vector over the remanence: along the radius through the magnet's centre, along the motion, along the magnetisation.</summary>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct FieldVector
{
    /// <summary>Along the radius, or across the travel [-].</summary>
    public required double X { get; init; }

    /// <summary>Along the motion [-].</summary>
    public required double Y { get; init; }

    /// <summary>Along the magnetisation [-].</summary>
    public required double Z { get; init; }
}
