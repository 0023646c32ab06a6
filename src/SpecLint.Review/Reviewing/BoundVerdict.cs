using SpecLint.Review.Expressions;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Reviewing;

/// <summary>How a measure stands to one bound.</summary>
internal sealed record BoundVerdict
{
    /// <summary>The bound.</summary>
    public required Bound Bound { get; init; }

    /// <summary>The limit that is nearer, or passed further, in SI.</summary>
    public double Limit { get; init; }

    /// <summary>True when that limit is a floor.</summary>
    public bool IsFloor { get; init; }

    /// <summary>Signed distance to it over the scale; negative is not met.</summary>
    public double Margin { get; init; }

    /// <summary>Grade of what is not met; null when it is met.</summary>
    public Grade? Grade { get; init; }

    /// <summary>True when the measured value itself is past the limit, whatever its band.</summary>
    public bool IsPassed { get; init; }

    /// <summary>True when the grade is lowered because the limit lies within the band of the measured value.</summary>
    public bool IsUncertain { get; init; }

    /// <summary>Why it cannot be judged; null when it was.</summary>
    public Evaluated? Lack { get; init; }
}
