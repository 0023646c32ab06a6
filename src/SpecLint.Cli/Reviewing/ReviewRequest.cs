using SpecLint.Review.Rules;

namespace SpecLint.Cli.Reviewing;

/// <summary>What the review command was asked for.</summary>
internal sealed record ReviewRequest
{
    public required IReadOnlyList<string> Paths { get; init; }

    public string? SarifPath { get; init; }

    public bool PrintsJson { get; init; }

    public IReadOnlyList<string> Rulebooks { get; init; } = [];

    public string? HousePath { get; init; }

    public Grade FailAt { get; init; } = Grade.Hold;

    public bool IncludesAll { get; init; }

    public IReadOnlyList<string> Changes { get; init; } = [];

    public DateOnly? On { get; init; }

    public string StandardInputName { get; init; } = "stdin.yaml";

    public bool LeavesOutWaived { get; init; }
}
