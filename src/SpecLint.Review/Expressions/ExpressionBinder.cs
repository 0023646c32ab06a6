using System.Collections.Frozen;
using System.Collections.Immutable;
using SpecLint.Review.Figures;
using SpecLint.Review.Rules;
using SpecLint.Spec.Names;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Expressions;

/// <summary>Resolves the names of an expression and checks the dimensions and kinds of its operands while it is parsed.</summary>
internal sealed class ExpressionBinder(string text, ExpressionScope scope)
{
    private const string TemperatureAdvice = "a temperature in °C cannot be added, multiplied or divided; write a difference in K";

    /// <summary>The functions of numbers with their least number of arguments.</summary>
    public static FrozenDictionary<string, (NumberFunction? Function, int Least, int Most)> Functions { get; } =
        new Dictionary<string, (NumberFunction?, int, int)>(StringComparer.Ordinal)
        {
            ["min"] = (NumberFunction.Least, 2, int.MaxValue),
            ["max"] = (NumberFunction.Greatest, 2, int.MaxValue),
            ["abs"] = (NumberFunction.Magnitude, 1, 1),
            ["sqrt"] = (NumberFunction.SquareRoot, 1, 1),
            ["gcd"] = (NumberFunction.GreatestCommonDivisor, 2, int.MaxValue),
            ["lcm"] = (NumberFunction.LeastCommonMultiple, 2, int.MaxValue),
            ["choose"] = (null, 3, 3),
        }.ToFrozenDictionary(StringComparer.Ordinal);

    /// <summary>Every function name.</summary>
    public static ImmutableArray<string> FunctionNames { get; } =
        ["min", "max", "abs", "sqrt", "gcd", "lcm", "choose", "stated", "known", "number-of", "table"];

    private NameBinder? _names;

    /// <summary>Resolves figures and keys.</summary>
    public NameBinder Names => _names ??= new NameBinder(scope.Figures, Fail);

    /// <summary>The first fault; null when there is none.</summary>
    public ExpressionFault? Fault { get; private set; }

    public Typed? Fail(string message, int start, int length)
    {
        Fault ??= new ExpressionFault(message, start, length);
        return null;
    }

    public static Typed Number(Token token) => new(new NumberNode(token.Number), TypedKind.Number, token.Start, token.Start + token.Length)
    {
        Dimension = token.Dimension,
        Unit = token.Unit,
        IsZero = token.Number == 0 && token.Unit.Length == 0,
        IsPoint = token.IsPoint,
    };

    public Typed? Junction(bool decisive, List<Typed> operands)
    {
        foreach (Typed operand in operands)
        {
            if (operand.Kind != TypedKind.Condition)
            {
                return Mismatch(operand, "a condition");
            }
        }

        var node = new JunctionNode(decisive, [.. operands.Select(o => o.Node)]);
        return new Typed(node, TypedKind.Condition, operands[0].Start, operands[^1].End);
    }

    public Typed? Not(Typed operand, int start) => operand.Kind != TypedKind.Condition
        ? Mismatch(operand, "a condition")
        : new Typed(new NotNode(operand.Node), TypedKind.Condition, start, operand.End);

    public Typed? Compare(Comparison comparison, Typed left, Typed right)
    {
        if (left.Kind == TypedKind.Text && right.Kind == TypedKind.Text)
        {
            return comparison is Comparison.Equal or Comparison.NotEqual
                ? CompareTexts(left, [right], comparison == Comparison.NotEqual, right.End)
                : Fail("words have no order; compare them with = or !=", left.Start, right.End - left.Start);
        }

        if (!AreNumbers(left, right))
        {
            return null;
        }

        return Agree(left, right, "compared")
            ? new Typed(new NumberComparisonNode(comparison, left.Node, right.Node), TypedKind.Condition, left.Start, right.End)
            : null;
    }

    public Typed? In(Typed left, List<Typed> options, bool negated, int end)
    {
        if (left.Kind == TypedKind.Text)
        {
            return CompareTexts(left, options, negated, end);
        }

        var alternatives = new List<ExpressionNode>();
        foreach (Typed option in options)
        {
            if (Compare(Comparison.Equal, left, option) is not { } alternative)
            {
                return null;
            }

            alternatives.Add(alternative.Node);
        }

        ExpressionNode any = new JunctionNode(Decisive: true, [.. alternatives]);
        return new Typed(negated ? new NotNode(any) : any, TypedKind.Condition, left.Start, end);
    }

