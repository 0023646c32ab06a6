using SpecLint.Reporting.Sheets;

namespace SpecLint.Cli;

/// <summary>What the terminal can show.</summary>
internal static class Terminal
{
    private const int DefaultWidth = 80;
    private const int LeastWidth = 60;
    private const int MostWidth = 100;

    /// <summary>Layout of text output: the terminal's width within reason; colour only on a terminal that has not refused it.</summary>
    /// <param name="includesAll">Also the rules that are met, open, not applicable.</param>
    public static SheetOptions SheetOptions(bool includesAll)
    {
        bool terminal = !Console.IsOutputRedirected;
        bool refused = !string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR"))
            || Environment.GetEnvironmentVariable("TERM") == "dumb";
        return new SheetOptions
        {
            Width = terminal ? Math.Clamp(Width(), LeastWidth, MostWidth) : DefaultWidth,
            UsesColour = terminal && !refused,
            IncludesAll = includesAll,
        };
    }

    private static int Width()
    {
        try
        {
            return Console.WindowWidth is > 0 and int width ? width : DefaultWidth;
        }
        catch (IOException)
        {
            return DefaultWidth;
        }
    }
}
