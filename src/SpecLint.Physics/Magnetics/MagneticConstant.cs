namespace SpecLint.Physics.Magnetics;

/// <summary>The magnetic constant.</summary>
public static class MagneticConstant
{
    /// <summary>Vacuum permeability [V s/(A m)], the defined value before 2019, from which the measured one differs by 1e-10.</summary>
    public const double Mu0 = 4e-7 * Math.PI;
}
