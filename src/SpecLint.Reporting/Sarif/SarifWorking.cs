using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Reporting.Derivations;

namespace SpecLint.Reporting.Sarif;

/// <summary>The working of a finding as a code flow: from the values of the spec to the figure that decides.</summary>
internal static class SarifWorking
{
    /// <summary>Levels of figures unfolded; deeper ones stand as they are, so that a log of many findings stays small.</summary>
    private const int Deepest = 4;

    /// <summary>Steps kept at most, the last ones being nearest to the figure.</summary>
    private const int MostSteps = 100;

    /// <summary>The code flow, or null when the finding rests on no figure.</summary>
    /// <param name="graph">The machine; null when there is none.</param>
    /// <param name="finding">The finding.</param>
    /// <param name="places">Locations in the spec.</param>
    /// <remarks>
    /// A value of the spec has its own line. A figure has none: its step stays on the line that the finding blames, and
    /// its logical location names it.
    /// </remarks>
    public static IList<CodeFlow>? Flow(FigureGraph? graph, Finding finding, SarifPlaces places)
    {
        if (graph is null || finding.Figures.IsEmpty)
        {
            return null;
        }

        var steps = Derivation.Walk(graph, finding.Figures, Deepest)
            .Where(step => step.Kind == FigureInputKind.Figure || step.Region is not null)
            .TakeLast(MostSteps)
            .Select(step => Step(step, finding, places))
            .ToList();
        return steps.Count == 0 ? null :
        [
            new CodeFlow
            {
                Message = SarifText.Message($"Working of {string.Join(", ", finding.Figures)} from the values of the spec"),
                ThreadFlows = [new ThreadFlow { Locations = steps }],
            },
        ];
    }

    private static ThreadFlowLocation Step(DerivationStep step, Finding finding, SarifPlaces places)
    {
        Location location = step.Region is { } region
            ? places.StepLocation(region, step.Name)
            : places.FigureLocation(finding.Region, step.Name);
        location.Message = SarifText.Message(Sentence(step));
        return new ThreadFlowLocation
        {
            Location = location,
            NestingLevel = step.Depth,
            Importance = step.Depth <= 1 ? ThreadFlowLocationImportance.Essential : ThreadFlowLocationImportance.Important,
        };
    }

    private static string Sentence(DerivationStep step)
    {
        if (step.Figure is not { } figure)
        {
            return $"{step.Name} is {step.Value}";
        }

        if (!figure.Outcome.HasValue)
        {
            return $"{step.Name} has no value: {step.Value}";
        }

        if (figure.Outcome.IsAssumed)
        {
            return $"{step.Name} is taken as {step.Value}: {figure.Outcome.Reason}";
        }

        return step.Formula == step.Substituted
            ? $"{step.Name} is {step.Value}, by {step.Formula}"
            : $"{step.Name} = {step.Formula} = {step.Substituted} = {step.Value}";
    }
}
