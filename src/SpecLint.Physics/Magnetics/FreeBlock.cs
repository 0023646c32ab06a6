using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>A uniformly magnetised rectangular block.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct FreeBlock
{
    /// <summary>Size along x [m], > 0.</summary>
    public required double Length { get; init; }

    /// <summary>Size along y [m], > 0.</summary>
    public required double Width { get; init; }

    /// <summary>Size along the magnetisation [m], > 0.</summary>
    public required double Thickness { get; init; }

    /// <summary>Remanent flux density [T].</summary>
    public required double RemanentFluxDensity { get; init; }
}
