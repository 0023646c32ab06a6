using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>Reads rulebooks; every fault is reported with its place, and no bytes make it throw.</summary>
public static class RulebookLoader
{
    private static readonly ImmutableArray<string> Fields = ["rulebook", "sources", "safety-notes", "rules"];

    /// <summary>Reads a rulebook that shares no texts with others.</summary>
    /// <param name="path">Where it was read from.</param>
    /// <param name="bytes">Its bytes.</param>
    /// <param name="scope">What its expressions can name.</param>
    public static Rulebook Load(string path, ReadOnlySpan<byte> bytes, ExpressionScope scope) => Load(path, bytes, scope, SharedTexts.None);

    /// <summary>Reads a rulebook.</summary>
    /// <param name="path">Where it was read from.</param>
    /// <param name="bytes">Its bytes.</param>
    /// <param name="scope">What its expressions can name.</param>
    /// <param name="shared">Texts of other rulebooks that it may name; its own come first.</param>
    public static Rulebook Load(string path, ReadOnlySpan<byte> bytes, ExpressionScope scope, SharedTexts shared) =>
        Load(path, YamlReader.Read(bytes, YamlLimits.Default), scope, shared);

    internal static Rulebook Load(string path, YamlReadResult read, ExpressionScope scope, SharedTexts shared)
    {
        var faults = new FaultList();
        if (Open(path, read, faults) is not { } fields)
        {
            return new Rulebook("", path, [], faults.Sorted());
        }

        string name = fields.Required("rulebook");
        SharedTexts texts = Own(fields, shared);
        var rules = ImmutableArray.CreateBuilder<Rule>();
        if (fields.Find("rules") is YamlSequence list)
        {
            var reader = new RuleReader(name, scope, texts, faults);
            foreach (YamlNode item in list.Items)
            {
                if (faults.IsFull)
                {
                    break;
                }

                if (reader.Read(item) is { } rule)
                {
                    rules.Add(rule);
                }
            }
        }
        else if (fields.Find("rules") is { } other)
        {
            faults.Add("rules is not a list", other.Region);
        }

        ReportTwins(rules, faults);
        return new Rulebook(name, path, rules.ToImmutable(), faults.Sorted());
    }

    /// <summary>The texts that a rulebook shares with others, joined to those given; faults are left to <see cref="Load(string, ReadOnlySpan{byte}, ExpressionScope)"/>.</summary>
    /// <param name="bytes">Its bytes.</param>
    /// <param name="shared">The texts so far.</param>
    public static SharedTexts ReadSharedTexts(ReadOnlySpan<byte> bytes, SharedTexts shared) =>
        ReadSharedTexts(YamlReader.Read(bytes, YamlLimits.Default), shared);

    internal static SharedTexts ReadSharedTexts(YamlReadResult read, SharedTexts shared) =>
        Open("", read, new FaultList()) is { } fields ? Own(fields, shared) : shared;

    /// <summary>The identifiers that stand in more than one of several rulebooks, each as a fault of the later one.</summary>
    /// <param name="books">The rulebooks.</param>
    public static ImmutableArray<(Rulebook Book, RulebookFault Fault)> FindTwins(IReadOnlyList<Rulebook> books)
    {
        var seen = new Dictionary<string, Rulebook>(StringComparer.Ordinal);
        var twins = ImmutableArray.CreateBuilder<(Rulebook, RulebookFault)>();
        foreach (Rulebook book in books)
        {
            foreach (Rule rule in book.Rules)
            {
                if (!seen.TryAdd(rule.Id, book) && seen[rule.Id] != book)
                {
                    twins.Add((book, new RulebookFault($"rule {rule.Id} also stands in {seen[rule.Id].Path}; an id stands for one rule", rule.Region)));
                }
            }
        }

        return twins.ToImmutable();
    }

    private static FieldReader? Open(string path, YamlReadResult read, FaultList faults)
    {
        foreach (YamlFault fault in read.Faults)
        {
            faults.Add(fault.Message, fault.Region);
        }

        if (read.Root is null)
        {
            if (read.Faults.Length == 0)
            {
                faults.Add($"{(path.Length == 0 ? "the rulebook" : path)} is empty; expected a rulebook", Region.Beginning);
            }

            return null;
        }

        return FieldReader.Open(read.Root, Region.Beginning, "a rulebook", Fields, faults);
    }

    private static SharedTexts Own(FieldReader fields, SharedTexts shared) => new(
        shared.Sources.SetItems(fields.Texts("sources").Select(t => KeyValuePair.Create(t.Key.Text, t.Value.Text.Trim()))),
        shared.SafetyNotes.SetItems(fields.Texts("safety-notes").Select(t => KeyValuePair.Create(t.Key.Text, t.Value.Text.Trim()))));

    private static void ReportTwins(IEnumerable<Rule> rules, FaultList faults)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (Rule rule in rules)
        {
            if (rule.Id.Length > 0 && !seen.Add(rule.Id))
            {
                faults.Add($"rule {rule.Id} stands twice in this rulebook", rule.Region);
            }
        }
    }
}
