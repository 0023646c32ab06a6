using SpecLint.Review.Figures;
using SpecLint.Review.Rules;

namespace SpecLint.Review.Catalogue;

/// <summary>Figures of the magnet material: by grade from the table, or as the spec states them in numbers.</summary>
internal static class MagnetFigures
{
    /// <summary>Temperature at which catalogue data hold, 20 °C [K].</summary>
    public const double ReferenceTemperature = 293.15;

    private const string GradeTable = "magnet-grades";

    public static IEnumerable<FigureDefinition> All =>
    [
        Define.Figure("magnet.remanence", FigureUnit.Tesla, "remanence at 20 °C, typical of the grade", "{magnets.material.remanence}, or the table's row of {magnets.grade}", Sources.MagnetTable, Remanence),
        Define.Figure("magnet.remanence.grade-least", FigureUnit.Tesla, "least remanence of the named grade at 20 °C", "the table's row of {magnets.grade}", Sources.MagnetTable, x => OfGrade(x, "remanence-least")),
        Define.Figure("magnet.remanence.grade-greatest", FigureUnit.Tesla, "greatest remanence of the named grade at 20 °C", "the table's row of {magnets.grade}", Sources.MagnetTable, x => OfGrade(x, "remanence-greatest")),
        Define.Figure("magnet.remanence.hot", FigureUnit.Tesla, "remanence at the magnets' temperature", "{magnet.remanence} × (1 + {magnet.remanence-coefficient} × ({temperature.magnet} − 20 °C))", Sources.MagnetTable, x =>
            At(x, "magnet.remanence", "magnet.remanence-coefficient", "temperature.magnet")),
        Define.Figure("magnet.remanence.cold", FigureUnit.Tesla, "remanence at the coldest ambient", "{magnet.remanence} × (1 + {magnet.remanence-coefficient} × ({ambient.temperature.least} − 20 °C))", Sources.MagnetTable, x =>
            At(x, "magnet.remanence", "magnet.remanence-coefficient", "ambient.temperature.least")),
        Define.Figure("magnet.remanence-coefficient", TemperatureCoefficient, "reversible change of the remanence per kelvin", "{magnets.material.remanence-coefficient}, or the table's row of {magnets.grade}", Sources.MagnetTable, x =>
            Property(x, "magnets.material.remanence-coefficient", "remanence-coefficient")),
        Define.Figure("magnet.coercivity-coefficient", TemperatureCoefficient, "change of the intrinsic coercivity per kelvin", "{magnets.material.coercivity-coefficient}, or the table's row of {magnets.grade}", Sources.MagnetTable, x =>
            Property(x, "magnets.material.coercivity-coefficient", "coercivity-coefficient")),
        Define.Figure("magnet.coercivity-intrinsic", FigureUnit.FieldStrength, "least intrinsic coercivity at 20 °C", "{magnets.material.coercivity-intrinsic}, or the table's row of {magnets.grade}", Sources.MagnetTable, x =>
            Property(x, "magnets.material.coercivity-intrinsic", "coercivity-intrinsic-least")),
        Define.Figure("magnet.coercivity-intrinsic.hot", FigureUnit.FieldStrength, "least intrinsic coercivity at the magnets' temperature", "{magnet.coercivity-intrinsic} × (1 + {magnet.coercivity-coefficient} × ({temperature.magnet} − 20 °C))", Sources.MagnetTable, x =>
            At(x, "magnet.coercivity-intrinsic", "magnet.coercivity-coefficient", "temperature.magnet")),
        Define.Figure("magnet.coercivity-intrinsic.cold", FigureUnit.FieldStrength, "least intrinsic coercivity at the coldest ambient", "{magnet.coercivity-intrinsic} × (1 + {magnet.coercivity-coefficient} × ({ambient.temperature.least} − 20 °C))", Sources.MagnetTable, x =>
            At(x, "magnet.coercivity-intrinsic", "magnet.coercivity-coefficient", "ambient.temperature.least")),
        Define.Figure("magnet.recoil-permeability", FigureUnit.Ratio, "relative recoil permeability", "{magnets.material.recoil-permeability}, or the table's row of {magnets.grade}", Sources.MagnetTable, RecoilPermeability),
        Define.Figure("magnet.temperature-limit", FigureUnit.Kelvin, "highest working temperature of the grade", "{magnets.material.temperature-limit}, or the table's row of {magnets.grade}", Sources.MagnetTable, x =>
            Property(x, "magnets.material.temperature-limit", "temperature-limit")),
        Define.Figure("magnet.density", MassDensity, "density of the magnets", "{magnets.material.density}, or the table's row of {magnets.grade}", Sources.MagnetTable, x =>
            Property(x, "magnets.material.density", "density")),
        Define.Figure("magnet.flux-drop.hot", FigureUnit.Percent, "flux lost reversibly from 20 °C to the magnets' temperature", "1 − {magnet.remanence.hot} / {magnet.remanence}", Sources.MagnetTable, x =>
            x.Value(1 - (x.Figure("magnet.remanence.hot") / x.Figure("magnet.remanence")), 0.01)),
    ];

