namespace SpecLint.Review.Rules;

/// <summary>How grave an unmet rule is.</summary>
public enum Grade
{
    /// <summary>Worth knowing.</summary>
    Remark,

    /// <summary>The designer must answer.</summary>
    Query,

    /// <summary>Do not build.</summary>
    Hold,
}