    public Typed? Sum(Arithmetic operation, Typed left, Typed right)
    {
        if (!AreNumbers(left, right) || !Agree(left, right, operation == Arithmetic.Sum ? "added" : "subtracted"))
        {
            return null;
        }

        if (operation == Arithmetic.Sum && right.IsPoint)
        {
            return Fail(TemperatureAdvice, right.Start, right.End - right.Start);
        }

        string unit = left.Unit.Length > 0 ? left.Unit : right.Unit;
        bool isDifference = operation == Arithmetic.Difference && left.Unit is "°C" && right.Unit is "°C";
        return new Typed(new ArithmeticNode(operation, left.Node, right.Node), TypedKind.Number, left.Start, right.End)
        {
            Dimension = left.IsZero ? right.Dimension : left.Dimension,
            Unit = isDifference ? "K" : unit,
        };
    }

    public Typed? Product(Arithmetic operation, Typed left, Typed right)
    {
        if (!AreNumbers(left, right))
        {
            return null;
        }

        if (left.IsPoint || right.IsPoint)
        {
            Typed point = left.IsPoint ? left : right;
            return Fail(TemperatureAdvice, point.Start, point.End - point.Start);
        }

        Dimension dimension = operation == Arithmetic.Product ? left.Dimension * right.Dimension : left.Dimension / right.Dimension;
        string unit = right.Dimension == Dimension.None ? left.Unit
            : left.Dimension == Dimension.None && operation == Arithmetic.Product ? right.Unit : "";
        return Bounded(new Typed(new ArithmeticNode(operation, left.Node, right.Node), TypedKind.Number, left.Start, right.End)
        {
            Dimension = dimension,
            Unit = dimension == Dimension.None ? "" : unit,
        });
    }

    public Typed? Negate(Typed operand, int start) => operand.Kind != TypedKind.Number ? Mismatch(operand, "a number")
        : operand.IsPoint ? Fail("a temperature in °C cannot take a sign here; write it in K", start, operand.End - start)
        : new Typed(Negated(operand.Node), TypedKind.Number, start, operand.End)
        {
            Dimension = operand.Dimension,
            Unit = operand.Unit,
            IsZero = operand.IsZero,
        };

    public Typed? Power(Typed operand, int exponent, int end)
    {
        if (operand.Kind != TypedKind.Number)
        {
            return Mismatch(operand, "a number");
        }

        if (operand.IsPoint)
        {
            return Fail(TemperatureAdvice, operand.Start, operand.End - operand.Start);
        }

        Dimension d = operand.Dimension;
        return Bounded(new Typed(new PowerNode(operand.Node, exponent), TypedKind.Number, operand.Start, end)
        {
            Dimension = new Dimension(d.Length * exponent, d.Mass * exponent, d.Time * exponent, d.Current * exponent, d.Temperature * exponent),
        });
    }

    public Typed? Call(Token name, List<Typed> arguments, int end)
    {
        var (function, least, most) = Functions[name.Text];
        if (arguments.Count < least || arguments.Count > most)
        {
            string expected = least == most ? $"{least}" : $"at least {least}";
            return Fail($"{name.Text} has {arguments.Count} argument(s); expected {expected}", name.Start, end - name.Start);
        }

        if (function is null)
        {
            return Choose(name, arguments, end);
        }

        foreach (Typed argument in arguments)
        {
            if (argument.Kind != TypedKind.Number)
            {
                return Mismatch(argument, "a number");
            }

            if (!Agree(arguments[0], argument, "taken together"))
            {
                return null;
            }
        }

        Typed first = arguments.Find(a => !a.IsZero) ?? arguments[0];
        if (function is NumberFunction.GreatestCommonDivisor or NumberFunction.LeastCommonMultiple && first.Dimension != Dimension.None)
        {
            return Fail($"{name.Text} takes whole numbers without a unit", first.Start, first.End - first.Start);
        }

        Dimension? dimension = function == NumberFunction.SquareRoot ? Root(first.Dimension) : first.Dimension;
        return dimension is null
            ? Fail($"the square root of {Describe(first.Dimension)} is not a quantity", name.Start, end - name.Start)
            : new Typed(new FunctionNode(function.Value, [.. arguments.Select(a => a.Node)]), TypedKind.Number, name.Start, end)
            {
                Dimension = dimension.Value,
                Unit = function == NumberFunction.SquareRoot ? "" : first.Unit,
            };
    }

    public Typed? Table(
        Token name, Token table, Token column, List<(Token Column, Comparison Comparison, Typed Wanted)> selectors, int end)
    {
        if (scope.Tables.Find(table.Text) is not { } found)
        {
            return Fail($"there is no table \"{table.Text}\"{NearestName.Suggestion(table.Text, scope.Tables.Tables.Select(t => t.Name))}", table.Start, table.Length);
        }

        if (FindColumn(found, column) is not { } result)
        {
            return null;
        }

        var bound = new List<TableSelector>();
        foreach (var (by, comparison, wanted) in selectors)
        {
            if (FindColumn(found, by) is not { } key)
            {
                return null;
            }

            var side = new Typed(new ColumnNode(), key.IsNumber ? TypedKind.Number : TypedKind.Text, by.Start, by.Start + by.Length)
            {
                Dimension = key.Dimension,
            };
            if (Compare(comparison, side, wanted) is null)
            {
                return null;
            }

            bound.Add(new TableSelector(key.Name, comparison, wanted.Node));
        }

        return new Typed(new TableNode(found, result.Name, [.. bound]), result.IsNumber ? TypedKind.Number : TypedKind.Text, name.Start, end)
        {
            Dimension = result.Dimension,
        };
    }

