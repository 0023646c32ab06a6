using System.Globalization;
using System.Text.Json;
using SpecLint.Physics.Windings;

namespace SpecLint.Tests.Physics.Windings;

/// <summary>Star of slots against exact reference values: tooth coils and distributed windings, both layers.</summary>
public sealed class ReferenceWindingTests
{
    private static readonly JsonElement Cases = Load();

    public static TheoryData<string> Ids()
    {
        var ids = new TheoryData<string>();
        foreach (JsonElement item in Cases.EnumerateArray())
        {
            ids.Add(item.GetProperty("id").GetString()!);
        }

        return ids;
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void Winding_ReferenceCase_MatchesFactorsAndBalance(string id)
    {
        JsonElement item = Cases.EnumerateArray().Single(e => e.GetProperty("id").GetString() == id);
        JsonElement inputs = item.GetProperty("inputs");
        int slots = inputs.GetProperty("slots").GetInt32();
        int pairs = inputs.GetProperty("poles").GetInt32() / 2;
        int layers = inputs.GetProperty("layers").GetInt32();
        int span = inputs.GetProperty("coil_span_slots").GetInt32();
        bool tooth = item.GetProperty("kind").GetString() == "tooth_coil";
        if (!item.GetProperty("defined").GetBoolean())
        {
            Assert.True(layers == 1 && slots % 2 == 1);
            return;
        }

        JsonElement results = item.GetProperty("results");
        WindingLayout layout = Layout(tooth, layers, slots, pairs, span);
        Assert.Equal(results.GetProperty("balanced").GetBoolean(), layout.IsBalanced);
        if (!layout.IsBalanced)
        {
            Assert.InRange(layout.Imbalance, 0.01, double.MaxValue);
            return;
        }

        Assert.InRange(layout.Imbalance, 0.0, StarOfSlots.BalanceTolerance);
        AssertFactors(results, layout, slots, pairs, span);
        AssertPhases(results, layout);
    }

    // A single-layer distributed winding of full pitch has the factors of the double-layer one: its coil sides fill the same belts.
    private static WindingLayout Layout(bool tooth, int layers, int slots, int pairs, int span)
    {
        if (tooth)
        {
            return StarOfSlots.EquallySpaced(layers == 1 ? slots / 2 : slots, pairs, 3);
        }

        return StarOfSlots.EquallySpaced(slots, pairs, 3, span);
    }

    private static void AssertFactors(JsonElement results, WindingLayout layout, int slots, int pairs, int span)
    {
        foreach (JsonProperty entry in results.GetProperty("winding_factor").EnumerateObject())
        {
            int order = int.Parse(entry.Name, NumberStyles.Integer, CultureInfo.InvariantCulture);
            double spanFactor = CoilSpanFactor.OfSlots(order, pairs, span, slots);
            for (int phase = 0; phase < 3; phase++)
            {
                double distribution = DistributionFactor.Of(layout, phase, order);
                Assert.Equal(results.GetProperty("distribution_factor").GetProperty(entry.Name).GetDouble(), distribution, 1e-9);
                Assert.Equal(results.GetProperty("coil_span_factor").GetProperty(entry.Name).GetDouble(), spanFactor, 1e-9);
                Assert.Equal(entry.Value.GetDouble(), distribution * Math.Abs(spanFactor), 1e-9);
            }
        }
    }

    private static void AssertPhases(JsonElement results, WindingLayout layout)
    {
        if (!results.TryGetProperty("coil_phases", out JsonElement phases) || phases.GetString() is not { Length: > 0 } text)
        {
            return;
        }

        IEnumerable<string> own = layout.CoilPhases.Zip(layout.CoilSenses, (phase, sense) => $"{"ABC"[phase]}{(sense > 0 ? '+' : '-')}");
        Assert.Equal(text, string.Join(' ', own));
    }

    private static JsonElement Load()
    {
        string path = Path.Combine(AppContext.BaseDirectory, "Reference", "winding.json");
        return JsonDocument.Parse(File.ReadAllText(path)).RootElement.GetProperty("cases");
    }
}
