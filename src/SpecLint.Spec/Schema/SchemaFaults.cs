using NJsonSchema;
using NJsonSchema.Validation;
using Newtonsoft.Json.Linq;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Names;
using SpecLint.Spec.Yaml;

namespace SpecLint.Spec.Schema;

/// <summary>Turns the schema library's errors into faults with a place and a sentence.</summary>
internal sealed class SchemaFaults(TokenTree tree)
{
    private readonly List<SpecFault> _faults = [];

    internal IReadOnlyList<SpecFault> From(IEnumerable<ValidationError> errors)
    {
        var missing = new List<(string Parent, string Name, Region Place)>();
        var guessed = new HashSet<string>(StringComparer.Ordinal);
        foreach (var error in errors.SelectMany(Causes))
        {
            if (_faults.Count >= FaultCollector.MostFaults)
            {
                break;
            }

            if (error.Kind == ValidationErrorKind.PropertyRequired)
            {
                if (tree.OriginOf(error.Token) is { Node: YamlMapping } parent)
                {
                    missing.Add((parent.Key, error.Property ?? "", parent.KeyRegion));
                }
            }
            else if (error.Kind == ValidationErrorKind.NoAdditionalPropertiesAllowed)
            {
                Unknown(error, guessed);
            }
            else
            {
                Wrong(error);
            }
        }

        foreach (var (parent, name, place) in missing)
        {
            string key = parent.Length == 0 ? name : $"{parent}.{name}";

            // A mistyped key is one fault, not a stranger and an absentee.
            if (!guessed.Contains(key))
            {
                string wanted = KeyCatalogue.FindNode(key) is { } node ? FaultText.Wanted(node, "") : "a value";
                _faults.Add(new SpecFault(parent, $"{key} is missing; {wanted} is expected", place) { AbsentKey = key });
            }
        }

        return _faults;
    }

    /// <summary>The errors inside an error: those of a list's item, and of the one alternative that has the value's own shape.</summary>
    private static IEnumerable<ValidationError> Causes(ValidationError error)
    {
        var inner = error switch
        {
            ChildSchemaValidationError child => child.Errors.Values.SelectMany(e => e),
            MultiTypeValidationError alternatives => alternatives.Errors.Where(e => IsShapeOf(e.Key, error.Token)).SelectMany(e => e.Value),
            _ => [],
        };
        bool hasCauses = false;
        foreach (var cause in inner.SelectMany(Causes))
        {
            hasCauses = true;
            yield return cause;
        }

        if (!hasCauses)
        {
            yield return error;
        }
    }

    private static bool IsShapeOf(JsonObjectType type, JToken? token) => token switch
    {
        JObject => type == JsonObjectType.Object,
        JArray => type == JsonObjectType.Array,
        _ => false,
    };

    private void Unknown(ValidationError error, HashSet<string> guessed)
    {
        if (tree.OriginOf(error.Token) is not { } origin)
        {
            return;
        }

        string name = NameOf(error);
        int dot = origin.Key.Length - name.Length - 1;
        string parent = dot > 0 ? origin.Key[..dot] : "";
        var section = parent.Length == 0 ? KeyCatalogue.Root : KeyCatalogue.FindNode(parent);
        string where = parent.Length == 0 ? "of a spec" : $"of {parent}";
        string hint = "";
        string meant = "";
        if (section is not null && NearestName.Of(name, section.Children.Select(c => c.Name)) is { } near)
        {
            meant = parent.Length == 0 ? near : $"{parent}.{near}";
            guessed.Add(meant);
            hint = $"; is {meant} meant?";
        }
        else if (name.Length > 0 && char.IsAsciiDigit(name[0]) && origin.Node is YamlScalar { Text: "" })
        {
            hint = "; decimals are written with a point, as in 1.5 mm";
        }
        else if (KeyCatalogue.KeysNamed(name).Take(3).ToArray() is { Length: > 0 } elsewhere)
        {
            hint = $"; {name} is a key as {FaultText.Either(elsewhere)}";
        }
        else if (section is not null)
        {
            hint = $"; its keys are {string.Join(", ", section.Children.Take(8).Select(c => c.Name))}{(section.Children.Length > 8 ? ", …" : "")}";
        }

        _faults.Add(new SpecFault(origin.Key, $"{FaultText.Shown(name)} is not a key {where}{hint}", origin.KeyRegion) { SuggestedKey = meant });
    }

    private void Wrong(ValidationError error)
    {
        if (tree.OriginOf(error.Token) is not { } origin || origin.Schema is not { } node || origin.Node is YamlScalar { IsBroken: true })
        {
            return;
        }

        string wanted = FaultText.Wanted(node, "");
        var (found, place) = origin.Node switch
        {
            YamlScalar scalar when CoreSchema.IsNull(scalar) => ("has no value", origin.KeyRegion),
            YamlScalar scalar => ($"is {FaultText.Shown(scalar.Text)}", scalar.Region),
            YamlMapping => ("is a mapping", origin.KeyRegion),
            _ => ("is a list", origin.KeyRegion),
        };
        string key = origin.Key.Length == 0 ? "the spec" : origin.Key;
        _faults.Add(new SpecFault(origin.Key, $"{key} {found}; {wanted} is expected", place));
    }

    private static string NameOf(ValidationError error) => error.Token is JProperty property ? property.Name : error.Property ?? "";
}
