using System.Runtime.InteropServices;

namespace SpecLint.Physics.Geometry;

/// <summary>Point in the plane of the gap: radially outward (or across the travel) and along the motion.</summary>
/// <param name="Across">Distance from the shaft axis along the coil axis, or from the coil centre of a linear machine [m].</param>
/// <param name="Along">Distance from the coil axis along the motion [m].</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct PlanePoint(double Across, double Along)
{
    /// <summary>Distance from the origin [m].</summary>
    public double Radius => double.Hypot(Across, Along);
}
