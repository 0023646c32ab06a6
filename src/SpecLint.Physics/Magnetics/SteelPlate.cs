using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>A flat layer behind or opposite the magnets: none, ideal steel, or a plate of finite permeability.</summary>
/// <remarks>
/// The plate is unbounded in its plane and backed by air. Rims, holes and saturation are outside this description.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
public readonly record struct SteelPlate
{
    /// <summary>Thickness of the plate [m]; zero for no plate, positive infinity for an ideal half-space.</summary>
    public double Thickness { get; init; }

    /// <summary>Relative permeability of the plate [-], >= 1; positive infinity for ideal steel.</summary>
    public double RelativePermeability { get; init; }

    /// <summary>A plane of infinite permeability.</summary>
    public static SteelPlate Ideal => new() { Thickness = double.PositiveInfinity, RelativePermeability = double.PositiveInfinity };

    /// <summary>No steel.</summary>
    public static SteelPlate None => new() { Thickness = 0.0, RelativePermeability = 1.0 };

    /// <summary>Whether the permeability is taken as infinite.</summary>
    public bool IsIdeal => double.IsPositiveInfinity(RelativePermeability);

    /// <summary>Whether there is no steel at all.</summary>
    public bool IsAbsent => !(Thickness > 0.0);

    /// <summary>Ratio mu0 k phi / B_z that the plate's face presents to the field of wave number k.</summary>
    /// <param name="k">Wave number [1/m], > 0.</param>
    /// <returns>Magnetic impedance [-]: 0 for ideal steel, 1 for air, between them otherwise.</returns>
    /// <remarks>Limits: thickness to zero gives 1, thickness to infinity gives 1/mu_s.</remarks>
    /// <seealso>Two-layer transmission of a harmonic potential: Smythe W.R., Static and Dynamic Electricity, 3rd ed., 1968,
    /// section 4.05 (boundary conditions); reference notes on axial machines, section M2.</seealso>
    public double Impedance(double k)
    {
        if (IsAbsent)
        {
            return 1.0;
        }

        if (IsIdeal)
        {
            return 0.0;
        }

        double mu = RelativePermeability;
        double t = Math.Tanh(k * Thickness);
        return (mu + t) / (mu * ((mu * t) + 1.0));
    }
}
