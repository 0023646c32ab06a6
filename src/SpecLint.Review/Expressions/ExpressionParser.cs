using SpecLint.Spec.Names;
using SpecLint.Spec.Yaml;

namespace SpecLint.Review.Expressions;

/// <summary>
/// Reads an expression by recursive descent; names are resolved and dimensions checked on the way. The first fault ends it.
/// </summary>
/// <remarks>
/// Precedence from loose to tight: <c>or</c>; <c>and</c>; <c>not</c>; comparison and <c>in</c>, which do not chain; sum; product; sign; power.
/// </remarks>
public sealed class ExpressionParser
{
    private readonly List<Token> _tokens;
    private readonly ExpressionBinder _binder;
    private int _next;
    private int _depth;

    private ExpressionParser(List<Token> tokens, ExpressionBinder binder)
    {
        _tokens = tokens;
        _binder = binder;
    }

    private Token Current => _tokens[_next];

    /// <summary>Parses an expression.</summary>
    /// <param name="text">Its text.</param>
    /// <param name="region">Where it stands in the rulebook.</param>
    /// <param name="scope">What it can name.</param>
    /// <param name="fault">What is wrong with it; null when it was parsed.</param>
    /// <returns>The expression, or null when there is a fault.</returns>
    public static Expression? Parse(string text, Region region, ExpressionScope scope, out ExpressionFault? fault)
    {
        if (text.Length > ExpressionLimits.Length)
        {
            fault = new ExpressionFault($"the expression has {text.Length} characters; expected at most {ExpressionLimits.Length}", 0, text.Length);
            return null;
        }

        List<Token> tokens = Tokenizer.Cut(text, out fault);
        if (fault is not null)
        {
            return null;
        }

        var binder = new ExpressionBinder(text, scope);
        Typed? typed = new ExpressionParser(tokens, binder).ParseWhole();
        fault = binder.Fault;
        if (typed is null || fault is not null)
        {
            return null;
        }

        return new Expression
        {
            Text = text,
            Region = region,
            Dimension = typed.Dimension,
            IsCondition = typed.Kind == TypedKind.Condition,
            IsText = typed.Kind == TypedKind.Text,
            DisplayUnit = typed.Unit,
            Figures = [.. binder.Names.Figures],
            Keys = [.. binder.Names.Keys],
            StatedKeys = [.. binder.Names.StatedKeys],
            Root = typed.Node,
        };
    }

    private Typed? ParseWhole()
    {
        if (Current.Kind == TokenKind.End)
        {
            return Fail("the expression is empty", Current);
        }

        Typed? whole = ParseOr();
        if (whole is not null && Current.Kind != TokenKind.End)
        {
            return Fail($"{Describe(Current)} is not expected here", Current);
        }

        return whole;
    }

    private Typed? ParseOr() => ParseJunction("or", ParseAnd);

    private Typed? ParseAnd() => ParseJunction("and", ParseNot);

    private Typed? ParseJunction(string word, Func<Typed?> parseOperand)
    {
        Typed? first = parseOperand();
        if (first is null || !Current.IsWord(word))
        {
            return first;
        }

        var operands = new List<Typed> { first };
        while (Current.IsWord(word))
        {
            _next++;
            if (parseOperand() is not { } operand)
            {
                return null;
            }

            operands.Add(operand);
        }

        return _binder.Junction(string.Equals(word, "or", StringComparison.Ordinal), operands);
    }

    private Typed? ParseNot()
    {
        if (!Current.IsWord("not"))
        {
            return ParseComparison();
        }

        Token sign = Current;
        _next++;
        return Nest(ParseNot, sign) is { } operand ? _binder.Not(operand, sign.Start) : null;
    }

    private Typed? ParseComparison()
    {
        if (ParseSum() is not { } left)
        {
            return null;
        }

        Typed? result = left;
        if (ComparisonOf(Current) is { } comparison)
        {
            _next++;
            result = ParseSum() is { } right ? _binder.Compare(comparison, left, right) : null;
        }
        else if (Current.IsWord("in") || (Current.IsWord("not") && _tokens[_next + 1].IsWord("in")))
        {
            bool negated = Current.IsWord("not");
            _next += negated ? 2 : 1;
            result = ParseList() is { } options ? _binder.In(left, options, negated, End()) : null;
        }

        if (result is not null && (ComparisonOf(Current) is not null || Current.IsWord("in")))
        {
            return Fail("comparisons do not chain; join two of them with 'and'", Current);
        }

        return result;
    }

    private static Comparison? ComparisonOf(Token token) => token.Kind != TokenKind.Symbol ? null : token.Text switch
    {
        "=" => Comparison.Equal,
        "!=" => Comparison.NotEqual,
        "<" => Comparison.Less,
        "<=" => Comparison.LessOrEqual,
        ">" => Comparison.Greater,
        ">=" => Comparison.GreaterOrEqual,
        _ => null,
    };

    private Typed? ParseSum()
    {
        Typed? left = ParseProduct();
        while (left is not null && (Current.Is("+") || Current.Is("-")))
        {
            Arithmetic operation = Current.Is("+") ? Arithmetic.Sum : Arithmetic.Difference;
            _next++;
            left = ParseProduct() is { } right ? _binder.Sum(operation, left, right) : null;
        }

        return left;
    }

    private Typed? ParseProduct()
    {
        Typed? left = ParseSign();
        while (left is not null && (Current.Is("*") || Current.Is("/")))
        {
            Arithmetic operation = Current.Is("*") ? Arithmetic.Product : Arithmetic.Quotient;
            _next++;
            left = ParseSign() is { } right ? _binder.Product(operation, left, right) : null;
        }

        return left;
    }

