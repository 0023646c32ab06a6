namespace SpecLint.Physics.Magnetics;

/// <summary>A plane figure covered with uniform magnetic charge, in its own frame at height zero.</summary>
internal interface IChargeSheet
{
    /// <summary>Solid angle that the sheet subtends.</summary>
    /// <param name="x">Position along the radius of the sheet's centre [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="z">Height over the sheet [m]; the sign does not matter.</param>
    /// <returns>Solid angle [sr], 0 to 2 pi.</returns>
    public double SolidAngle(double x, double y, double z);

    /// <summary>In-plane field integral: the field of unit surface charge times 4 pi.</summary>
    /// <param name="x">Position along the radius of the sheet's centre [m].</param>
    /// <param name="y">Position along the motion [m].</param>
    /// <param name="z">Height over the sheet [m]; the sign does not matter.</param>
    /// <returns>Components along x and y [-]; logarithmically infinite on an edge.</returns>
    public (double X, double Y) InPlane(double x, double y, double z);
}
