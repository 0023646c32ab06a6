using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Review.Figures;
using SpecLint.Review.Findings;
using SpecLint.Review.Reviewing;
using SpecLint.Review.Rules;
using SpecLint.Spec.Documents;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Tests.Reporting;

/// <summary>A review made by hand, with every kind of finding.</summary>
internal static class SampleReviews
{
    private static readonly Region Nowhere = new(1, 1, 1, 2);

    public static readonly Rule HoleRule = new()
    {
        Id = "FIT-04", Title = "Coil hole wider than the magnet", Rulebook = "fit", Grade = Grade.Query,
        Measure = Text("coil.hole.extent / magnets.width"), Bound = new Bound(null, Text("1.1")),
        Beyond = new Beyond(new Bound(null, Text("1.6")), Grade.Hold),
        Say = "The hole is {measure} × the magnet's width.",
        Why = "Where the hole is wider than the magnet, for a part of the turn no flux changes in it, and the copper round it only adds resistance.",
        Basis = new Basis(BasisKind.CommonPractice, ""), Levers = ["winding.coil.hole-width", "magnets.width"], Region = Nowhere,
    };

    public static readonly Rule HotSpotRule = new()
    {
        Id = "THM-01", Title = "Winding too hot for its class", Rulebook = "heat", Grade = Grade.Query,
        Measure = Text("temperature.winding.mean"), Bound = new Bound(null, Text("105 °C")), Say = "", Why = "Insulation ages faster the hotter it runs",
        Basis = new Basis(BasisKind.Standard, "IEC 60034-1:2022, table 8; IEC 60085:2007, table 1"), Levers = ["winding.turns"],
        Safety = ["Enamel above its class gives off fumes; run the first heat test with the guard closed and nobody downwind."], Region = Nowhere,
    };

    public static readonly Rule RetentionRule = new()
    {
        Id = "MEC-02", Title = "Magnets may come loose at overspeed", Rulebook = "mechanics", Grade = Grade.Hold,
        Require = Text("stated(magnets.retention)"), Say = "", Why = "A magnet that leaves the rotor is a projectile.",
        Basis = new Basis(BasisKind.Published, "a handbook of rotor design, 2016, section 4.2"), Levers = ["magnets.retention.method"],
        Safety = ["Stand out of the plane of rotation.", "Spin to overspeed only behind a guard."], Region = Nowhere,
    };

    public static readonly Rule DataRule = new()
    {
        Id = "DOC-02", Title = "No tolerance stated", Rulebook = "document", Grade = Grade.Remark, Require = Text("stated(gap.clearance)"), Say = "",
        Why = "Without tolerances only the nominal machine can be judged.", Basis = new Basis(BasisKind.House, ""), Region = Nowhere,
    };

    public static readonly Rule PolesRule = new()
    {
        Id = "FLX-13", Title = "Odd number of poles", Rulebook = "flux", Grade = Grade.Hold, Measure = Text("machine.poles"),
        Bound = new Bound(Text("2"), null), Say = "", Why = "Poles come in pairs.", Basis = new Basis(BasisKind.Derived, "continuity of flux"), Region = Nowhere,
    };

    public static readonly Rule BridgeRule = new()
    {
        Id = "OUT-08", Title = "Rectifier too weak", Rulebook = "output", Grade = Grade.Hold, Measure = Text("load.bridge.current / current.phase.rms"),
        Bound = new Bound(Text("1.5"), null), Say = "", Why = "Diodes fail short.", Basis = new Basis(BasisKind.CommonPractice, ""), Region = Nowhere,
    };

    public static readonly Rule ToothRule = new()
    {
        Id = "FLX-08", Title = "Teeth saturated", Rulebook = "flux", Grade = Grade.Query, When = Text("machine.stator = \"slotted\""), Say = "",
        Why = "Saturated teeth cost flux.", Basis = new Basis(BasisKind.Published, "a handbook of machine design, 2014"), Region = Nowhere,
    };

    public static readonly Rule CrushRule = new()
    {
        Id = "SAF-01", Title = "Attraction can crush a hand", Rulebook = "hazards", Grade = Grade.Hold, Source = RuleSource.Hazard, Say = "",
        Why = "Rotor discs attract each other with the force of a vehicle's weight.", Basis = new Basis(BasisKind.Derived, "Maxwell stress"),
        Safety = ["Draw the discs together with jacking screws; never by hand.", "Local codes and licensed practice prevail."], Region = Nowhere,
    };

    public static readonly ImmutableArray<Rule> Rules = [HoleRule, ToothRule, PolesRule, BridgeRule, HotSpotRule, RetentionRule, DataRule, CrushRule];

