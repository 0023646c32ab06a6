using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>A uniformly, axially magnetised disc or cylinder.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct FreeCylinder
{
    /// <summary>Diameter [m], > 0.</summary>
    public required double Diameter { get; init; }

    /// <summary>Size along the magnetisation [m], > 0.</summary>
    public required double Thickness { get; init; }

    /// <summary>Remanent flux density [T].</summary>
    public required double RemanentFluxDensity { get; init; }
}
