namespace MeshSection.Tests.Verification;

public class VerificationPageTests
{
    [Fact]
    public void The_page_says_what_the_checks_compute()
    {
        var path = Path.Combine(RepositoryRoot(), "docs", "verification.md");
        var text = VerificationPage.Text();
        if (Environment.GetEnvironmentVariable("MESHSECTION_WRITE") == "1")
        {
            File.WriteAllText(path, text);
        }

        Assert.Equal(text, File.ReadAllText(path).ReplaceLineEndings("\n"));
    }

    private static string RepositoryRoot()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "MeshSection.sln")))
            {
                return folder.FullName;
            }
        }

        throw new DirectoryNotFoundException("The tests run outside of the repository.");
    }
}
