namespace MeshSection.Cli;

/// <summary>What the command's exit status says.</summary>
internal static class ExitStatus
{
    /// <summary>Done.</summary>
    public const int Done = 0;

    /// <summary>Done, but the two integrators do not agree: the result is not to be used.</summary>
    public const int CheckFailed = 1;

    /// <summary>The input or the command line is wrong.</summary>
    public const int WrongInput = 2;
}
