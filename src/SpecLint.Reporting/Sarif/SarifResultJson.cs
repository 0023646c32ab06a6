using System.Text.Json;
using Microsoft.CodeAnalysis.Sarif;

namespace SpecLint.Reporting.Sarif;

/// <summary>Writes results of the SARIF object model.</summary>
internal static class SarifResultJson
{
    /// <summary>Writes a result and lets the writer pass on what it holds, so that a long log is never in memory twice.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="result">The result.</param>
    public static void Write(Utf8JsonWriter json, Result result)
    {
        json.WriteStartObject();
        json.WriteString("ruleId", result.RuleId);
        json.WriteNumber("ruleIndex", result.RuleIndex);
        json.WriteString("kind", Word(result.Kind));
        json.WriteString("level", Word(result.Level));
        SarifJson.WriteMessage(json, "message", result.Message);
        SarifJson.WriteArray(json, "locations", result.Locations, Write);
        SarifJson.WriteArray(json, "relatedLocations", result.RelatedLocations, Write);
        SarifJson.WriteArray(json, "codeFlows", result.CodeFlows, Write);
        json.WriteStartObject("partialFingerprints");
        foreach (var (name, print) in result.PartialFingerprints)
        {
            json.WriteString(name, print);
        }

        json.WriteEndObject();
        SarifJson.WriteArray(json, "fixes", result.Fixes, Write);
        SarifJson.WriteArray(json, "suppressions", result.Suppressions, Write);
        if (result.BaselineState != BaselineState.None)
        {
            json.WriteString("baselineState", Word(result.BaselineState));
        }

        if (result.Rank >= 0)
        {
            json.WriteNumber("rank", result.Rank);
        }

        SarifJson.WriteProperties(json, result);
        json.WriteEndObject();
        json.Flush();
    }

    /// <summary>Writes where a file is.</summary>
    /// <param name="json">Where to.</param>
    /// <param name="location">The file.</param>
    public static void Write(Utf8JsonWriter json, ArtifactLocation location)
    {
        json.WriteStartObject();
        json.WriteString("uri", location.Uri.OriginalString);
        json.WriteNumber("index", location.Index);
        json.WriteEndObject();
    }

    /// <summary>The word of a level.</summary>
    /// <param name="level">The level.</param>
    public static string Word(FailureLevel level) => level switch
    {
        FailureLevel.Error => "error",
        FailureLevel.Warning => "warning",
        FailureLevel.Note => "note",
        _ => "none",
    };

    private static string Word(ResultKind kind) => kind switch
    {
        ResultKind.Pass => "pass",
        ResultKind.Open => "open",
        ResultKind.NotApplicable => "notApplicable",
        ResultKind.Informational => "informational",
        ResultKind.Review => "review",
        _ => "fail",
    };

    private static string Word(BaselineState state) => state switch
    {
        BaselineState.New => "new",
        BaselineState.Unchanged => "unchanged",
        BaselineState.Updated => "updated",
        _ => "absent",
    };

    private static void Write(Utf8JsonWriter json, Location location)
    {
        json.WriteStartObject();
        if (location.Id >= 0)
        {
            json.WriteNumber("id", (long)location.Id);
        }

        json.WriteStartObject("physicalLocation");
        json.WritePropertyName("artifactLocation");
        Write(json, location.PhysicalLocation.ArtifactLocation);
        WriteRegion(json, "region", location.PhysicalLocation.Region);
        WriteRegion(json, "contextRegion", location.PhysicalLocation.ContextRegion);
        json.WriteEndObject();
        SarifJson.WriteArray(json, "logicalLocations", location.LogicalLocations, static (json, logical) =>
        {
            json.WriteStartObject();
            json.WriteString("name", logical.Name);
            json.WriteString("fullyQualifiedName", logical.FullyQualifiedName);
            json.WriteString("kind", logical.Kind);
            json.WriteEndObject();
        });
        SarifJson.WriteMessage(json, "message", location.Message);
        json.WriteEndObject();
    }

    private static void WriteRegion(Utf8JsonWriter json, string name, Region? region)
    {
        if (region is null)
        {
            return;
        }

        json.WriteStartObject(name);
        WritePlace(json, "startLine", region.StartLine);
        WritePlace(json, "startColumn", region.StartColumn);
        WritePlace(json, "endLine", region.EndLine);
        WritePlace(json, "endColumn", region.EndColumn);
        if (region.Snippet is { } snippet)
        {
            json.WriteStartObject("snippet");
            json.WriteString("text", snippet.Text);
            json.WriteEndObject();
        }

        json.WriteEndObject();
    }

    private static void WritePlace(Utf8JsonWriter json, string name, int number)
    {
        if (number > 0)
        {
            json.WriteNumber(name, number);
        }
    }

    private static void Write(Utf8JsonWriter json, CodeFlow flow)
    {
        json.WriteStartObject();
        SarifJson.WriteMessage(json, "message", flow.Message);
        SarifJson.WriteArray(json, "threadFlows", flow.ThreadFlows, static (json, thread) =>
        {
            json.WriteStartObject();
            SarifJson.WriteArray(json, "locations", thread.Locations, Write);
            json.WriteEndObject();
        });
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, ThreadFlowLocation step)
    {
        json.WriteStartObject();
        json.WritePropertyName("location");
        Write(json, step.Location);
        json.WriteNumber("nestingLevel", step.NestingLevel);
        json.WriteString("importance", step.Importance switch
        {
            ThreadFlowLocationImportance.Essential => "essential",
            ThreadFlowLocationImportance.Unimportant => "unimportant",
            _ => "important",
        });
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, Suppression suppression)
    {
        json.WriteStartObject();
        json.WriteString("kind", suppression.Kind == SuppressionKind.InSource ? "inSource" : "external");
        json.WriteString("status", suppression.Status switch
        {
            SuppressionStatus.UnderReview => "underReview",
            SuppressionStatus.Rejected => "rejected",
            _ => "accepted",
        });
        json.WriteString("justification", suppression.Justification);
        json.WritePropertyName("location");
        Write(json, suppression.Location);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, Fix fix)
    {
        json.WriteStartObject();
        SarifJson.WriteMessage(json, "description", fix.Description);
        SarifJson.WriteArray(json, "artifactChanges", fix.ArtifactChanges, static (json, change) =>
        {
            json.WriteStartObject();
            json.WritePropertyName("artifactLocation");
            Write(json, change.ArtifactLocation);
            SarifJson.WriteArray(json, "replacements", change.Replacements, static (json, replacement) =>
            {
                json.WriteStartObject();
                WriteRegion(json, "deletedRegion", replacement.DeletedRegion);
                if (replacement.InsertedContent is { } content)
                {
                    json.WriteStartObject("insertedContent");
                    json.WriteString("text", content.Text);
                    json.WriteEndObject();
                }

                json.WriteEndObject();
            });
            json.WriteEndObject();
        });
        json.WriteEndObject();
    }
}
