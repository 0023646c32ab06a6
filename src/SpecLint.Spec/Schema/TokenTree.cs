using System.Globalization;
using Newtonsoft.Json.Linq;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Schema;

/// <summary>Where a token of the checked tree comes from.</summary>
/// <param name="Key">Dotted key.</param>
/// <param name="KeyRegion">Where the key stands.</param>
/// <param name="Node">The value.</param>
/// <param name="Schema">Its place in the schema; null when the key is unknown.</param>
internal sealed record TokenOrigin(string Key, Region KeyRegion, YamlNode Node, SchemaNode? Schema);

/// <summary>The spec's tree as tokens for the schema library, each with the way back to its place in the text.</summary>
internal sealed class TokenTree
{
    private readonly Dictionary<JToken, TokenOrigin> _origins = new(ReferenceEqualityComparer.Instance);

    internal TokenOrigin? OriginOf(JToken? token) => token is not null && _origins.TryGetValue(token, out var origin) ? origin : null;

    internal JToken Convert(YamlMapping root) => Convert(root, new TokenOrigin("", Region.Beginning, root, KeyCatalogue.Root));

    private JToken Convert(YamlNode node, TokenOrigin origin)
    {
        JToken token = node switch
        {
            YamlMapping mapping => Object(mapping, origin),
            YamlSequence list => Array(list, origin),
            _ => Scalar((YamlScalar)node),
        };
        _origins[token] = origin;
        return token;
    }

    private JObject Object(YamlMapping mapping, TokenOrigin origin)
    {
        var result = new JObject();
        foreach (var entry in mapping.Entries)
        {
            string key = origin.Key.Length == 0 ? entry.Key.Text : $"{origin.Key}.{entry.Key.Text}";
            var child = new TokenOrigin(key, entry.Key.Region, entry.Value, origin.Schema?.Child(entry.Key.Text));
            var property = new JProperty(entry.Key.Text, Convert(entry.Value, child));
            result.Add(property);
            _origins[property] = child;
        }

        return result;
    }

    private JArray Array(YamlSequence list, TokenOrigin origin)
    {
        var result = new JArray();
        for (int i = 0; i < list.Items.Length; i++)
        {
            var item = list.Items[i];
            string key = string.Create(CultureInfo.InvariantCulture, $"{origin.Key}[{i}]");
            result.Add(Convert(item, new TokenOrigin(key, item.AliasSite ?? item.Region, item, origin.Schema?.Item)));
        }

        return result;
    }

    private static JValue Scalar(YamlScalar scalar)
    {
        if (CoreSchema.IsNull(scalar))
        {
            return JValue.CreateNull();
        }

        if (CoreSchema.TryReadFlag(scalar, out bool flag))
        {
            return new JValue(flag);
        }

        if (scalar.IsPlain && int.TryParse(scalar.Text, NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out int whole))
        {
            return new JValue(whole);
        }

        return CoreSchema.TryReadNumber(scalar, out double number) ? new JValue(number) : new JValue(scalar.Text);
    }
}
