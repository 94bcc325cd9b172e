using System.Diagnostics;

namespace MeshSection.Testing;

/// <summary>Runs Python with a library of Debian's that we did not write, to read what we wrote.</summary>
internal static class OutsidePython
{
    private const string Interpreter = "/usr/bin/python3";

    /// <summary>Skips the test if there is no Python with the library here.</summary>
    /// <param name="library">Its name; the Debian package is python3- and this.</param>
    public static void SkipWithout(string library) => Assert.SkipUnless(
        File.Exists(Interpreter) && Start($"import {library}").ExitCode == 0,
        $"needs {Interpreter} with {library} (Debian package python3-{library})");

    /// <summary>What a program writes.</summary>
    /// <param name="code">The program.</param>
    /// <param name="arguments">Its arguments.</param>
    public static string Run(string code, params string[] arguments)
    {
        var (exit, output) = Start(code, arguments);
        Assert.Equal(0, exit);
        return output;
    }

    private static (int ExitCode, string Output) Start(string code, params string[] arguments)
    {
        using var process = Process.Start(new ProcessStartInfo(Interpreter, ["-c", code, .. arguments])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        })!;
        process.ErrorDataReceived += (_, _) => { };
        process.BeginErrorReadLine();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return (process.ExitCode, output.TrimEnd());
    }
}
