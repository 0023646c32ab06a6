using System.Text;
using CsCheck;
using SpecLint.Review.Rules;
using SpecLint.Spec.Units;

namespace SpecLint.Tests.Review.Rules;

public sealed class ReferenceTableLoaderTests
{
    private const string Head = "tables:\n  t:\n    what: w\n    source: s\n    status: seen\n";

    [Fact]
    public void Table_WithUnits_HoldsSiNumbers()
    {
        ReferenceTables tables = Load(Head + """
                units: {d: mm, band: A/mm2}
                rows:
                  - {name: a, d: 1.5, band: [3, 6], count: 4}
                  - {name: b, d: 2 cm, note: "text"}
            """);
        Assert.Empty(tables.Faults);
        ReferenceTable table = tables.Find("t")!;
        Assert.Equal(("w", "s", "seen"), (table.What, table.Source, table.Status));
        Assert.Equal(["name", "d", "band[0]", "band[1]", "count", "note"], table.Columns.Select(c => c.Name));
        Assert.Equal(Dimensions.Length, table.FindColumn("d")!.Dimension);
        ReferenceRow a = table.FindRow("name", "a")!;
        Assert.Equal(0.0015, a.Number("d")!.Value, 1e-12);
        Assert.Equal(6e6, a.Number("band[1]")!.Value, 1e-3);
        Assert.Equal(4, a.Number("count"));
        ReferenceRow b = table.FindRow(r => r.Number("d") > 0.01)!;
        Assert.Equal("b", b.Text("name"));
        Assert.Null(b.Number("count"));
        Assert.Null(table.FindRow("name", "c"));
    }

    [Theory]
    [InlineData("units: {d: ells}\n    rows: [{d: 1}]", "ells is not a known unit")]
    [InlineData("units: {e: mm}\n    rows: [{d: 1}]", "units names e, which no row of t has")]
    [InlineData("units: {d: mm}\n    rows: [{d: 1 T}]", "d is 1 T; expected a number in mm")]
    [InlineData("rows: [{d: 1}, {d: a}]", "d is a; expected a plain number like the cells above")]
    [InlineData("rows: [{d: a}, {d: 1}]", "d is 1; expected a text like the cells above")]
    [InlineData("rows: [{d: {e: 1}}]", "neither a cell nor a list")]
    [InlineData("rows: [3]", "a row is not a mapping")]
    [InlineData("rows: 3", "rows is not a list")]
    public void Fault_IsNamed(string rest, string message) =>
        Assert.Contains(Load($"{Head}    {rest}\n").Faults, f => f.Message.Contains(message, StringComparison.Ordinal));

    [Fact]
    public void Table_NamedTwice_IsAFault()
    {
        byte[] file = Encoding.UTF8.GetBytes(Head + "    rows: []\n");
        Assert.Contains(ReferenceTableLoader.Load([("a", file), ("b", file)]).Faults, f => f.Message.Contains("b: table t stands twice", StringComparison.Ordinal));
    }

    [Fact]
    public void RandomBytes_NeverThrow() =>
        Gen.Byte.Array[0, 200].Sample(bytes => ReferenceTableLoader.Load([("t.yaml", bytes)]).Tables.Length == 0, iter: 2000);

    private static ReferenceTables Load(string text) => ReferenceTableLoader.Load([("t.yaml", Encoding.UTF8.GetBytes(text))]);
}
