using System.Collections.Immutable;
using System.CommandLine;

namespace MeshSection.Cli.Options;

/// <summary>Where results go.</summary>
internal sealed class OutputOptions
{
    private const string Picture = ".png";

    private readonly string[] _extensions;
    private readonly Option<bool> _json = new("--json")
    {
        Description = "Write the result as JSON, and nothing else, on standard output",
        Arity = ArgumentArity.Zero,
    };

    private readonly Option<string[]> _out = new("--out") { HelpName = "FILE" };

    private readonly Option<bool> _quiet = new("--quiet")
    {
        Description = "Write no table, and no cautions",
        Arity = ArgumentArity.Zero,
    };

    /// <param name="what">What files other than pictures hold, such as "the mesh"; null if there are none.</param>
    /// <param name="extensions">The extensions of such files.</param>
    public OutputOptions(string? what = null, params string[] extensions)
    {
        _extensions = [Picture, .. extensions];
        _out.Description = what is null
            ? "Write a picture (.png)"
            : $"Write a picture (.png) or {what} ({string.Join(", ", extensions)}). May be repeated";
    }

    /// <summary>Adds the options to a command.</summary>
    public void AddTo(Command command)
    {
        command.Add(_json);
        command.Add(_out);
        command.Add(_quiet);
    }

    /// <summary>What the command line asks for.</summary>
    /// <exception cref="CommandException">A file's name has another extension, or its folder does not exist.</exception>
    public OutputRequest Of(ParseResult parsed)
    {
        string[] files = parsed.GetValue(_out) ?? [];
        foreach (var file in files)
        {
            Check(file);
        }

        return new OutputRequest(
            parsed.GetValue(_json),
            [.. files.Where(f => Has(f, Picture))],
            [.. files.Where(f => !Has(f, Picture))],
            parsed.GetValue(_quiet));
    }

    private static bool Has(string file, string extension) =>
        Path.GetExtension(file).Equals(extension, StringComparison.OrdinalIgnoreCase);

    private void Check(string file)
    {
        if (!_extensions.Any(e => Has(file, e)))
        {
            throw new CommandException(_extensions.Length == 1
                ? $"--out {file}: pictures are written as PNG; give a name that ends in .png."
                : $"--out {file}: give a name that ends in {string.Join(", ", _extensions[..^1])} or {_extensions[^1]}.");
        }

        if (Path.GetDirectoryName(Path.GetFullPath(file)) is { } folder && !Directory.Exists(folder))
        {
            throw new CommandException($"--out {file}: there is no folder {folder}.");
        }
    }
}

/// <summary>Where results are to go.</summary>
/// <param name="IsJson">As JSON on standard output instead of a table.</param>
/// <param name="Pictures">Paths of the pictures to write.</param>
/// <param name="DataFiles">Paths of the other files to write.</param>
/// <param name="IsQuiet">No table and no cautions.</param>
internal sealed record OutputRequest(
    bool IsJson, ImmutableArray<string> Pictures, ImmutableArray<string> DataFiles, bool IsQuiet);
