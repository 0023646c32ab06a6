using System.Globalization;
using SpecLint.Spec.Units;

namespace SpecLint.Review.Expressions;

/// <summary>Cuts the text of an expression into words in one pass; a number takes the unit that follows it.</summary>
internal sealed class Tokenizer
{
    private readonly string _text;
    private readonly List<Token> _tokens = [];
    private int _at;
    private ExpressionFault? _fault;

    private Tokenizer(string text) => _text = text;

    /// <summary>The words, closed by <see cref="TokenKind.End"/>; on a fault the list is of no use.</summary>
    public static List<Token> Cut(string text, out ExpressionFault? fault)
    {
        var tokenizer = new Tokenizer(text);
        tokenizer.Run();
        fault = tokenizer._fault;
        return tokenizer._tokens;
    }

    private void Run()
    {
        while (_fault is null)
        {
            while (_at < _text.Length && IsBlank(_text[_at]))
            {
                _at++;
            }

            if (_at >= _text.Length)
            {
                _tokens.Add(new Token(TokenKind.End, _text.Length, 0, ""));
                return;
            }

            char c = _text[_at];
            if (char.IsAsciiDigit(c))
            {
                ReadNumber();
            }
            else if (char.IsAsciiLetter(c))
            {
                ReadName();
            }
            else if (c is '"' or '\'')
            {
                ReadText(c);
            }
            else
            {
                ReadSymbol(c);
            }
        }
    }

    private static bool IsBlank(char c) => c is ' ' or '\t' or '\r' or '\n' or '\u00A0' or '\u202F';

    private void ReadNumber()
    {
        int start = _at;
        SkipDigits();
        if (Peek(0) == '.' && char.IsAsciiDigit(Peek(1)))
        {
            _at++;
            SkipDigits();
        }

        if (Peek(0) is 'e' or 'E' && (char.IsAsciiDigit(Peek(1)) || (Peek(1) is '+' or '-' && char.IsAsciiDigit(Peek(2)))))
        {
            _at += 2;
            SkipDigits();
        }

        string digits = _text[start.._at];
        double number = double.Parse(digits, NumberStyles.Float, CultureInfo.InvariantCulture);
        if (!double.IsFinite(number))
        {
            Fail($"{digits} is not a finite number", start, _at - start);
            return;
        }

        ReadUnit(start, number);
    }

    private void ReadUnit(int start, double number)
    {
        int end = _at;
        int unitStart = _at;
        while (unitStart < _text.Length && _text[unitStart] is ' ' or '\u00A0' or '\u202F')
        {
            unitStart++;
        }

        int unitEnd = UnitEnd(unitStart);
        string word = _text[unitStart..unitEnd];
        if (word.Length == 0 || word is "and" or "or" or "in" or "not")
        {
            _tokens.Add(new Token(TokenKind.Number, start, end - start, _text[start..end]) { Number = number });
            return;
        }

        for (int length = word.Length; length > 0; length = word.AsSpan(0, length).LastIndexOfAny("/*·^"))
        {
            if (UnitTable.TryFind(word.AsSpan(0, length), out UnitEntry? unit))
            {
                _at = unitStart + length;
                _tokens.Add(new Token(TokenKind.Number, start, _at - start, _text[start.._at])
                {
                    Number = unit.ToSi(number),
                    Dimension = unit.Dimension,
                    Unit = unit.Spelling,
                    IsPoint = unit.Offset != 0,
                });
                return;
            }
        }

        string meant = UnitTable.Nearest(word) is { } near ? $"; did you mean {near.Spelling}?" : "";
        Fail($"{word} is not a known unit{meant}", unitStart, word.Length);
    }

    private int UnitEnd(int start)
    {
        int at = start;
        if (at + 2 < _text.Length && _text[at] == '1' && _text[at + 1] == '/' && char.IsLetter(_text[at + 2]))
        {
            at += 2;
        }
        else if (at >= _text.Length || !(char.IsLetter(_text[at]) || _text[at] is '%' or '°' or '‰'))
        {
            return start;
        }

        while (at < _text.Length)
        {
            char c = _text[at];
            char next = at + 1 < _text.Length ? _text[at + 1] : '\0';
            bool opens = c == '(' && _text[at - 1] == '/';
            bool closes = c == ')' && _text.AsSpan(start, at - start).Contains('(');
            bool joins = c is '·' or '/' or '*' && (char.IsLetter(next) || next is '%' or '°' or '(');
            bool raises = c == '^' && (char.IsAsciiDigit(next) || next == '-');
            if (opens || closes || joins || raises || char.IsLetterOrDigit(c) || c is '%' or '°' or '‰' or '²' or '³' or '¹' or '⁻' || (c == '-' && _text[at - 1] == '^'))
            {
                at++;
                if (closes)
                {
                    break;
                }
            }
            else
            {
                break;
            }
        }

        return at;
    }

    private void ReadName()
    {
        int start = _at;
        while (_at < _text.Length)
        {
            char c = _text[_at];
            if (char.IsAsciiLetterOrDigit(c) || (c is '.' or '-' && char.IsAsciiLetterOrDigit(Peek(1))))
            {
                _at++;
            }
            else if (c == '[' && IndexEnd() is > 0 and int end)
            {
                _at = end;
            }
            else
            {
                break;
            }
        }

        _tokens.Add(new Token(TokenKind.Name, start, _at - start, _text[start.._at]));
    }

    private int IndexEnd()
    {
        int at = _at + 1;
        while (at < _text.Length && char.IsAsciiDigit(_text[at]))
        {
            at++;
        }

        return at > _at + 1 && at < _text.Length && _text[at] == ']' ? at + 1 : 0;
    }

    private void ReadText(char quote)
    {
        int start = _at;
        int end = _text.IndexOf(quote, start + 1);
        if (end < 0)
        {
            Fail("the quoted text does not end", start, _text.Length - start);
            return;
        }

        _at = end + 1;
        _tokens.Add(new Token(TokenKind.Text, start, _at - start, _text[(start + 1)..end]));
    }

    private void ReadSymbol(char c)
    {
        (string symbol, int length) = (c, Peek(1)) switch
        {
            ('<', '=') => ("<=", 2),
            ('>', '=') => (">=", 2),
            ('!', '=') => ("!=", 2),
            ('≤', _) => ("<=", 1),
            ('≥', _) => (">=", 1),
            ('≠', _) => ("!=", 1),
            ('·', _) or ('×', _) => ("*", 1),
            ('−', _) => ("-", 1),
            ('+' or '-' or '*' or '/' or '^' or '(' or ')' or ',' or '=' or '<' or '>', _) => (c.ToString(), 1),
            _ => ("", char.IsSurrogatePair(c, Peek(1)) ? 2 : 1),
        };

        if (symbol.Length == 0)
        {
            string found = char.IsControl(c) || char.IsSurrogate(c) ? "this character" : $"'{c}'";
            Fail($"{found} has no meaning in an expression", _at, length);
            return;
        }

        _tokens.Add(new Token(TokenKind.Symbol, _at, length, symbol));
        _at += length;
    }

    private char Peek(int offset) => _at + offset < _text.Length ? _text[_at + offset] : '\0';

    private void SkipDigits()
    {
        while (char.IsAsciiDigit(Peek(0)))
        {
            _at++;
        }
    }

    private void Fail(string message, int start, int length) => _fault ??= new ExpressionFault(message, start, length);
}
