using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>The layers of a machine along its magnetisation, from the steel behind the magnets to the far side of the gap.</summary>
/// <remarks>
/// Heights are measured from the magnets' face toward the gap. The recoil permeability fills the whole magnet layer here;
/// <see cref="SpectralField"/> restricts it to the magnets by a correction of its own.
/// </remarks>
[StructLayout(LayoutKind.Auto)]
public readonly record struct MagneticLayers
{
    /// <summary>Magnet thickness along the magnetisation [m], > 0.</summary>
    public required double MagnetThickness { get; init; }

    /// <summary>Free distance from the magnets' face to the opposite magnet face or plate [m], > 0; ignored for an open stack.</summary>
    public double Gap { get; init; }

    /// <summary>Relative recoil permeability of the magnets [-], >= 1.</summary>
    public required double RecoilPermeability { get; init; }

    /// <summary>What lies across the gap.</summary>
    public required OppositeSide Opposite { get; init; }

    /// <summary>Steel behind the magnets (both discs of a twin rotor alike).</summary>
    public required SteelPlate Behind { get; init; }

    /// <summary>The plain plate across the gap; used with <see cref="OppositeSide.Plate"/> only.</summary>
    public SteelPlate OppositePlate { get; init; }

    /// <summary>Why the stack lies outside the model's domain, or null if it does not.</summary>
    public string? DomainFault
    {
        get
        {
            if (!(MagnetThickness > 0.0 && double.IsFinite(MagnetThickness)))
            {
                return "the magnet thickness must be positive";
            }

            if (Opposite != OppositeSide.Open && !(Gap > 0.0 && double.IsFinite(Gap)))
            {
                return "the gap must be positive";
            }

            if (!(RecoilPermeability >= 1.0 && double.IsFinite(RecoilPermeability)))
            {
                return "the recoil permeability must be at least 1";
            }

            return PlateFault(Behind) ?? (Opposite == OppositeSide.Plate ? PlateFault(OppositePlate) : null);
        }
    }

    /// <summary>The same stack with every steel part made ideal.</summary>
    /// <returns>The idealised stack; absent steel stays absent.</returns>
    public MagneticLayers WithIdealSteel() => this with
    {
        Behind = Behind.IsAbsent ? SteelPlate.None : SteelPlate.Ideal,
        OppositePlate = Opposite != OppositeSide.Plate || OppositePlate.IsAbsent ? OppositePlate : SteelPlate.Ideal,
    };

    /// <summary>Whether all steel present is ideal.</summary>
    public bool HasIdealSteel =>
        (Behind.IsAbsent || Behind.IsIdeal) && (Opposite != OppositeSide.Plate || OppositePlate.IsAbsent || OppositePlate.IsIdeal);

    private static string? PlateFault(SteelPlate plate) => plate.Thickness >= 0.0 && plate.RelativePermeability >= 1.0
        ? null
        : "a steel plate needs a thickness of zero or more and a relative permeability of at least 1";

    /// <summary>Response of the stack to a magnetisation of wave number k.</summary>
    /// <param name="k">Wave number [1/m], > 0.</param>
    /// <returns>Amplitudes from which the field at any height follows.</returns>
    /// <remarks>
    /// Scalar potential sinh/cosh(k z) in each layer, tangential H and normal B continuous. Limits: k to infinity gives half the
    /// magnetisation at the face; ideal steel and unit recoil permeability give the image solution.
    /// </remarks>
    /// <seealso>Boundary-value problem of AXIAL reference notes, section M2, generalised to any backing; method as in
    /// Zhu Z.Q., Howe D., IEEE Trans. Magn. 29(1), 1993, 124-135.</seealso>
    public LayerResponse Response(double k)
    {
        double depth = Opposite == OppositeSide.Magnets ? 0.5 * Gap : Gap;
        double farImpedance = Opposite switch
        {
            OppositeSide.Magnets => 0.0,
            OppositeSide.Plate => OppositePlate.Impedance(k),
            _ => 1.0,
        };
        double rho = (1.0 - farImpedance) / (1.0 + farImpedance);
        double fold = rho > 0.0 ? rho * Math.Exp(-2.0 * k * depth) : 0.0;
        double yUp = (1.0 + fold) / (1.0 - fold);
        double zDown = Behind.Impedance(k);
        double e = Math.Exp(-k * MagnetThickness);
        double ee = e * e;
        double t = (1.0 - ee) / (1.0 + ee);
        double sech = 2.0 * e / (1.0 + ee);
        double mu = RecoilPermeability;
        double denominator = 1.0 + (mu * t * zDown) + (yUp * zDown) + (yUp * t / mu);
        double drive = (t / mu) + (zDown * (1.0 - sech));
        double potentialDrop = drive + (zDown * ((1.0 - sech) + (yUp * t / mu)));
        return new LayerResponse
        {
            WaveNumber = k,
            Face = yUp * drive / denominator,
            Reflection = rho,
            Depth = depth,
            MeanOpposingField = potentialDrop / (denominator * k * MagnetThickness),
        };
    }
}
