using System.Collections.Immutable;

namespace SpecLint.Physics.Magnetics;

/// <summary>Open-circuit field of a coreless machine by the spectral method: linkage, force, flux, demagnetising factor.</summary>
/// <remarks>
/// <para>Magnets and coil enter through their transforms, the layers through one response per wave number. All results are
/// proportional to the remanent flux density, which is passed to each of them; they are computed once when first asked for. Use one instance from one
/// thread at a time.</para>
/// <para>Exact for ideal planes and unit recoil permeability. Recoil permeability inside the magnets only is applied by the first-order
/// factor 1/(1 + (mu_r - 1) N), N being the demagnetising factor of the installed magnet weighted with the coil's field; plates of finite
/// thickness and permeability are treated as unbounded. Against three-dimensional finite elements with real disc rims the fundamental linkage
/// then agrees within 0.5 %.</para>
/// </remarks>
/// <seealso>Bumby J.R., Martin R., IEE Proc. Electr. Power Appl. 152(5), 2005, 1065-1075 (two-dimensional form); reference notes on axial
/// machines, section M2 (three-dimensional form).</seealso>
public sealed class SpectralField
{
    private readonly SpectralSum _sum;
    private readonly MagneticLayers _ideal;
    private readonly MagneticLayers _slab;
    private FluxLinkageHarmonics? _idealLinkage;
    private FluxLinkageHarmonics? _linkage;
    private FluxLinkageHarmonics? _slabLinkage;
    private (double Value, double Error)? _force;
    private (double Value, double Error)? _idealForce;
    private (double Value, double Error)? _demagnetisingFactor;
    private double? _coilWeightedFactor;

    /// <summary>Couples magnets, coil and layers.</summary>
    /// <param name="magnets">Spectrum of the magnets.</param>
    /// <param name="coil">Spectrum of the coil, on the same grid.</param>
    /// <param name="stack">The layers; their <see cref="MagneticLayers.DomainFault"/> must be null.</param>
    /// <param name="layer">Place of the winding in the gap.</param>
    /// <exception cref="ArgumentException">The stack is outside the model's domain, or the grids differ.</exception>
    public SpectralField(MagnetTransform magnets, CoilTransform coil, MagneticLayers stack, CoilLayer layer)
    {
        ArgumentNullException.ThrowIfNull(magnets);
        ArgumentNullException.ThrowIfNull(coil);
        if (stack.DomainFault is { } fault)
        {
            throw new ArgumentException(fault, nameof(stack));
        }

        if (magnets.Grid != coil.Grid)
        {
            throw new ArgumentException("magnets and coil must share one wave-number grid", nameof(coil));
        }

        Magnets = magnets;
        Coil = coil;
        Stack = stack;
        Layer = layer;
        _sum = new SpectralSum(magnets);
        _slab = stack with { RecoilPermeability = 1.0 };
        _ideal = _slab.WithIdealSteel();
    }

    /// <summary>Spectrum of the magnets.</summary>
    public MagnetTransform Magnets { get; }

    /// <summary>Spectrum of the coil.</summary>
    public CoilTransform Coil { get; }

    /// <summary>The layers.</summary>
    public MagneticLayers Stack { get; }

    /// <summary>Place of the winding.</summary>
    public CoilLayer Layer { get; }

    /// <summary>Mean demagnetising factor of the installed magnet: one minus its mean flux density over its remanence.</summary>
    /// <remarks>
    /// Ideal steel, unit recoil permeability. The sum is damped at high wave numbers, where its terms are known: every edge of a free face adds
    /// its length over pi k^3; the damped share is added back in closed form.
    /// </remarks>
    public double MeanDemagnetisingFactor => (_demagnetisingFactor ??= ComputeDemagnetisingFactor()).Value;

    /// <summary>Installed permeance coefficient at open circuit, (1 - N)/N.</summary>
    public double PermeanceCoefficient => (1.0 - MeanDemagnetisingFactor) / MeanDemagnetisingFactor;

    /// <summary>Demagnetising factor weighted with the field that the coil would make in the magnet [-].</summary>
    /// <remarks>Exact to first order in mu_r - 1 for the fundamental linkage, where the plain mean N is an approximation; to about 1 %.</remarks>
    public double CoilWeightedDemagnetisingFactor => _coilWeightedFactor ??= CoilWeightedDemagnetisation.Factor(Magnets, Coil, _ideal, Layer);

    /// <summary>Factor on the field for the recoil permeability of the magnets [-], 1/(1 + (mu_r - 1) N), N weighted with the coil's field.</summary>
    public double RecoilFactor =>
        Stack.RecoilPermeability > 1.0 ? 1.0 / (1.0 + ((Stack.RecoilPermeability - 1.0) * CoilWeightedDemagnetisingFactor)) : 1.0;