    private static ExpressionNode Negated(ExpressionNode operand) =>
        operand is NumberNode number ? new NumberNode(-number.Number) : new NegationNode(operand);

    private static Dimension? Root(Dimension d) =>
        (d.Length | d.Mass | d.Time | d.Current | d.Temperature) % 2 != 0
            ? null
            : new Dimension(d.Length / 2, d.Mass / 2, d.Time / 2, d.Current / 2, d.Temperature / 2);

    public static string Describe(Dimension dimension) => dimension == Dimension.None ? "a plain number" : dimension.ToString();

    private Typed? Choose(Token name, List<Typed> arguments, int end)
    {
        var (condition, then, other) = (arguments[0], arguments[1], arguments[2]);
        if (condition.Kind != TypedKind.Condition)
        {
            return Mismatch(condition, "a condition");
        }

        if (!AreNumbers(then, other) || !Agree(then, other, "chosen between"))
        {
            return null;
        }

        return new Typed(new ChoiceNode(condition.Node, then.Node, other.Node), TypedKind.Number, name.Start, end)
        {
            Dimension = then.IsZero ? other.Dimension : then.Dimension,
            Unit = then.Unit.Length > 0 ? then.Unit : other.Unit,
        };
    }

    private Typed? CompareTexts(Typed left, List<Typed> options, bool negated, int end)
    {
        foreach (Typed option in options)
        {
            if (option.Kind != TypedKind.Text)
            {
                return Mismatch(option, "a text");
            }

            if (!IsPossible(left, option) || !IsPossible(option, left))
            {
                return null;
            }
        }

        return new Typed(new TextComparisonNode(left.Node, [.. options.Select(o => o.Node)], negated), TypedKind.Condition, left.Start, end);
    }

    private bool IsPossible(Typed key, Typed literal)
    {
        if (key.Words.Length == 0 || literal.Literal is not { } word || key.Words.Contains(word, StringComparer.Ordinal))
        {
            return true;
        }

        string written = text[key.Start..key.End];
        _ = Fail($"{written} is never \"{word}\"; expected one of {string.Join(", ", key.Words)}", literal.Start, literal.End - literal.Start);
        return false;
    }

    private ReferenceColumn? FindColumn(ReferenceTable table, Token column)
    {
        if (table.FindColumn(column.Text) is { } found)
        {
            return found;
        }

        _ = Fail(
            $"table {table.Name} has no column \"{column.Text}\"{NearestName.Suggestion(column.Text, table.Columns.Select(c => c.Name))}",
            column.Start,
            column.Length);
        return null;
    }

    private bool AreNumbers(Typed left, Typed right)
    {
        Typed? wrong = left.Kind != TypedKind.Number ? left : right.Kind != TypedKind.Number ? right : null;
        if (wrong is null)
        {
            return true;
        }

        string expected = left.Kind == TypedKind.Text || right.Kind == TypedKind.Text ? "numbers or words on both sides" : "a number";
        _ = Mismatch(wrong, expected);
        return false;
    }

    private bool Agree(Typed left, Typed right, string verb)
    {
        if (left.Dimension == right.Dimension || left.IsZero || right.IsZero)
        {
            return true;
        }

        _ = Fail(
            $"{Describe(left.Dimension)} and {Describe(right.Dimension)} cannot be {verb}", left.Start, right.End - left.Start);
        return false;
    }

    private Typed? Mismatch(Typed found, string expected)
    {
        string what = found.Kind switch
        {
            TypedKind.Number => "a number",
            TypedKind.Condition => "a condition",
            _ => "a text",
        };
        return Fail($"{text[found.Start..found.End]} is {what}; expected {expected}", found.Start, found.End - found.Start);
    }

    private Typed? Bounded(Typed typed)
    {
        Dimension d = typed.Dimension;
        int greatest = Math.Max(
            Math.Max(Math.Max(Math.Abs(d.Length), Math.Abs(d.Mass)), Math.Abs(d.Time)), Math.Max(Math.Abs(d.Current), Math.Abs(d.Temperature)));
        return greatest <= ExpressionLimits.DimensionExponent
            ? typed
            : Fail($"{Describe(d)} is not a quantity", typed.Start, typed.End - typed.Start);
    }
}
