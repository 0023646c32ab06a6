using System.Collections.Frozen;
using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>Reads files of reference tables; every fault is reported with its place, and no bytes make it throw.</summary>
public static class ReferenceTableLoader
{
    /// <summary>Reads files of tables.</summary>
    /// <param name="files">Path and bytes of each file.</param>
    public static ReferenceTables Load(IEnumerable<(string Path, ReadOnlyMemory<byte> Bytes)> files)
    {
        var tables = new Dictionary<string, ReferenceTable>(StringComparer.Ordinal);
        var all = ImmutableArray.CreateBuilder<RulebookFault>();
        foreach (var (path, bytes) in files)
        {
            var faults = new FaultList();
            ReadFile(bytes.Span, tables, faults);
            all.AddRange(faults.Sorted().Select(f => f with { Message = $"{path}: {f.Message}" }));
        }

        return new ReferenceTables(tables.Values.OrderBy(t => t.Name, StringComparer.Ordinal), all.ToImmutable());
    }

    private static void ReadFile(ReadOnlySpan<byte> bytes, Dictionary<string, ReferenceTable> tables, FaultList faults)
    {
        YamlReadResult read = YamlReader.Read(bytes, YamlLimits.Default);
        foreach (YamlFault fault in read.Faults)
        {
            faults.Add(fault.Message, fault.Region);
        }

        if (read.Root is null || FieldReader.Open(read.Root, Region.Beginning, "a table file", [], faults) is not { } fields)
        {
            return;
        }

        if (fields.Find("tables") is not YamlMapping mapping)
        {
            faults.Add("a table file lacks the field tables with its tables by name", fields.KeyRegion("tables"));
            return;
        }

        foreach (YamlEntry entry in mapping.Entries)
        {
            if (FieldReader.Open(entry.Value, entry.Key.Region, "a table", [], faults) is not { } table || !table.Has("rows"))
            {
                continue;
            }

            if (!tables.TryAdd(entry.Key.Text, new TableReader(entry.Key.Text, table, faults).Read()))
            {
                faults.Add($"table {entry.Key.Text} stands twice", entry.Key.Region);
            }
        }
    }

    /// <summary>Reads one table; a column keeps the kind and dimension of its first cell.</summary>
    private sealed class TableReader(string name, FieldReader fields, FaultList faults)
    {
        private readonly List<ReferenceColumn> _columns = [];
        private readonly Dictionary<string, UnitEntry> _units = new(StringComparer.Ordinal);

        public ReferenceTable Read()
        {
            ReadUnits();
            var rows = ImmutableArray.CreateBuilder<ReferenceRow>();
            if (fields.Find("rows") is YamlSequence list)
            {
                foreach (YamlNode item in list.Items)
                {
                    if (item is YamlMapping mapping)
                    {
                        rows.Add(ReadRow(mapping));
                    }
                    else
                    {
                        faults.Add("a row is not a mapping of columns to cells", item.Region);
                    }
                }
            }
            else
            {
                faults.Add("rows is not a list", fields.KeyRegion("rows"));
            }

            foreach (string column in _units.Keys.Order(StringComparer.Ordinal))
            {
                if (!_columns.Exists(c => IsColumn(c.Name, column)))
                {
                    faults.Add($"units names {column}, which no row of {name} has", fields.KeyRegion("units"));
                }
            }

            return new ReferenceTable
            {
                Name = name,
                What = fields.Required("what"),
                Source = fields.Required("source"),
                Status = fields.Word("status", [("seen", "seen"), ("from-memory", "from-memory"), ("common-practice", "common-practice")], fields.Required("status")),
                Columns = [.. _columns],
                Rows = rows.ToImmutable(),
            };
        }

        private static bool IsColumn(string column, string unitName) =>
            column.StartsWith(unitName, StringComparison.Ordinal) && (column.Length == unitName.Length || column[unitName.Length] == '[');

        private void ReadUnits()
        {
            foreach (var (key, value) in fields.Texts("units"))
            {
                if (UnitTable.TryFind(value.Text, out UnitEntry? unit))
                {
                    _units[key.Text] = unit;
                }
                else
                {
                    faults.Add($"{FieldReader.Short(value.Text)} is not a known unit", value.Region);
                }
            }
        }

        private ReferenceRow ReadRow(YamlMapping mapping)
        {
            var cells = new Dictionary<string, ReferenceCell>(StringComparer.Ordinal);
            foreach (YamlEntry entry in mapping.Entries)
            {
                string column = entry.Key.Text;
                UnitEntry? unit = _units.GetValueOrDefault(column);
                if (entry.Value is YamlScalar scalar)
                {
                    AddCell(cells, column, scalar, unit);
                }
                else if (entry.Value is YamlSequence list && list.Items.All(i => i is YamlScalar))
                {
                    for (int i = 0; i < list.Items.Length; i++)
                    {
                        AddCell(cells, $"{column}[{i}]", (YamlScalar)list.Items[i], unit);
                    }
                }
                else
                {
                    faults.Add($"{FieldReader.Short(column)} is neither a cell nor a list of cells", entry.Value.Region);
                }
            }

            return new ReferenceRow(cells.ToFrozenDictionary(StringComparer.Ordinal));
        }

        private void AddCell(Dictionary<string, ReferenceCell> cells, string column, YamlScalar scalar, UnitEntry? unit)
        {
            if (CoreSchema.IsNull(scalar))
            {
                return;
            }

            double? number = null;
            Dimension dimension = unit?.Dimension ?? Dimension.None;
            if (CoreSchema.TryReadNumber(scalar, out double plain))
            {
                number = unit is null ? plain : unit.ToSi(plain);
            }
            else if (scalar.IsPlain && QuantityReader.TryRead(scalar.Text, expected: null, isDifference: false, out Quantity quantity, out _))
            {
                number = quantity.Value;
                dimension = quantity.Dimension;
            }

            ReferenceColumn? known = _columns.Find(c => string.Equals(c.Name, column, StringComparison.Ordinal));
            if (known is null)
            {
                known = new ReferenceColumn(column, number is not null, number is null ? Dimension.None : dimension);
                _columns.Add(known);
            }

            bool keepsUnit = unit is null || (number is not null && dimension == unit.Dimension);
            bool fits = keepsUnit && known.IsNumber == number is not null && (number is null || known.Dimension == dimension);
            if (!fits)
            {
                string expected = unit is not null ? $"a number in {unit.Spelling}"
                    : known.IsNumber ? $"{ExpressionBinder.Describe(known.Dimension)} like the cells above" : "a text like the cells above";
                faults.Add($"{FieldReader.Short(column)} is {FieldReader.Short(scalar.Text)}; expected {expected}", scalar.Region);
                return;
            }

            cells[column] = new ReferenceCell(scalar.Text, number);
        }
    }
}
