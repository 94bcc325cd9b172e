namespace MeshSection.Cli;

/// <summary>The input or the command line is wrong; the message is shown as it is.</summary>
/// <param name="message">What is wrong, where, and what to do.</param>
internal sealed class CommandException(string message) : Exception(message);
