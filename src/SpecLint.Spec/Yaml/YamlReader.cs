using System.Collections.Immutable;
using System.Text;
using YamlDotNet.Core;

namespace SpecLint.Spec.Yaml;

/// <summary>Reads one YAML 1.2 document into a tree that keeps the place of every key and value.</summary>
/// <remarks>
/// Duplicate keys, keys that are no scalars, custom tags and a second document are faults; aliases and merge keys are
/// expanded within the limits. No input makes it throw.
/// </remarks>
public static class YamlReader
{
    /// <summary>Reads bytes as UTF-8, with or without byte-order mark.</summary>
    /// <param name="bytes">The bytes of the file.</param>
    /// <param name="limits">The limits.</param>
    public static YamlReadResult Read(ReadOnlySpan<byte> bytes, YamlLimits limits)
    {
        string? text = TextDecoder.Decode(bytes, limits, out var fault);
        return text is null ? new YamlReadResult("", null, [fault!]) : Parse(text, limits);
    }

    /// <summary>Reads a text.</summary>
    /// <param name="text">The text.</param>
    /// <param name="limits">The limits.</param>
    public static YamlReadResult Read(string text, YamlLimits limits)
    {
        if (Encoding.UTF8.GetByteCount(text) > limits.Bytes)
        {
            return Read(Encoding.UTF8.GetBytes(text), limits);
        }

        return TextDecoder.Unreadable(text) is { } fault ? new YamlReadResult("", null, [fault]) : Parse(text, limits);
    }

    private static YamlReadResult Parse(string text, YamlLimits limits)
    {
        var faults = new List<YamlFault>();
        YamlNode? root = null;
        var parser = new Parser(new StringReader(text));
        try
        {
            root = new YamlTreeBuilder(parser, limits, faults).ReadDocument();
        }
        catch (YamlStopException limit)
        {
            faults.Add(limit.Fault);
        }
        catch (YamlException syntax)
        {
            faults.Add(YamlSyntaxFault.From(syntax, text));
        }
        catch (InvalidOperationException)
        {
            faults.Add(new YamlFault("the brackets, braces or commas do not fit together from here on", LastUnderstood(parser)));
        }
        catch (ArgumentException)
        {
            faults.Add(new YamlFault("a tag beginning with '!' stands after this place and is not complete; plain values are expected", LastUnderstood(parser)));
        }

        return new YamlReadResult(text, root, [.. faults.Select(Widened).OrderBy(f => f.Region)]);
    }

    /// <summary>The library gives up without a place on some text; the end of the last part it understood is the nearest one.</summary>
    private static Region LastUnderstood(Parser parser) => parser.Current is { } last
        ? new Region((int)last.End.Line, (int)last.End.Column, (int)last.End.Line, (int)last.End.Column + 1)
        : Region.Beginning;

    /// <summary>A place of no width would show nothing.</summary>
    private static YamlFault Widened(YamlFault fault) =>
        fault.Region is var (line, column, endLine, endColumn) && line == endLine && endColumn <= column
            ? fault with { Region = fault.Region with { EndColumn = column + 1 } }
            : fault;
}