    /// <summary>Factor by which real plates and recoil permeability lower the field on a pole centre [-].</summary>
    /// <remarks>Plates by the response at the wave number of the pole pitch, which the linkage's own ratio follows within 0.2 %.</remarks>
    public double SteelAndRecoilFactor
    {
        get
        {
            double k = Math.PI / Magnets.Row.PitchArc;
            return RecoilFactor * _slab.Response(k).Normal(Layer.MidHeight) / _ideal.Response(k).Normal(Layer.MidHeight);
        }
    }

    /// <summary>Flux linkage per turn with real plates and recoil permeability.</summary>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Harmonics 1 to 15 [Wb per turn].</returns>
    public FluxLinkageHarmonics FluxLinkage(double remanentFluxDensity) =>
        (_linkage ??= UnitSlabLinkage.Scaled(RecoilFactor)).Scaled(remanentFluxDensity);

    /// <summary>Flux linkage per turn with ideal steel and unit recoil permeability.</summary>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Harmonics 1 to 15 [Wb per turn].</returns>
    public FluxLinkageHarmonics IdealFluxLinkage(double remanentFluxDensity) =>
        (_idealLinkage ??= _slab == _ideal ? UnitSlabLinkage : FluxLinkageIn(_ideal)).Scaled(remanentFluxDensity);

    private FluxLinkageHarmonics UnitSlabLinkage => _slabLinkage ??= FluxLinkageIn(_slab);

    /// <summary>Flux linkage per turn and unit remanence in any stack, its recoil permeability filling the whole magnet layer.</summary>
    /// <param name="stack">The layers.</param>
    /// <returns>Harmonics 1 to 15 [Wb per turn and T].</returns>
    public FluxLinkageHarmonics FluxLinkageIn(MagneticLayers stack)
    {
        Span<double> sums = stackalloc double[FluxLinkageHarmonics.Count];
        double error = _sum.PerHarmonic(
            stack, (in LayerResponse r) => r.MeanNormal(Layer.MidHeight, Layer.Thickness), (block, j) => Coil.Harmonic(block, j), sums);
        return new FluxLinkageHarmonics { Amplitudes = [.. sums], NumericalError = error };
    }

    /// <summary>Attraction across the gap with real plates and recoil permeability.</summary>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Total force [N] (axial), force per pole [N] (linear), positive for attraction; NaN for an open stack, which pulls on nothing.</returns>
    public double AttractionForce(double remanentFluxDensity) =>
        (_force ??= ForceIn(_slab)).Value * RecoilFactor * RecoilFactor * remanentFluxDensity * remanentFluxDensity;

    /// <summary>Attraction across the gap with ideal steel and unit recoil permeability.</summary>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>Total force [N] (axial), force per pole [N] (linear), positive for attraction; NaN for an open stack, which pulls on nothing.</returns>
    public double IdealAttractionForce(double remanentFluxDensity) =>
        (_idealForce ??= ForceIn(_ideal)).Value * remanentFluxDensity * remanentFluxDensity;

    /// <summary>Sums over the magnets' spectrum.</summary>
    internal SpectralSum Sum => _sum;

    /// <summary>The layers with their real plates and unit recoil permeability.</summary>
    internal MagneticLayers SlabLayers => _slab;

    private (double Value, double Error) ForceIn(MagneticLayers stack)
    {
        if (stack.Opposite == OppositeSide.Open)
        {
            return (double.NaN, 0.0);
        }

        double measure = Magnets.Grid.IsLinear ? 0.5 * Magnets.Grid.PolePitch : Math.PI;
        (double sum, double error) = _sum.AllHarmonics(stack, (in LayerResponse r) => r.Pull, null, _ => 1.0);
        double scale = measure / (2.0 * MagneticConstant.Mu0);
        return (sum * scale, error * scale);
    }

    private (double Value, double Error) ComputeDemagnetisingFactor()
    {
        const int Blocks = 3;
        double cut = Blocks * Magnets.Grid.BlockWidth / CutShare;
        MagnetRow g = Magnets.Row;
        double measure = (Magnets.Grid.IsLinear ? 0.5 * Magnets.Grid.PolePitch : 0.5 * Math.PI / g.PolePairs) / g.FaceArea;
        double sum = measure * _sum.AllHarmonics(
            _ideal, (in LayerResponse r) => r.MeanOpposingField * Math.Exp(-Math.Pow(r.WaveNumber / cut, 4.0)), null, _ => 1.0).Sum;
        double freeFaces = _ideal.Behind.IsAbsent ? 2.0 : 1.0;
        double tail = TailIntegral * freeFaces * g.FacePerimeter / (2.0 * Math.PI * g.FaceArea * _ideal.MagnetThickness * cut * cut);
        return (sum + tail, 0.05 * tail);
    }

    /// <summary>Ratio of the last wave number to the damping's scale; exp(-1.9^4) is 2e-6.</summary>
    private const double CutShare = 1.9;

    /// <summary>Integral of (1 - exp(-u^4)) u^-3 from zero to infinity, sqrt(pi)/2.</summary>
    private const double TailIntegral = 0.88622692545275801;
}
