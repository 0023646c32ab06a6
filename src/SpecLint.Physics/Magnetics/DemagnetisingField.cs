using System.Runtime.InteropServices;

namespace SpecLint.Physics.Magnetics;

/// <summary>Opposing field inside an installed magnet at open circuit, per unit of remanence.</summary>
/// <remarks>Ideal steel and unit recoil permeability; a recoil permeability lowers the field by <see cref="SpectralField.RecoilFactor"/>.</remarks>
[StructLayout(LayoutKind.Auto)]
public readonly record struct DemagnetisingField
{
    private static readonly InteriorSamples.Counts Standard = new(8, 6, 10);

    /// <summary>Mean over the volume of -mu0 H_z/B_r [-].</summary>
    public required double Mean { get; init; }

    /// <summary>Value of -mu0 H_z/B_r that only one hundredth of the volume exceeds [-].</summary>
    public required double ExceededInOnePercent { get; init; }

    /// <summary>Computes the field of one magnet.</summary>
    /// <param name="magnets">The magnets; their <see cref="MagnetRow.DomainFault"/> must be null.</param>
    /// <param name="layers">The layers; steel counts as ideal.</param>
    /// <returns>Mean to about 0.5 %, the value of the worst hundredth to about 1 % of the remanence.</returns>
    /// <seealso>Magnetic charge with images, as in <see cref="ImageField"/>.</seealso>
    public static DemagnetisingField Of(MagnetRow magnets, MagneticLayers layers) => Of(magnets, layers, Standard);

    /// <summary>Computes the field of one magnet with a given sampling.</summary>
    /// <param name="magnets">The magnets.</param>
    /// <param name="layers">The layers.</param>
    /// <param name="counts">Numbers of sampling points.</param>
    /// <returns>Mean and worst hundredth.</returns>
    internal static DemagnetisingField Of(MagnetRow magnets, MagneticLayers layers, InteriorSamples.Counts counts)
    {
        InteriorField field = new(magnets, layers);
        InteriorSamples.Sample[] samples = InteriorSamples.List(magnets, layers, counts);
        double[] values = new double[samples.Length];
        double[] weights = new double[samples.Length];
        double mean = 0.0;
        for (int i = 0; i < samples.Length; i++)
        {
            values[i] = -field.NormalAt(samples[i].X, samples[i].Y, samples[i].Z);
            weights[i] = samples[i].Weight;
            mean += weights[i] * values[i];
        }

        Array.Sort(values, weights);
        return new DemagnetisingField { Mean = mean, ExceededInOnePercent = Quantile(values, weights, 0.01) };
    }

    /// <summary>Value that a share of the weight exceeds, between the middles of the ranked samples.</summary>
    private static double Quantile(double[] ascending, double[] weights, double share)
    {
        double above = 0.0;
        for (int i = ascending.Length - 1; i > 0; i--)
        {
            double here = above + (0.5 * weights[i]);
            double next = above + weights[i] + (0.5 * weights[i - 1]);
            if (share <= here)
            {
                return ascending[i];
            }

            if (share <= next)
            {
                double t = (share - here) / (next - here);
                return ascending[i] + (t * (ascending[i - 1] - ascending[i]));
            }

            above += weights[i];
        }

        return ascending[0];
    }
}
