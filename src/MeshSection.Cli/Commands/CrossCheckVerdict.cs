using MeshSection.Cli.Tables;
using MeshSection.Properties;

namespace MeshSection.Cli.Commands;

/// <summary>Judges whether the two integrators agree.</summary>
internal static class CrossCheckVerdict
{
    // They agree to 1e-12 on sound sections; a wall of a millionth of the section costs six digits more.
    private const double Limit = 1e-8;

    /// <summary>The exit status; a disagreement is told on standard error.</summary>
    public static int Status(Terminal terminal, SectionProperties properties)
    {
        var worst = properties.CrossChecks.MaxBy(c => c.Difference);
        if (worst.Difference <= Limit)
        {
            return ExitStatus.Done;
        }

        terminal.Error.WriteLine(FormattableString.Invariant(
            $"meshsection: the two methods disagree: {CheckedWords.Of(worst.Quantity)} differs by {worst.Difference:0e-0}. Do not use these results; the section is thinner than its coordinates can tell, or this is a fault of the program."));
        return ExitStatus.CheckFailed;
    }
}
