using System.Globalization;
using System.Text;
using CsCheck;
using SpecLint.Spec.Yaml;

namespace SpecLint.Tests.Spec.Yaml;

public sealed class YamlReaderTests
{
    private static readonly string[] Pieces = ["a", "b: ", "- ", "\n", "  ", "{", "}", "[", "]", ",", "&a ", "*a", "<<: ", "\"", "'", "|\n", ">", "!t ", "? ", "#", "\t", "---\n", "...\n", "%", ":", "é", "\r\n", "1 mm"];

    private static YamlReadResult Read(string text) => YamlReader.Read(text, YamlLimits.Default);

    private static string Told(YamlReadResult result)
    {
        var fault = Assert.Single(result.Faults);
        return string.Create(CultureInfo.InvariantCulture, $"{fault.Region.StartLine}:{fault.Region.StartColumn} {fault.Message}");
    }

    [Fact]
    public void Mapping_BlockAndFlow_KeepsPlaceOfEveryKeyAndValue()
    {
        var root = Assert.IsType<YamlMapping>(Read("a: 1\nbee: {c: 'x y', d: [p, q]}\n").Root);

        Assert.Equal(new Region(1, 1, 1, 2), root.Entries[0].Key.Region);
        Assert.Equal(new Region(1, 4, 1, 5), root.Entries[0].Value.Region);
        var inner = Assert.IsType<YamlMapping>(root.Entries[1].Value);
        Assert.Equal(new Region(2, 6, 2, 27), inner.Region);
        Assert.Equal(new Region(2, 10, 2, 15), inner.Entries[0].Value.Region);
        Assert.Equal("x y", Assert.IsType<YamlScalar>(inner.Entries[0].Value).Text);
        var list = Assert.IsType<YamlSequence>(inner.Entries[1].Value);
        Assert.Equal(new Region(2, 20, 2, 26), list.Region);
        Assert.Equal(new Region(2, 24, 2, 25), list.Items[1].Region);
    }

    [Fact]
    public void BlockMapping_Region_EndsWithItsLastValue()
    {
        var root = Assert.IsType<YamlMapping>(Read("a:\n  b: 12\n\n# after\nc: 3\n").Root);

        Assert.Equal(new Region(2, 3, 2, 8), root.Entries[0].Value.Region);
    }

    [Fact]
    public void Columns_AstralCharacterBefore_CountAsUtf16()
    {
        var root = Assert.IsType<YamlMapping>(Read("{t: \"\U0001F9F2\", n: 3}\n").Root);

        Assert.Equal(new Region(1, 11, 1, 12), root.Entries[1].Key.Region);
    }

    [Theory]
    [InlineData("a: 1\nb: 2\n")]
    [InlineData("a: 1\r\nb: 2\r\n")]
    [InlineData("a: 1\rb: 2\r")]
    public void Lines_AnyLineEnd_CountTheSame(string text)
    {
        var root = Assert.IsType<YamlMapping>(Read(text).Root);

        Assert.Equal(new Region(2, 4, 2, 5), root.Entries[1].Value.Region);
    }

    [Fact]
    public void ByteOrderMark_Utf8_IsNoPartOfTheText()
    {
        var result = YamlReader.Read([0xEF, 0xBB, 0xBF, .. "a: 1"u8], YamlLimits.Default);

        Assert.Empty(result.Faults);
        Assert.Equal("a: 1", result.Text);
        Assert.Equal(new Region(1, 1, 1, 2), ((YamlMapping)result.Root!).Entries[0].Key.Region);
    }

    [Fact]
    public void Alias_Value_CarriesPlaceOfAnchorAndOfAlias()
    {
        var root = Assert.IsType<YamlMapping>(Read("a: &w 16 mm\nb: *w\n").Root);

        var value = Assert.IsType<YamlScalar>(root.Entries[1].Value);
        Assert.Equal("16 mm", value.Text);
        Assert.Equal(1, value.Region.StartLine);
        Assert.Equal(new Region(2, 4, 2, 6), value.AliasSite);
        Assert.Null(root.Entries[0].Value.AliasSite);
    }

    [Fact]
    public void MergeKey_Mapping_AddsWhatIsNotStated()
    {
        var root = Assert.IsType<YamlMapping>(Read("base: &m {a: 1, b: 2}\nuse:\n  <<: *m\n  b: 3\n").Root);

        var used = Assert.IsType<YamlMapping>(root.Entries[1].Value);
        Assert.Equal(["b", "a"], used.Entries.Select(e => e.Key.Text));
        Assert.Equal("3", Assert.IsType<YamlScalar>(used.Entries[0].Value).Text);
        Assert.Equal(new Region(3, 7, 3, 9), used.Entries[1].Value.AliasSite);
    }

