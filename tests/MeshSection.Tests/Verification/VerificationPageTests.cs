namespace MeshSection.Tests.Verification;

public class VerificationPageTests
{
    [Fact]
    public void The_page_says_what_the_checks_compute()
    {
        var path = RepositoryRoot.PathOf("docs/verification.md");
        var text = VerificationPage.Text();
        if (Environment.GetEnvironmentVariable("MESHSECTION_WRITE") == "1")
        {
            File.WriteAllText(path, text);
        }

        Assert.Equal(text, File.ReadAllText(path).ReplaceLineEndings("\n"));
    }
}
