using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>Finds the place of some characters of a YAML scalar.</summary>
internal static class ScalarPlace
{
    /// <summary>
    /// The place of a stretch of a scalar's text; the whole scalar where escapes or line breaks keep its characters from being counted.
    /// </summary>
    public static Region Of(YamlScalar scalar, int start, int length)
    {
        Region whole = scalar.Region;
        int quote = scalar.IsPlain ? 0 : 1;
        bool counts = whole.StartLine == whole.EndLine && whole.EndColumn - whole.StartColumn == scalar.Text.Length + (2 * quote);
        if (!counts)
        {
            return whole;
        }

        int first = whole.StartColumn + quote + start;
        return new Region(whole.StartLine, first, whole.StartLine, first + Math.Max(length, 1));
    }
}
