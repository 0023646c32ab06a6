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
}