    public static MachineReview Held(string path = "specs/wind.yaml", string text = SampleSpec.Text)
    {
        SpecDocument spec = SampleSpec.Read(path, text);
        return new MachineReview
        {
            Spec = spec,
            Figures = new FigureGraph(spec, SampleFigures.Catalogue()),
            Findings = Findings(spec),
            Outcome = ReviewOutcome.Held,
            ClosingKeys = ["load.bridge.current", "ratings.power"],
        };
    }

    public static MachineReview Released(string path = "specs/sound.yaml")
    {
        SpecDocument spec = SampleSpec.Read(path);
        return new MachineReview
        {
            Spec = spec,
            Figures = new FigureGraph(spec, SampleFigures.Catalogue()),
            Findings = [.. Findings(spec).Where(f => f.Kind is FindingKind.Met or FindingKind.Hazard)],
            Outcome = ReviewOutcome.Released,
        };
    }

    public static MachineReview Unreadable(string path = "specs/broken.yaml") => new()
    {
        Spec = SampleSpec.Read(path, "spec: 1\ngap:\n  clearence: 1 mm\n"),
        Figures = null,
        Findings =
        [
            new Finding
            {
                Rule = DataRule with { Id = "DOC-01", Title = "Fault of the spec", Grade = Grade.Hold, Source = RuleSource.Reading }, Kind = FindingKind.Unmet,
                Grade = Grade.Hold, Message = "gap.clearence is not a key; the nearest is clearance", Key = "gap.clearence", Region = new Region(3, 3, 3, 12),
            },
        ],
        Outcome = ReviewOutcome.Held,
    };

    private static ImmutableArray<Finding> Findings(SpecDocument spec) =>
    [
        new Finding
        {
            Rule = PolesRule, Kind = FindingKind.Met, Grade = Grade.Hold, Message = "The number of poles is 12; expected an even number", Key = "machine.poles",
            Region = Place(spec, "machine.poles"), Value = 12, Limit = 2, Margin = 5, Uncertainty = 0,
        },
        new Finding
        {
            Rule = HotSpotRule, Kind = FindingKind.Unmet, Grade = Grade.Query, Key = "winding.turns", Region = Place(spec, "winding.turns"),
            Message = "The mean winding temperature is 111.4 °C; expected at most 105 °C.", Figures = ["temperature.winding.mean"], Value = 384.55, Limit = 378.15,
            Uncertainty = 21, Margin = -0.0753, Dimension = SampleFigures.Kelvin, DisplayUnit = "°C",
            Related = [new RelatedPlace("winding.coil.thickness", Place(spec, "winding.coil.thickness"), "winding.coil.thickness is 13 mm")],
        },
        new Finding
        {
            Rule = HoleRule, Kind = FindingKind.Unmet, Grade = Grade.Hold, Key = "winding.coil.hole-width", Region = Place(spec, "winding.coil.hole-width"),
            Message = "The hole is 1.733 × the magnet's width: for that share of the turn nothing moves flux. Expected at most 1.6.",
            Figures = ["coil.hole.extent", "emf.phase.rms"], Value = 52.0 / 30, Limit = 1.6, Uncertainty = 0.02, Margin = -0.0833,
            Related = [new RelatedPlace("magnets.width", Place(spec, "magnets.width"), "magnets.width is 30 mm")],
        },
        new Finding
        {
            Rule = DataRule, Kind = FindingKind.Unmet, Grade = Grade.Remark, Message = "gap.clearance states no tolerance", Key = "gap.clearance",
            Region = Place(spec, "gap.clearance"),
        },
        new Finding
        {
            Rule = RetentionRule, Kind = FindingKind.Unmet, Grade = Grade.Hold, Message = "Retention of the magnets is not stated.", Key = "magnets.retention",
            Region = spec.NearestParent("magnets.retention").Region,
            Waiver = new Waiver("MEC-02", "Static test rig, never turned.", "head of test", "2027-03-31", new Region(23, 5, 23, 17)),
        },
        new Finding
        {
            Rule = BridgeRule, Kind = FindingKind.Open, Grade = Grade.Hold, Message = "The load's bridge current is not stated", Key = "load",
            Region = Region.Beginning, MissingKeys = ["load.bridge.current", "ratings.power"],
        },
        new Finding
        {
            Rule = ToothRule, Kind = FindingKind.NotApplicable, Grade = Grade.Query, Message = "The stator has no teeth", Key = "", Region = Region.Beginning,
        },
        new Finding
        {
            Rule = CrushRule, Kind = FindingKind.Hazard, Grade = Grade.Hold, Message = "The rotor discs attract each other with 2.9 kN", Key = "",
            Region = Region.Beginning,
        },
    ];

    private static Region Place(SpecDocument spec, string key) => spec.Find(key)!.ValueRegion;

    private static Expression Text(string text) => new()
    {
        Text = text, Region = Nowhere, Dimension = Dimension.None, IsCondition = false, Figures = [], Keys = [],
    };
}
