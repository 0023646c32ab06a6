using System.Collections.Immutable;
using SpecLint.Review.Expressions;
using SpecLint.Spec.Units;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Rules;

/// <summary>Reads the expressions of a rule and checks that measure, bounds and scale fit together.</summary>
internal sealed class BoundReader(ExpressionScope scope, FaultList faults)
{
    private static readonly ImmutableArray<string> BoundFields = ["at-most", "at-least", "within"];

    /// <summary>An expression that must be a number.</summary>
    public Expression? Number(YamlScalar? scalar, string field) => Parse(scalar, field, wantsCondition: false);

    /// <summary>An expression that must be a condition.</summary>
    public Expression? Condition(YamlScalar? scalar, string field) => Parse(scalar, field, wantsCondition: true);

    /// <summary>The bound that a mapping states, or null when it states none.</summary>
    public Bound? Read(FieldReader fields)
    {
        string[] stated = [.. BoundFields.Where(fields.Has)];
        if (stated.Length > 1)
        {
            faults.Add($"{stated[0]} and {stated[1]} stand together; expected one bound (within takes two limits)", fields.KeyRegion(stated[1]));
        }

        if (stated.Length == 0)
        {
            return null;
        }

        if (stated[0] is not "within")
        {
            Expression? limit = Number(fields.Scalar(stated[0]), stated[0]);
            return limit is null ? null : stated[0] is "at-least" ? new Bound(limit, null) : new Bound(null, limit);
        }

        ImmutableArray<YamlScalar> limits = fields.Scalars("within");
        if (limits.Length != 2)
        {
            faults.Add("within needs a list of two limits, the lower one first", fields.KeyRegion("within"));
            return null;
        }

        Expression? least = Number(limits[0], "within");
        Expression? most = Number(limits[1], "within");
        if (least?.Constant > most?.Constant)
        {
            faults.Add("within has its lower limit above its upper one", limits[0].Region);
        }

        return least is null || most is null ? null : new Bound(least, most);
    }

    /// <summary>The second bound that a mapping states, or null when it states none.</summary>
    public Beyond? ReadBeyond(FieldReader fields, Grade grade)
    {
        if (fields.Find("beyond") is not { } node
            || FieldReader.Open(node, node.Region, "beyond", ["at-most", "at-least", "within", "grade"], faults) is not { } inner)
        {
            return null;
        }

        Grade harsher = inner.Word("grade", RuleReader.Grades, Grade.Hold);
        if (!inner.Has("grade"))
        {
            faults.Add("beyond lacks the field grade", fields.KeyRegion("beyond"));
        }
        else if (harsher <= grade && fields.Has("grade"))
        {
            faults.Add("beyond is no graver than the rule's first grade", inner.KeyRegion("grade"));
        }

        Bound? bound = Read(inner);
        if (bound is null)
        {
            faults.Add("beyond lacks a bound; expected at-most, at-least or within", fields.KeyRegion("beyond"));
        }

        return bound is null ? null : new Beyond(bound, harsher);
    }

    /// <summary>Reports what does not fit together in a rule.</summary>
    public void CheckShape(FieldReader fields, Rule rule)
    {
        if (rule.Source is RuleSource.Expression)
        {
            CheckFields(fields);
        }

        if (!fields.Has("grade") && rule.Source != RuleSource.Hazard)
        {
            faults.Add("a rule lacks the field grade", fields.KeyRegion("id"));
        }

        if (rule.Source == RuleSource.Hazard && BoundFields.Append("require").Append("beyond").FirstOrDefault(fields.Has) is { } odd)
        {
            faults.Add($"a hazard has no {odd}; it is reported where its condition holds", fields.KeyRegion(odd));
        }

        CheckBounds(rule);
    }

