using System.Runtime.InteropServices;

namespace SpecLint.Physics.Electrical;

/// <summary>Infinitely permeable planes on both sides of a layer of coils.</summary>
/// <remarks>
/// For magnets on steel the planes lie behind the magnets: distance = clearance + cover + magnet thickness. The magnets'
/// own permeability, near 1, is left out; it would raise the inductance by under (recoil permeability - 1) of the images' share.
/// </remarks>
/// <param name="Below">Distance from the winding's lower face to the plane [m], >= 0; infinity for none.</param>
/// <param name="Above">Distance from the winding's upper face to the plane [m], >= 0; infinity for none.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct IronPlanes(double Below, double Above)
{
    /// <summary>No iron near the coils.</summary>
    public static IronPlanes None => new(double.PositiveInfinity, double.PositiveInfinity);
}
