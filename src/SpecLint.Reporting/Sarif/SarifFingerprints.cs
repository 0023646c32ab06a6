using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using Microsoft.CodeAnalysis.Sarif;
using SpecLint.Review.Findings;
using SpecLint.Spec.Documents;

namespace SpecLint.Reporting.Sarif;

/// <summary>What makes the findings of one spec recognisable from run to run.</summary>
internal sealed class SarifFingerprints
{
    /// <summary>Ours: from path, rule and key, never from lines.</summary>
    public const string FindingName = "specLintFinding/v1";

    /// <summary>The one that code-scanning hosts compute from the text of the line.</summary>
    public const string LineName = "primaryLocationLineHash";

    private readonly string _relativePath;
    private readonly Dictionary<int, string>? _lineHashes;
    private readonly Dictionary<string, int> _counts = new(StringComparer.Ordinal);

    /// <summary>Fingerprints for a spec.</summary>
    /// <param name="spec">The spec.</param>
    /// <param name="relativePath">Its path from the working folder.</param>
    public SarifFingerprints(SpecDocument spec, string relativePath)
    {
        _relativePath = relativePath;
        _lineHashes = spec.Text.Length == 0 ? null : HashUtilities.RollingHash(spec.Text);
    }

    /// <summary>The fingerprints of the next finding; a second one of the same rule and key gets a number.</summary>
    /// <param name="finding">The finding.</param>
    public IDictionary<string, string> Next(Finding finding)
    {
        string triple = string.Join('\n', _relativePath, finding.Rule.Id, finding.Key);
        int number = _counts[triple] = _counts.GetValueOrDefault(triple) + 1;
        string text = number == 1 ? triple : string.Create(CultureInfo.InvariantCulture, $"{triple}\n{number}");
        var prints = new SortedDictionary<string, string>(StringComparer.Ordinal)
        {
            [FindingName] = Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)).AsSpan(0, 16)),
        };
        if (_lineHashes is not null && _lineHashes.TryGetValue(finding.Region.StartLine, out string? hash))
        {
            prints[LineName] = hash;
        }

        return prints;
    }
}
