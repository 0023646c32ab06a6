using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>Field of a layered machine for one wave number, per unit amplitude of mu0 times the magnetisation.</summary>
[StructLayout(LayoutKind.Auto)]
public readonly record struct LayerResponse
{
    /// <summary>Wave number [1/m].</summary>
    public required double WaveNumber { get; init; }

    /// <summary>Normal flux density at the magnets' face [-].</summary>
    public required double Face { get; init; }

    /// <summary>Share of the outgoing potential that the far side reflects with opposite sign [-]: 1 ideal plane, 0 free space.</summary>
    public required double Reflection { get; init; }

    /// <summary>Distance from the magnets' face to the reflecting plane [m]: half the gap between facing magnets.</summary>
    public required double Depth { get; init; }

    /// <summary>Mean over the magnet's thickness of -mu0 H_z [-].</summary>
    public required double MeanOpposingField { get; init; }

    /// <summary>Normal flux density at a height above the magnets' face [-].</summary>
    /// <param name="height">Height above the face [m], between zero and the gap.</param>
    /// <returns>Amplitude [-] that multiplies the magnetisation's.</returns>
    public double Normal(double height)
    {
        (double outgoing, double returned) = Waves(height);
        return outgoing + returned;
    }

    /// <summary>In-plane flux density at a height above the magnets' face [-].</summary>
    /// <param name="height">Height above the face [m], between zero and the gap.</param>
    /// <returns>Amplitude [-]; the field is this times minus the in-plane gradient of the harmonic over k.</returns>
    public double InPlane(double height)
    {
        (double outgoing, double returned) = Waves(height);
        return outgoing - returned;
    }

    /// <summary>Mean normal flux density over a layer of the gap [-].</summary>
    /// <param name="midHeight">Height of the layer's middle above the face [m].</param>
    /// <param name="thickness">Thickness of the layer [m], >= 0.</param>
    /// <returns>Amplitude [-].</returns>
    public double MeanNormal(double midHeight, double thickness)
    {
        double x = 0.5 * WaveNumber * thickness;
        if (x < SeriesLimit)
        {
            return Normal(midHeight) * (1.0 + (x * x * ((1.0 / 6.0) + (x * x / 120.0))));
        }

        double half = 0.5 * thickness;
        double k = WaveNumber;
        double up = Math.Exp(-k * (midHeight - half)) - Math.Exp(-k * (midHeight + half));
        double down = 0.0;
        double fold = 0.0;
        if (Reflection > 0.0)
        {
            double far = 2.0 * Depth;
            down = Reflection * (Math.Exp(-k * (far - midHeight - half)) - Math.Exp(-k * (far - midHeight + half)));
            fold = Reflection * Math.Exp(-k * far);
        }

        return Face * (up + down) / ((1.0 + fold) * 2.0 * x);
    }

    /// <summary>Product whose integral is twice mu0 times the pull across the gap: normal squared less in-plane squared [-].</summary>
    public double Pull
    {
        get
        {
            if (!(Reflection > 0.0))
            {
                return 0.0;
            }

            double fold = Reflection * Math.Exp(-2.0 * WaveNumber * Depth);
            double ratio = Face / (1.0 + fold);
            return 4.0 * fold * ratio * ratio;
        }
    }

    /// <summary>Below this half phase the thickness mean is taken from its power series.</summary>
    private const double SeriesLimit = 1e-2;

    private (double Outgoing, double Returned) Waves(double height)
    {
        double outgoing = Face * Math.Exp(-WaveNumber * height);
        if (!(Reflection > 0.0))
        {
            return (outgoing, 0.0);
        }

        double fold = Reflection * Math.Exp(-2.0 * WaveNumber * Depth);
        double returned = Face * Reflection * Math.Exp(-WaveNumber * ((2.0 * Depth) - height));
        return (outgoing / (1.0 + fold), returned / (1.0 + fold));
    }
}