    private Typed? ParseSign()
    {
        if (!Current.Is("-"))
        {
            return ParsePower();
        }

        Token sign = Current;
        _next++;
        return Nest(ParseSign, sign) is { } operand ? _binder.Negate(operand, sign.Start) : null;
    }

    private Typed? ParsePower()
    {
        Typed? operand = ParseOperand();
        if (operand is null || !Current.Is("^"))
        {
            return operand;
        }

        _next++;
        bool negative = Current.Is("-");
        _next += negative ? 1 : 0;
        Token exponent = Current;
        if (exponent.Kind != TokenKind.Number || exponent.Unit.Length > 0 || exponent.Number > ExpressionLimits.Exponent
            || exponent.Number != Math.Floor(exponent.Number))
        {
            return Fail($"{Describe(exponent)} cannot be an exponent; expected a whole number up to {ExpressionLimits.Exponent}", exponent);
        }

        _next++;
        return _binder.Power(operand, negative ? -(int)exponent.Number : (int)exponent.Number, End());
    }

    private Typed? ParseOperand()
    {
        Token token = Current;
        switch (token.Kind)
        {
            case TokenKind.Number:
                _next++;
                return ExpressionBinder.Number(token);
            case TokenKind.Text:
                _next++;
                return new Typed(new TextNode(token.Text), TypedKind.Text, token.Start, token.Start + token.Length);
            case TokenKind.Name when token.Text is "and" or "or" or "in" or "not":
                return Fail($"'{token.Text}' is not expected here", token);
            case TokenKind.Name when _tokens[_next + 1].Is("("):
                return ParseCall(token);
            case TokenKind.Name:
                _next++;
                return _binder.Names.Name(token);
            case TokenKind.Symbol when token.Is("("):
                _next++;
                Typed? inner = Nest(ParseOr, token);
                return inner is not null && Expect(")") ? inner with { Start = token.Start, End = End() } : null;
            default:
                return Fail(token.Kind == TokenKind.End ? "the expression ends too early" : $"{Describe(token)} is not expected here", token);
        }
    }

    private Typed? ParseCall(Token name)
    {
        _next++;
        if (name.Text is "stated" or "known" or "number-of")
        {
            _next++;
            Token argument = Current;
            if (argument.Kind != TokenKind.Name)
            {
                return Fail($"{Describe(argument)} is not a name; {name.Text} takes one name", argument);
            }

            _next++;
            return Expect(")") ? _binder.Names.Call(name, argument, End()) : null;
        }

        if (name.Text is "table")
        {
            return Nest(() => ParseTable(name), name);
        }

        if (!ExpressionBinder.Functions.ContainsKey(name.Text))
        {
            return Fail($"there is no function {name.Text}{NearestName.Suggestion(name.Text, ExpressionBinder.FunctionNames)}", name);
        }

        return ParseList() is { } arguments ? _binder.Call(name, arguments, End()) : null;
    }

    private List<Typed>? ParseList()
    {
        Token open = Current;
        if (!Expect("("))
        {
            return null;
        }

        var items = new List<Typed>();
        do
        {
            if (Nest(ParseOr, open) is not { } item)
            {
                return null;
            }

            items.Add(item);
        }
        while (Accept(","));

        return Expect(")") ? items : null;
    }

    private Typed? ParseTable(Token name)
    {
        _next++;
        Token table = Current;
        if (!ExpectText("the table's name") || !Expect(","))
        {
            return null;
        }

        Token column = Current;
        if (!ExpectText("a column's name"))
        {
            return null;
        }

        var selectors = new List<(Token Column, Comparison Comparison, Typed Wanted)>();
        while (Accept(","))
        {
            Token by = Current;
            if (!ExpectText("a column's name"))
            {
                return null;
            }

            if (ComparisonOf(Current) is not { } comparison)
            {
                return Fail($"{Describe(Current)} is not expected here; expected a comparison with the column", Current);
            }

            _next++;
            if (Nest(ParseSum, by) is not { } wanted)
            {
                return null;
            }

            selectors.Add((by, comparison, wanted));
        }

        return Expect(")") ? _binder.Table(name, table, column, selectors, End()) : null;
    }

    private Typed? Nest(Func<Typed?> parse, Token at)
    {
        if (_depth >= ExpressionLimits.Depth)
        {
            return Fail($"the expression nests deeper than {ExpressionLimits.Depth} levels", at);
        }

        _depth++;
        Typed? result = parse();
        _depth--;
        return result;
    }

    private bool Accept(string symbol)
    {
        bool found = Current.Is(symbol);
        _next += found ? 1 : 0;
        return found;
    }

    private bool Expect(string symbol)
    {
        if (Accept(symbol))
        {
            return true;
        }

        string found = Current.Kind == TokenKind.End ? "the expression ends too early" : $"{Describe(Current)} is not expected here";
        _ = Fail($"{found}; expected '{symbol}'", Current);
        return false;
    }

    private bool ExpectText(string what)
    {
        if (Current.Kind == TokenKind.Text)
        {
            _next++;
            return true;
        }

        _ = Fail($"{Describe(Current)} is not expected here; expected {what} in quotes", Current);
        return false;
    }

    private int End() => _tokens[_next - 1].Start + _tokens[_next - 1].Length;

    private static string Describe(Token token) => token.Kind switch
    {
        TokenKind.End => "the end",
        TokenKind.Text => $"\"{token.Text}\"",
        _ => $"'{token.Text}'",
    };

    private Typed? Fail(string message, Token at) => _binder.Fail(message, at.Start, Math.Max(at.Length, 0));
}