    private static FigureUnit TemperatureCoefficient { get; } = new("1/K", "%/K", new(0, 0, 0, 0, -1));

    private static FigureUnit MassDensity { get; } = new("kg/m³", "kg/m³", new(-3, 1, 0, 0, 0));

    /// <summary>True for hard ferrite, whose coercivity falls in the cold.</summary>
    /// <param name="x">The evaluation.</param>
    public static bool IsFerrite(Evaluation x) => x.OptionalFigure("magnet.coercivity-coefficient") > 0;

    private static ReferenceRow? Row(Evaluation x) =>
        x.OptionalText("magnets.grade") is { } grade ? EmbeddedRulebooks.Tables.Find(GradeTable)?.FindRow("grade", grade) : null;

    private static Outcome OfGrade(Evaluation x, string column)
    {
        string grade = x.Text("magnets.grade");
        return x.Incomplete ? x.Stop()
            : Row(x)?.Number(column) is { } number ? x.Value(number)
            : x.OutOfDomain($"the table of magnet grades has no {column} for '{grade}'");
    }

    private static Outcome Property(Evaluation x, string key, string column)
    {
        if (x.Optional(key) is { } stated)
        {
            return x.Value(stated);
        }

        if (Row(x)?.Number(column) is { } number)
        {
            return x.Value(number);
        }

        // A grade that the table does not know is no help: the number itself is what is missing.
        x.Miss(x.States("magnets.grade") ? key : "magnets.grade");
        return x.Stop();
    }

    private static Outcome Remanence(Evaluation x)
    {
        if (x.Find("magnets.material.remanence") is { } stated)
        {
            return x.Value(stated.Number, 0.5 * (stated.ToleranceBelow + stated.ToleranceAbove));
        }

        if (Row(x) is { } row && row.Number("remanence-typical") is { } typical)
        {
            double least = row.Number("remanence-least") ?? typical;
            double greatest = row.Number("remanence-greatest") ?? typical;
            return x.Value(typical, 0.5 * (greatest - least));
        }

        x.Miss(x.States("magnets.grade") ? "magnets.material.remanence" : "magnets.grade");
        return x.Stop();
    }

    private static Outcome RecoilPermeability(Evaluation x)
    {
        if (x.Optional("magnets.material.recoil-permeability") is { } stated)
        {
            return x.Value(stated);
        }

        return Row(x)?.Number("recoil-permeability") is { } number
            ? x.Value(number)
            : x.Assume(1.05, "usual for sintered rare-earth magnets and hard ferrite (1.03 to 1.10), from memory");
    }

    private static Outcome At(Evaluation x, string property, string coefficient, string temperature)
    {
        double at20 = x.Figure(property);
        double change = x.Figure(coefficient) * (x.Figure(temperature) - ReferenceTemperature);
        return x.Value(Math.Max(0, at20 * (1 + change)), Math.Abs(at20) * RelativeBand(x, property, coefficient, temperature));
    }

    /// <summary>The band of a property at temperature: its own, and the temperature's through the coefficient.</summary>
    private static double RelativeBand(Evaluation x, string property, string coefficient, string temperature)
    {
        Outcome own = x.Look(property);
        double slope = x.OptionalFigure(coefficient) ?? 0;
        double byTemperature = Math.Abs(slope) * x.Look(temperature).Uncertainty;
        double relative = own.HasValue && own.Value != 0 ? own.Uncertainty / Math.Abs(own.Value) : 0;
        return double.Hypot(relative, byTemperature);
    }
}