    /// <summary>Reports bounds that do not fit the measure, the scale or each other.</summary>
    public void CheckBounds(Rule rule)
    {
        Dimension? wanted = rule.Source == RuleSource.Declarations ? Dimension.None : rule.Measure?.Dimension;
        if (wanted is not { } dimension)
        {
            return;
        }

        foreach (Expression limit in Limits(rule))
        {
            CheckLimit(limit, dimension, rule);
        }

        if (rule.Scale is { } scale && scale.Dimension != dimension)
        {
            faults.Add($"scale is {ExpressionBinder.Describe(scale.Dimension)}, the measure {ExpressionBinder.Describe(dimension)}", scale.Region);
        }
        else if (rule.Scale?.Constant <= 0)
        {
            faults.Add("scale is not above zero", rule.Scale.Region);
        }

        CheckBeyond(rule);
    }

    private static bool IsTemperature(Dimension dimension) => dimension == new Dimension(0, 0, 0, 0, 1);

    private static IEnumerable<Expression> Limits(Rule rule) =>
        new[] { rule.Bound?.Least, rule.Bound?.Most, rule.Beyond?.Bound.Least, rule.Beyond?.Bound.Most }.OfType<Expression>();

    private void CheckFields(FieldReader fields)
    {
        bool hasBound = BoundFields.Any(fields.Has);
        if (fields.Has("measure") == fields.Has("require"))
        {
            faults.Add("a rule needs either measure or require", fields.KeyRegion("measure"));
        }
        else if (fields.Has("measure") && !hasBound)
        {
            faults.Add("measure has no bound; expected at-most, at-least or within", fields.KeyRegion("measure"));
        }
        else if (fields.Has("require") && BoundFields.Append("beyond").Append("scale").Append("unit").FirstOrDefault(fields.Has) is { } odd)
        {
            faults.Add($"{odd} goes with measure, not with require", fields.KeyRegion(odd));
        }
    }

    private void CheckLimit(Expression limit, Dimension dimension, Rule rule)
    {
        bool isZero = limit.Constant == 0;
        bool isBareZero = isZero && limit.Dimension == Dimension.None;
        if (limit.Dimension != dimension && !isBareZero)
        {
            faults.Add(
                $"the bound is {ExpressionBinder.Describe(limit.Dimension)}, the measure {ExpressionBinder.Describe(dimension)}", limit.Region);
            return;
        }

        bool isPoint = IsTemperature(dimension) && rule.DisplayUnit is not "K" && rule.Measure?.DisplayUnit is not "K";
        if (rule.Scale is null && (isZero || isPoint))
        {
            faults.Add("the bound is zero or a temperature, so the margin needs a scale", limit.Region);
        }
    }

    private void CheckBeyond(Rule rule)
    {
        if (rule.Beyond is not { } beyond || rule.Bound is not { } first)
        {
            return;
        }

        bool sameSides = first.Least is null == beyond.Bound.Least is null && first.Most is null == beyond.Bound.Most is null;
        if (!sameSides)
        {
            faults.Add("beyond bounds another side than the rule's first bound", (beyond.Bound.Least ?? beyond.Bound.Most)!.Region);
        }
        else if (beyond.Bound.Least?.Constant > first.Least?.Constant)
        {
            faults.Add("beyond is stricter than the rule's first bound", beyond.Bound.Least.Region);
        }
        else if (beyond.Bound.Most?.Constant < first.Most?.Constant)
        {
            faults.Add("beyond is stricter than the rule's first bound", beyond.Bound.Most.Region);
        }
    }

    private Expression? Parse(YamlScalar? scalar, string field, bool wantsCondition)
    {
        if (scalar is null)
        {
            return null;
        }

        Expression? expression = ExpressionParser.Parse(scalar.Text, scalar.Region, scope, out ExpressionFault? fault);
        if (fault is not null)
        {
            faults.Add(fault, scalar);
            return null;
        }

        if (expression!.IsText || expression.IsCondition != wantsCondition)
        {
            string found = expression.IsText ? "a text" : expression.IsCondition ? "a condition" : "a number";
            faults.Add($"{field} is {found}; expected {(wantsCondition ? "a condition" : "a number")}", scalar.Region);
            return null;
        }

        return expression;
    }
}
