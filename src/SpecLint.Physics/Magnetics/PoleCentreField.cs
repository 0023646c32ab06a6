namespace SpecLint.Physics.Magnetics;

/// <summary>Normal flux density over the centre of a pole at the magnets' pitch radius.</summary>
/// <remarks>
/// Image sums of closed forms, right up to the magnets' face; real plates and recoil permeability enter by the ratio by which they
/// lower the fundamental linkage. Within 0.01 % for ideal steel, about 1 % otherwise.
/// </remarks>
public sealed class PoleCentreField
{
    /// <summary>Heights at which the field is looked at between the winding's faces.</summary>
    private const int Steps = 8;

    private readonly SpectralField _field;
    private readonly ImageField _image;

    /// <summary>Field over a pole centre.</summary>
    /// <param name="field">The machine's field.</param>
    public PoleCentreField(SpectralField field)
    {
        ArgumentNullException.ThrowIfNull(field);
        _field = field;
        _image = new ImageField(field.Magnets.Row, field.Stack);
    }

    /// <summary>Normal flux density at one height.</summary>
    /// <param name="height">Height above the magnets' face [m], > 0 and inside the gap.</param>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>B_z [T].</returns>
    public double At(double height, double remanentFluxDensity) =>
        _field.SteelAndRecoilFactor * _image.NormalFluxDensity(_field.Magnets.Row.PitchRadius, 0.0, height, remanentFluxDensity);

    /// <summary>Lowest and highest normal flux density through the winding's thickness.</summary>
    /// <param name="remanentFluxDensity">Remanent flux density [T].</param>
    /// <returns>The two values [T], from nine equally spaced heights including both faces.</returns>
    public (double Lowest, double Highest) ThroughWinding(double remanentFluxDensity)
    {
        double lowest = double.PositiveInfinity;
        double highest = double.NegativeInfinity;
        bool symmetric = _field.Stack.Opposite == OppositeSide.Magnets && IsMidway();
        for (int i = 0; i <= (symmetric ? Steps / 2 : Steps); i++)
        {
            double height = _field.Layer.LowestHeight + (_field.Layer.Thickness * i / Steps);
            double value = At(height, remanentFluxDensity);
            lowest = Math.Min(lowest, value);
            highest = Math.Max(highest, value);
        }

        return (lowest, highest);
    }

    private bool IsMidway() => Math.Abs((2.0 * _field.Layer.MidHeight) - _field.Stack.Gap) < 1e-9 * _field.Stack.Gap;
}
