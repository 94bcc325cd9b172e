namespace MeshSection.Testing;

/// <summary>
/// The root of the repository, found from where the tests run: the path of a source file would not do, since a
/// deterministic build maps it.
/// </summary>
internal static class RepositoryRoot
{
    public static string Path { get; } = Find();

    /// <summary>A file or folder of the repository.</summary>
    public static string PathOf(string relative) => System.IO.Path.Combine(Path, relative);

    private static string Find()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(System.IO.Path.Combine(folder.FullName, "MeshSection.sln")))
            {
                return folder.FullName;
            }
        }

        throw new DirectoryNotFoundException("The tests run outside of the repository.");
    }
}
