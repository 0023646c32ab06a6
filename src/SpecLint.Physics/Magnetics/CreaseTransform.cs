namespace SpecLint.Physics.Magnetics;

/// <summary>Transform of the turn density of a keystone or rectangular coil.</summary>
/// <remarks>
/// The turn density is a pyramid frustum: constant in the hole, falling linearly across the leg. Its Laplacian is concentrated on its
/// twelve crease lines, with the jump of the gradient as strength (hole edges -1/w, outer edges 1/w, mitres -|n2 - n1|/w), so minus k^2
/// times the transform is the sum of the line transforms, each a difference of the phases of the line's ends over the difference of
/// their path. Collected by corners this is one phase per corner with a weight that does not depend on k.
/// Source: transform of a polygon by its edges, Lee S.-W., Mittra R., IEEE Trans. Antennas Propag. 31(1), 1983, 99-103, applied to the Laplacian.
/// </remarks>
internal sealed class CreaseTransform : IPlaneTransform
{
    /// <summary>Lines nearer than this to a wave front are met at an angle turned by <see cref="Nudge"/>.</summary>
    private const double GrazingLimit = 1e-7;

    private const double Nudge = 1e-6;
    private readonly CoilOutline _outline;
    private readonly CreaseStrengths _strengths;

    /// <summary>Describes the coil.</summary>
    /// <param name="coil">A keystone or rectangle.</param>
    public CreaseTransform(in CoilGeometry coil)
    {
        _outline = CoilOutline.Of(coil);
        _strengths = CreaseStrengths.Of(_outline);
    }

    /// <inheritdoc/>
    public double Reach => double.Hypot(_outline.OuterEndOuter, _outline.OuterEndOuterHalfWidth);

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
            path[0] = (c * _outline.InnerEnd) + (s * _outline.InnerEndHalfWidth);
            path[1] = (c * _outline.OuterEnd) + (s * _outline.OuterEndHalfWidth);
            path[2] = (c * _outline.InnerEndOuter) + (s * _outline.InnerEndOuterHalfWidth);
            path[3] = (c * _outline.OuterEndOuter) + (s * _outline.OuterEndOuterHalfWidth);
            double hole = path[1] - path[0];
            double outer = path[3] - path[2];
            double innerMitre = path[2] - path[0];
            double outerMitre = path[3] - path[1];
            double least = Math.Min(Math.Min(Math.Abs(hole), Math.Abs(outer)), Math.Min(Math.Abs(innerMitre), Math.Abs(outerMitre)));
            if (attempt == 0 && least < GrazingLimit * _outline.LegWidth)
            {
                (c, s) = (c - (Nudge * s), s + (Nudge * c));
                continue;
            }

            double bar = 1.0 / (_outline.LegWidth * s);
            double holeLeg = _strengths.HoleLeg / hole;
            double outerLeg = _strengths.OuterLeg / outer;
            double atInner = _strengths.InnerMitre / innerMitre;
            double atOuter = _strengths.OuterMitre / outerMitre;
            weight[0] = -bar - holeLeg - atInner;
            weight[1] = -bar + holeLeg - atOuter;
            weight[2] = bar - outerLeg + atInner;
            weight[3] = bar + outerLeg + atOuter;
            return;
        }
    }
}
