using Spectre.Console;

namespace MeshSection.Cli;

/// <summary>Where the command writes: results to one stream, everything else to the other.</summary>
/// <param name="Output">Results.</param>
/// <param name="Error">Errors and cautions.</param>
/// <param name="Width">Columns for tables.</param>
/// <param name="IsInteractive">True if results go to a screen, which may show colours.</param>
internal sealed record Terminal(TextWriter Output, TextWriter Error, int Width, bool IsInteractive)
{
    // What a file or another program gets, and the narrowest in which a table is still readable.
    private const int DefaultWidth = 80;
    private const int LeastWidth = 40;

    /// <summary>The streams of this process.</summary>
    public static Terminal OfProcess()
    {
        if (OperatingSystem.IsWindows())
        {
            Console.OutputEncoding = System.Text.Encoding.UTF8;
        }

        var output = new StreamWriter(Console.OpenStandardOutput()) { AutoFlush = false };
        var error = new StreamWriter(Console.OpenStandardError()) { AutoFlush = true };
        var isInteractive = !Console.IsOutputRedirected;
        return new Terminal(output, error, isInteractive ? ScreenWidth() : DefaultWidth, isInteractive);
    }

    /// <summary>A console that draws tables on <see cref="Output"/>.</summary>
    public IAnsiConsole Tables() => AnsiConsole.Create(new AnsiConsoleSettings
    {
        Ansi = IsInteractive ? AnsiSupport.Detect : AnsiSupport.No,
        ColorSystem = IsInteractive ? ColorSystemSupport.Detect : ColorSystemSupport.NoColors,
        Interactive = InteractionSupport.No,
        Out = new FixedWidthOutput(Output, Width, IsInteractive),
    });

    /// <summary>Writes a JSON document on <see cref="Output"/>.</summary>
    /// <param name="write">Writes it, in UTF-8.</param>
    public void WriteJson(Action<Stream> write)
    {
        using var document = new MemoryStream();
        write(document);
        Output.Write(System.Text.Encoding.UTF8.GetString(document.GetBuffer(), 0, (int)document.Length));
    }

    private static int ScreenWidth()
    {
        try
        {
            return Math.Max(LeastWidth, Console.WindowWidth);
        }
        catch (IOException)
        {
            return DefaultWidth;
        }
    }

    private sealed class FixedWidthOutput(TextWriter writer, int width, bool isTerminal) : IAnsiConsoleOutput
    {
        public TextWriter Writer => writer;

        public bool IsTerminal => isTerminal;

        public int Width => width;

        public int Height => 1000;

        public void SetEncoding(System.Text.Encoding encoding)
        {
        }
    }
}