    [Fact]
    public void MergeKey_ListOfMappings_FirstOneWins()
    {
        var root = Assert.IsType<YamlMapping>(Read("x: &x {a: 1}\ny: &y {a: 2, b: 3}\nuse: {<<: [*x, *y]}\n").Root);

        var used = Assert.IsType<YamlMapping>(root.Entries[2].Value);
        Assert.Equal(["1", "3"], used.Entries.Select(e => ((YamlScalar)e.Value).Text));
    }

    [Fact]
    public void DuplicateKey_NamesBothPlaces()
    {
        var result = Read("a: 1\nb: 2\na: 3\n");

        Assert.Equal("3:1 the key 'a' stands twice in one mapping", Told(result));
        Assert.Equal(new Region(1, 1, 1, 2), result.Faults[0].Related);
        Assert.Equal(2, ((YamlMapping)result.Root!).Entries.Length);
    }

    [Theory]
    [InlineData("", "1:1 the text holds no document; the keys of a spec or rulebook are expected")]
    [InlineData("# only a comment\n", "1:1 the text holds no document; the keys of a spec or rulebook are expected")]
    [InlineData("a: 1\nb:\n\tc: 2\n", "3:1 a tab stands in the indentation; YAML allows only spaces there")]
    [InlineData("a: 1\n\tb: 2\n", "2:1 a tab stands in the indentation; YAML allows only spaces there")]
    [InlineData("a: 1\0", "1:5 this is a binary file; a text in UTF-8 is expected")]
    [InlineData("a: \u0007", "1:4 the control character U+0007 stands here; only printable text is expected")]
    [InlineData("a: 1\u2028b: 2", "1:5 the line separator U+2028 stands here; end lines with a plain line feed")]
    [InlineData("a: 1\n---\nb: 2\n", "2:1 a second document begins here; one document a file is expected")]
    [InlineData("? [a]\n: b\n", "1:3 a list or mapping stands where the name of a key is expected")]
    [InlineData("a: !odd b\n", "1:4 the tag '!odd' stands before this value; plain values are expected")]
    [InlineData("a: *b\n", "1:4 the alias '*b' names no anchor above it")]
    [InlineData("a: &a [*a]\n", "1:8 the alias '*a' stands inside its own anchor")]
    [InlineData("a:\n  <<: 3\n", "2:3 the merge key '<<' takes a mapping, or a list of mappings, by alias")]
    [InlineData("a: \"abc\n", "1:4 the quotes opened here are not closed")]
    [InlineData("a: [1, 2\n", "2:1 the list '[' is not closed here, or a ',' is missing")]
    [InlineData("a: {b: 1 c: 2}\n", "1:11 the mapping '{' is not closed here, or a ',' is missing")]
    [InlineData("a: b: c\n", "1:5 a ':' stands here inside a value; check this line's indentation, or put text that holds ': ' in quotes")]
    [InlineData("a: @b\n", "1:4 this character cannot begin a value; put the text in quotes")]
    [InlineData("a: - b\n", "1:4 a list item '-' stands here after a key; begin it on a line of its own")]
    [InlineData("{a: &w 4 mm, b: *w}\n", "1:5 an anchor '&name' on a single value between '{' and '}' cannot be read here; write this mapping with one key a line")]
    [InlineData("a: 1\nb: !!]\n", "2:2 a tag beginning with '!' stands after this place and is not complete; plain values are expected")]
    [InlineData("a: \"x\n y\n\nb\"\n", "1:4 a line of the quoted text opened here is not indented far enough")]
    [InlineData("%YAML 9.9\n---\na: 1\n", "1:1 the directive '%' here is not one of YAML 1.2")]
    [InlineData("a: &x &y b\n", "1:7 an anchor '&name' cannot stand here")]
    [InlineData("a: ]\n", "1:4 a value is expected here")]
    public void Text_Malformed_IsOneFaultAtItsPlace(string text, string told) => Assert.Equal(told, Told(Read(text)));

    [Fact]
    public void FlowMapping_NeverClosed_IsOneFaultWithPlace()
    {
        var result = Read("a: {b: 1\nc: 2\n");

        Assert.Contains("do not fit together", Told(result), StringComparison.Ordinal);
        Assert.InRange(result.Faults[0].Region.StartLine, 1, 3);
    }

    [Fact]
    public void Bytes_Latin1_NameTheByteAndItsPlace()
    {
        var result = YamlReader.Read([.. "t: caf"u8, 0xE9, .. "\n"u8], YamlLimits.Default);

        Assert.Equal("1:7 the byte 0xE9 is not UTF-8; a text in UTF-8 is expected", Told(result));
    }

