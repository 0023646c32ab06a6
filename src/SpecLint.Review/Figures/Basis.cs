namespace SpecLint.Review.Figures;

/// <summary>Where a limit or a formula comes from.</summary>
public enum BasisKind
{
    /// <summary>A standard, named with its edition.</summary>
    Standard,

    /// <summary>A published text: book, paper, report.</summary>
    Published,

    /// <summary>Follows from physics.</summary>
    Derived,

    /// <summary>Custom of the trade, without a source.</summary>
    CommonPractice,

    /// <summary>A rule of the house that reviews.</summary>
    House,
}

/// <summary>Where a limit or a formula comes from, with the words to cite.</summary>
/// <param name="Kind">The kind of source.</param>
/// <param name="Source">Author, title, year, clause or equation; empty for common practice.</param>
public sealed record Basis(BasisKind Kind, string Source)
{
    /// <summary>The kind as written in rulebooks: <c>standard</c>, <c>published</c>, <c>derived</c>, <c>common-practice</c>, <c>house</c>.</summary>
    public string KindText => Kind switch
    {
        BasisKind.Standard => "standard",
        BasisKind.Published => "published",
        BasisKind.Derived => "derived",
        BasisKind.CommonPractice => "common-practice",
        _ => "house",
    };
}
