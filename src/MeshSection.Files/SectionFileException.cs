namespace MeshSection.Files;

/// <summary>A section file is wrong. The message says where, what is wrong and what to do.</summary>
public sealed class SectionFileException : Exception
{
    /// <summary>Makes the exception.</summary>
    /// <param name="file">See <see cref="File"/>.</param>
    /// <param name="place">See <see cref="Place"/>.</param>
    /// <param name="path">See <see cref="Path"/>.</param>
    /// <param name="problem">See <see cref="Problem"/>.</param>
    /// <param name="remedy">See <see cref="Remedy"/>.</param>
    public SectionFileException(string file, TextPlace? place, string path, string problem, string remedy)
        : base($"{file}{(place is { } p ? $":{p}" : "")}: {(path.Length > 0 ? $"{path}: " : "")}{problem} {remedy}")
    {
        File = file;
        Place = place;
        Path = path;
        Problem = problem;
        Remedy = remedy;
    }

    /// <summary>The file, as its path was given.</summary>
    public string File { get; }

    /// <summary>Line and column; null if the file itself is the matter.</summary>
    public TextPlace? Place { get; }

    /// <summary>The value concerned, such as <c>shapes[0].height</c>; empty for the whole file.</summary>
    public string Path { get; }

    /// <summary>What was found and what was expected, a sentence.</summary>
    public string Problem { get; }

    /// <summary>What to do, a sentence.</summary>
    public string Remedy { get; }
}
