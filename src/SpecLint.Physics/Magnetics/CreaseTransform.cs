using SpecLint.Physics.Geometry;

namespace SpecLint.Physics.Magnetics;

/// <summary>Transform of the turn density of a keystone or rectangular coil.</summary>
/// <remarks>
/// Minus k^2 times the transform is the sum over the <see cref="CoilCreases"/> of jump times line transform, each line transform a
/// difference of the phases of the line's ends over the difference of their path. Collected by corners this is one phase per corner
/// with a weight that does not depend on k.
/// Source: transform of a polygon by its edges, Lee S.-W., Mittra R., IEEE Trans. Antennas Propag. 31(1), 1983, 99-103, applied to the Laplacian.
/// </remarks>
internal sealed class CreaseTransform : IPlaneTransform
{
    /// <summary>Lines nearer than this to a wave front are met at an angle turned by <see cref="Nudge"/>.</summary>
    private const double GrazingLimit = 1e-7;

    private const double Nudge = 1e-6;
    private readonly CoilCreases _creases;
    private readonly double _holeLeg;
    private readonly double _outerLeg;
    private readonly double _innerMitre;
    private readonly double _outerMitre;

    /// <summary>Describes the coil.</summary>
    /// <param name="coil">A keystone or rectangle; a corner radius is left out.</param>
    public CreaseTransform(in CoilOutline coil)
    {
        _creases = new CoilCreases(coil, 0.0);
        _holeLeg = -_creases.Slope * _creases.HoleLeg;
        _outerLeg = _creases.Slope * _creases.RimLeg;
        _innerMitre = -_creases.InnerMitreJump * _creases.InnerMitre;
        _outerMitre = -_creases.OuterMitreJump * _creases.OuterMitre;
    }

    /// <inheritdoc/>
    public double Reach => _creases.RimOuter.Radius;

    /// <inheritdoc/>
    public void Sample((double Cosine, double Sine) direction, bool odd, PhaseTable table, Span<double> value)
    {
        value.Clear();
        Span<double> cosine = table.Line(0);
        Span<double> sine = table.Line(1);
        Span<double> wanted = odd ? cosine : sine;
        double sign = odd ? 1.0 : -1.0;
        Span<double> paths = stackalloc double[4];
        Span<double> weights = stackalloc double[4];
        for (int side = -1; side <= 1; side += 2)
        {
            CornerWeights(direction.Cosine, side * direction.Sine, paths, weights);
            for (int v = 0; v < paths.Length; v++)
            {
                table.Fill(paths[v], cosine, sine);
                PhaseTable.AddScaled(sign * weights[v], wanted, value);
            }
        }
    }

    /// <inheritdoc/>
    public void NodeFactor(PhaseTable table, Span<double> factor)
    {
        for (int i = 0; i < factor.Length; i++)
        {
            double k = table.WaveNumbers[i];
            factor[i] = 1.0 / (k * k * k);
        }
    }

    /// <inheritdoc/>
    public double OrderFactor(int order) => 1.0;

    private void CornerWeights(double c, double s, Span<double> path, Span<double> weight)
    {
        for (int attempt = 0; attempt < 2; attempt++)
        {
            path[0] = (c * _creases.HoleInner.Across) + (s * _creases.HoleInner.Along);
            path[1] = (c * _creases.HoleOuter.Across) + (s * _creases.HoleOuter.Along);
            path[2] = (c * _creases.RimInner.Across) + (s * _creases.RimInner.Along);
            path[3] = (c * _creases.RimOuter.Across) + (s * _creases.RimOuter.Along);
            double hole = path[1] - path[0];
            double outer = path[3] - path[2];
            double innerMitre = path[2] - path[0];
            double outerMitre = path[3] - path[1];
            double least = Math.Min(Math.Min(Math.Abs(hole), Math.Abs(outer)), Math.Min(Math.Abs(innerMitre), Math.Abs(outerMitre)));
            if (attempt == 0 && least * _creases.Slope < GrazingLimit)
            {
                (c, s) = (c - (Nudge * s), s + (Nudge * c));
                continue;
            }

            double bar = _creases.Slope / s;
            double holeLeg = _holeLeg / hole;
            double outerLeg = _outerLeg / outer;
            double atInner = _innerMitre / innerMitre;
            double atOuter = _outerMitre / outerMitre;
            weight[0] = -bar - holeLeg - atInner;
            weight[1] = -bar + holeLeg - atOuter;
            weight[2] = bar - outerLeg + atInner;
            weight[3] = bar + outerLeg + atOuter;
            return;
        }
    }
}