    [Fact]
    public void Bytes_Utf16_AreNamed() =>
        Assert.Equal("1:1 the text is encoded as UTF-16; UTF-8 is expected", Told(YamlReader.Read([.. Encoding.Unicode.Preamble, .. Encoding.Unicode.GetBytes("a: 1")], YamlLimits.Default)));

    [Fact]
    public void Bytes_FiftyMegabytes_AreNotDecoded()
    {
        var bytes = new byte[50 * 1024 * 1024];
        long before = GC.GetAllocatedBytesForCurrentThread();

        string told = Told(YamlReader.Read(bytes, YamlLimits.Default));

        Assert.Equal("1:1 the text is 50.0 MiB long; at most 2 MiB are read", told);
        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, 1024 * 1024);
    }

    [Theory]
    [InlineData("[", 300_000)]
    [InlineData("{a: ", 100_000)]
    [InlineData("- ", 500_000)]
    [InlineData("? ", 500_000)]
    public void Nesting_Thousandfold_StopsAtTheLimit(string opening, int times)
    {
        string text = new StringBuilder(opening.Length * times).Insert(0, opening, times).ToString();

        Assert.EndsWith("mappings and lists stand more than 64 deep here", Told(Read(text)), StringComparison.Ordinal);
    }

    [Fact]
    public void Aliases_MultipliedTenfoldAgainAndAgain_StopAtTheLimit()
    {
        var text = new StringBuilder("a0: &a0 [x, x, x, x, x, x, x, x, x, x]\n");
        for (int i = 1; i < 12; i++)
        {
            string alias = string.Create(CultureInfo.InvariantCulture, $"*a{i - 1}");
            text.Append(CultureInfo.InvariantCulture, $"a{i}: &a{i} [{string.Join(", ", Enumerable.Repeat(alias, 10))}]\n");
        }

        Assert.EndsWith("the text holds more than 50000 values, aliases counted with what they repeat", Told(Read(text.ToString())), StringComparison.Ordinal);
    }

    [Fact]
    public void Faults_WithoutEnd_StopAtTheLimit()
    {
        var result = Read(string.Concat(Enumerable.Repeat("a: b\n", 5000)));

        Assert.Equal(101, result.Faults.Length);
        Assert.Equal("more than 100 faults of syntax; reading stops here", result.Faults[^1].Message);
    }

    [Theory]
    [InlineData("yes", false)]
    [InlineData("on", false)]
    [InlineData("true", true)]
    [InlineData("True", true)]
    public void CoreSchema_Flag_OnlyTrueAndFalse(string text, bool isFlag) =>
        Assert.Equal(isFlag, CoreSchema.TryReadFlag(new YamlScalar(Region.Beginning, text, IsPlain: true), out _));

    [Theory]
    [InlineData("010", 10)]
    [InlineData("1e3", 1000)]
    [InlineData("-.5", -0.5)]
    public void CoreSchema_Number_IsDecimal(string text, double value)
    {
        Assert.True(CoreSchema.TryReadNumber(new YamlScalar(Region.Beginning, text, IsPlain: true), out double read));
        Assert.Equal(value, read);
    }

    [Theory]
    [InlineData("1:30")]
    [InlineData("0x10")]
    [InlineData(".nan")]
    [InlineData(".inf")]
    [InlineData("1_000")]
    public void CoreSchema_NotDecimal_IsNoNumber(string text) =>
        Assert.False(CoreSchema.TryReadNumber(new YamlScalar(Region.Beginning, text, IsPlain: true), out _));

    [Fact]
    public void Bytes_Random_NeverThrow() => Gen.Byte.Array[0, 400].Sample(
        bytes => YamlReader.Read(bytes, YamlLimits.Default) is { Faults.IsDefault: false },
        iter: 3000);

    [Fact]
    public void Text_OfYamlPunctuation_NeverThrowsAndRegionsLieInside() => Gen.Int[0, Pieces.Length - 1].Select(i => Pieces[i])
        .Array[0, 25].Sample(
            pieces =>
            {
                string text = string.Concat(pieces);
                var result = YamlReader.Read(text, YamlLimits.Default);
                int lines = text.ReplaceLineEndings("\n").Count(c => c == '\n') + 1;
                return (result.Root is not null || result.Faults.Length > 0) && result.Faults.All(f => f.Region.StartLine >= 1 && f.Region.StartLine <= lines + 1 && f.Region.StartColumn >= 1);
            },
            iter: 6000);
}
