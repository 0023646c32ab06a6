using System.Globalization;
using System.Text;

namespace SpecLint.Spec.Yaml;

/// <summary>Turns bytes into text, strictly: UTF-8 only, and no characters that an editor cannot show.</summary>
internal static class TextDecoder
{
    private static readonly UTF8Encoding Strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    internal static string? Decode(ReadOnlySpan<byte> bytes, YamlLimits limits, out YamlFault? fault)
    {
        fault = null;
        if (bytes.Length > limits.Bytes)
        {
            fault = new YamlFault(
                string.Create(CultureInfo.InvariantCulture, $"the text is {bytes.Length / 1024.0 / 1024.0:0.0} MiB long; at most {limits.Bytes / 1024.0 / 1024.0:0.#} MiB are read"),
                Region.Beginning);
            return null;
        }

        if (bytes.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) || bytes.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]))
        {
            fault = new YamlFault("the text is encoded as UTF-16; UTF-8 is expected", Region.Beginning);
            return null;
        }

        if (bytes.StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF]))
        {
            bytes = bytes[3..];
        }

        string text;
        try
        {
            text = Strict.GetString(bytes);
        }
        catch (DecoderFallbackException)
        {
            int good = ValidLength(bytes);
            fault = new YamlFault(
                bytes[..good].Contains((byte)0) ? "this is a binary file; a text in UTF-8 is expected" : string.Create(CultureInfo.InvariantCulture, $"the byte 0x{bytes[good]:X2} is not UTF-8; a text in UTF-8 is expected"),
                PlaceAt(Strict.GetString(bytes[..good]), -1));
            return null;
        }

        fault = Unreadable(text);
        return fault is null ? text : null;
    }

    internal static YamlFault? Unreadable(string text)
    {
        for (int i = 0; i < text.Length; i++)
        {
            char c = text[i];
            if (c is '\t' or '\n' or '\r' || (c >= ' ' && c is not ('\u007f' or '\u0085' or '\u2028' or '\u2029' or '\ufffe' or '\uffff' or '\ufeff') && c is < '\u0080' or > '\u009f'))
            {
                continue;
            }

            string message = c switch
            {
                '\0' => "this is a binary file; a text in UTF-8 is expected",
                '\u0085' or '\u2028' or '\u2029' => string.Create(CultureInfo.InvariantCulture, $"the line separator U+{(int)c:X4} stands here; end lines with a plain line feed"),
                _ => string.Create(CultureInfo.InvariantCulture, $"the control character U+{(int)c:X4} stands here; only printable text is expected"),
            };
            return new YamlFault(message, PlaceAt(text, i));
        }

        return null;
    }

    /// <summary>Line and column of a character; -1 means the end of the text.</summary>
    internal static Region PlaceAt(string text, int index)
    {
        int end = index < 0 ? text.Length : index;
        int line = 1;
        int start = 0;
        for (int i = 0; i < end; i++)
        {
            if (text[i] == '\n' || (text[i] == '\r' && (i + 1 >= text.Length || text[i + 1] != '\n')))
            {
                line++;
                start = i + 1;
            }
        }

        return new Region(line, end - start + 1, line, end - start + 2);
    }

    private static int ValidLength(ReadOnlySpan<byte> bytes)
    {
        int done = 0;
        while (done < bytes.Length && Rune.DecodeFromUtf8(bytes[done..], out _, out int used) == System.Buffers.OperationStatus.Done)
        {
            done += used;
        }

        return done;
    }
}
