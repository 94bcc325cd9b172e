using System.CommandLine;

namespace MeshSection.Cli.Options;

/// <summary>Where results go.</summary>
internal sealed class OutputOptions
{
    private readonly Option<bool> _json = new("--json")
    {
        Description = "Write the result as JSON, and nothing else, on standard output",
        Arity = ArgumentArity.Zero,
    };

    private readonly Option<string?> _out = new("--out")
    {
        Description = "Write a picture (.png)",
        HelpName = "FILE",
    };

    private readonly Option<bool> _quiet = new("--quiet")
    {
        Description = "Write no table, and no cautions",
        Arity = ArgumentArity.Zero,
    };

    /// <summary>Adds the options to a command.</summary>
    public void AddTo(Command command)
    {
        command.Add(_json);
        command.Add(_out);
        command.Add(_quiet);
    }

    /// <summary>What the command line asks for.</summary>
    /// <exception cref="CommandException">The picture's name does not end in .png, or its folder does not exist.</exception>
    public OutputRequest Of(ParseResult parsed)
    {
        var picture = parsed.GetValue(_out);
        if (picture is not null)
        {
            if (!Path.GetExtension(picture).Equals(".png", StringComparison.OrdinalIgnoreCase))
            {
                throw new CommandException($"--out {picture}: pictures are written as PNG; give a name that ends in .png.");
            }

            if (Path.GetDirectoryName(Path.GetFullPath(picture)) is { } folder && !Directory.Exists(folder))
            {
                throw new CommandException($"--out {picture}: there is no folder {folder}.");
            }
        }

        return new OutputRequest(parsed.GetValue(_json), picture, parsed.GetValue(_quiet));
    }
}

/// <summary>Where results are to go.</summary>
/// <param name="IsJson">As JSON on standard output instead of a table.</param>
/// <param name="Picture">Path of the picture to write, if any.</param>
/// <param name="IsQuiet">No table and no cautions.</param>
internal sealed record OutputRequest(bool IsJson, string? Picture, bool IsQuiet);
