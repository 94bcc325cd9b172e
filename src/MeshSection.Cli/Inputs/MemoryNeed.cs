namespace MeshSection.Cli.Inputs;

/// <summary>What a command takes of memory, as far as it grows with the mesh.</summary>
/// <param name="BytesPerTriangle">At the peak, bytes.</param>
internal sealed record MemoryNeed(double BytesPerTriangle)
{
    private const double Gigabyte = 1024 * 1024 * 1024;

    /// <summary>Makes sure that this machine has enough.</summary>
    /// <param name="triangles">How many triangles are expected.</param>
    /// <param name="option">What asks for them, for the message.</param>
    /// <param name="advice">What to do, for the message.</param>
    /// <exception cref="CommandException">It has not.</exception>
    public void Check(double triangles, string option, string advice)
    {
        var available = GC.GetGCMemoryInfo().TotalAvailableMemoryBytes;
        if (triangles * BytesPerTriangle > available)
        {
            throw new CommandException(FormattableString.Invariant(
                $"{option}: about {triangles:G3} triangles would take {triangles * BytesPerTriangle / Gigabyte:F1} GB of memory, and this process may use {available / Gigabyte:F1} GB. {advice}"));
        }
    }
}
