using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Reporting.Output;
using SpecLint.Reporting.Quantities;

namespace SpecLint.Reporting.Sarif;

/// <summary>The findings of one review as results.</summary>
internal sealed class SarifResults
{
    private readonly MachineReview _review;
    private readonly SarifOptions _options;
    private readonly SarifRules _rules;
    private readonly SarifPlaces _places;
    private readonly SarifFingerprints _fingerprints;

    /// <summary>The results of a review.</summary>
    /// <param name="review">The review.</param>
    /// <param name="options">What is wanted.</param>
    /// <param name="rules">The rules of the run.</param>
    /// <param name="places">Locations in its spec.</param>
    /// <param name="relativePath">Its path from the working folder.</param>
    public SarifResults(MachineReview review, SarifOptions options, SarifRules rules, SarifPlaces places, string relativePath)
    {
        _review = review;
        _options = options;
        _rules = rules;
        _places = places;
        _fingerprints = new SarifFingerprints(review.Spec, relativePath);
    }

    /// <summary>The results in the order of the findings.</summary>
    public IEnumerable<Result> All()
    {
        foreach (Finding finding in _review.Findings)
        {
            // Numbered before anything is left out, so that options do not change a fingerprint.
            IDictionary<string, string> fingerprints = _fingerprints.Next(finding);
            if (IsWanted(finding))
            {
                yield return Result(finding, fingerprints);
            }
        }
    }

    /// <summary>Weight of an unmet finding: the grade sets the band, the margin the place in it.</summary>
    /// <param name="finding">The finding.</param>
    /// <returns>Hold 70 to 100, query 40 to 70, remark 10 to 40; the middle of the band where nothing is measured.</returns>
    internal static double Rank(Finding finding)
    {
        double lowest = finding.Grade switch { Grade.Hold => 70, Grade.Query => 40, _ => 10 };
        double excess = Math.Max(0, -(finding.Margin ?? -1));
        return Math.Round(lowest + (30 * excess / (1 + excess)), 1);
    }

    private bool IsWanted(Finding finding) => finding.Kind switch
    {
        FindingKind.Unmet => finding.Waiver is null || !_options.LeavesOutWaived,
        FindingKind.Hazard => true,
        _ => _options.IncludesAll,
    };

    private Result Result(Finding finding, IDictionary<string, string> fingerprints)
    {
        bool isUnmet = finding.Kind == FindingKind.Unmet;
        var result = new Result
        {
            RuleId = finding.Rule.Id,
            RuleIndex = _rules.IndexOf(finding.Rule),
            Level = isUnmet ? SarifRules.LevelOf(finding.Grade) : FailureLevel.None,
            Message = SarifText.Message(finding.Message.Length > 0 ? finding.Message : finding.Rule.Title),
            Locations = [_places.LocationWithContext(finding.Region, finding.Key)],
            RelatedLocations = RelatedLocations(finding),
            CodeFlows = isUnmet ? SarifWorking.Flow(_review.Figures, finding, _places) : null,
            PartialFingerprints = fingerprints,
            Suppressions = Suppressions(finding),
        };
        if (isUnmet)
        {
            result.Rank = Rank(finding);
        }
        else
        {
            // Only after the level: each of the two resets the other.
            result.Kind = KindOf(finding.Kind);
        }

        SetProperties(result, finding);
        return result;
    }

    private static ResultKind KindOf(FindingKind kind) => kind switch
    {
        FindingKind.Met => ResultKind.Pass,
        FindingKind.Open => ResultKind.Open,
        FindingKind.NotApplicable => ResultKind.NotApplicable,
        FindingKind.Hazard => ResultKind.Informational,
        _ => ResultKind.Fail,
    };

    private List<Location>? RelatedLocations(Finding finding)
    {
        var related = new List<Location>();
        foreach (RelatedPlace place in finding.Related)
        {
            Location location = _places.Location(place.Region, place.Key);
            location.Id = related.Count + 1;
            location.Message = SarifText.Message(place.Message.Length > 0 ? place.Message : place.Key);
            related.Add(location);
        }

        return related.Count == 0 ? null : related;
    }

    /// <summary>Waivers are looked at for every finding, so every result says so: an empty list means not suppressed.</summary>
    private List<Suppression> Suppressions(Finding finding)
    {
        if (finding.Waiver is not { } waiver)
        {
            return [];
        }

        string until = waiver.Until.Length > 0 ? $", until {waiver.Until}" : "";
        string approval = waiver.ApprovedBy.Length > 0 ? $"approved by {waiver.ApprovedBy}" : "not yet approved";
        return
        [
            new Suppression
            {
                Kind = SuppressionKind.External,
                Status = waiver.ApprovedBy.Length > 0 ? SuppressionStatus.Accepted : SuppressionStatus.UnderReview,
                Justification = Printable.Line($"{waiver.Reason.TrimEnd().TrimEnd('.')}; {approval}{until}."),
                Location = _places.Location(waiver.Region, "waivers"),
            },
        ];
    }

    private static void SetProperties(Result result, Finding finding)
    {
        DisplayUnit unit = DisplayUnit.Of(finding.DisplayUnit, finding.Dimension);
        SetNumber(result, "value", finding.Value, unit.FromSi);
        SetNumber(result, "bound", finding.Limit, unit.FromSi);
        SetNumber(result, "uncertainty", finding.Uncertainty, unit.DifferenceFromSi);
        SetNumber(result, "margin", finding.Margin, margin => margin);
        if (finding.Value is not null || finding.Limit is not null)
        {
            result.SetProperty("unit", unit.Symbol.Length == 0 ? "1" : unit.Symbol);
        }

        if (finding.Kind == FindingKind.Open)
        {
            result.SetProperty("missingKeys", finding.MissingKeys.Select(Printable.Line).ToArray());
        }

        result.SetProperty("safetyNotes", finding.Rule.Safety.Select(Printable.Sentence).ToArray());
    }

    private static void SetNumber(Result result, string name, double? number, Func<double, double> convert)
    {
        if (number is { } value && double.IsFinite(value))
        {
            result.SetProperty(name, BandText.Rounded(convert(value)));
        }
    }
}
