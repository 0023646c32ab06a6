using System.Runtime.InteropServices;

namespace SpecLint.Physics.Thermal;

/// <summary>Heat in a winding cooled through both faces, and the way out.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct WindingHeat
{
    /// <summary>Copper loss at 20 C [W], >= 0.</summary>
    public required double CopperLossCold { get; init; }

    /// <summary>Eddy and circulating loss at 20 C, falling as 1/resistivity [W], >= 0.</summary>
    public double EddyLossCold { get; init; }

    /// <summary>Temperature coefficient of the metal at 20 C [1/K], >= 0.</summary>
    public required double TemperatureCoefficient { get; init; }

    /// <summary>Area of one face of the winding that makes this loss, seen along the gap [m²], > 0: mean turn length times leg width, per coil.</summary>
    public required double FaceArea { get; init; }

    /// <summary>Winding thickness along the gap [m], > 0.</summary>
    public required double Thickness { get; init; }

    /// <summary>Effective conductivity of the winding along the gap [W/(m K)], > 0.</summary>
    public required double WindingConductivity { get; init; }

    /// <summary>Cover over the winding on each face [m], >= 0.</summary>
    public double CoverThickness { get; init; }

    /// <summary>Conductivity of the cover [W/(m K)], > 0.</summary>
    public required double CoverConductivity { get; init; }

    /// <summary>Heat-transfer coefficient from face to air [W/(m² K)], > 0.</summary>
    public required double SurfaceCoefficient { get; init; }

    /// <summary>Temperature of the air [K].</summary>
    public required double Ambient { get; init; }
}
