using System.Numerics;

namespace MeshSection.Meshing;

/// <summary>
/// Triangles that wait for refinement, in classes of urgency. Within one, first in is first out, which needs the fewest
/// new vertices; only in the lowest, last in is first out, which keeps the work local where the order matters little.
/// The links lie in the triangulation. A triangle that changes while it waits keeps its place.
/// </summary>
internal sealed class TriangleQueue
{
    /// <summary>The most urgent class.</summary>
    public const int Top = 127;

    private const int End = -1;

    private readonly Triangulation mesh;
    private readonly int[] heads = new int[Top + 1];
    private readonly int[] tails = new int[Top + 1];
    private ulong low;
    private ulong high;

    public TriangleQueue(Triangulation mesh)
    {
        this.mesh = mesh;
        Array.Fill(heads, End);
    }

    /// <summary>Lets triangle t wait, unless it does already.</summary>
    public void Push(int t, int urgency)
    {
        int link = 4 * t + 3;
        if (mesh.Twins[link] != Triangulation.NotQueued) return;
        if (heads[urgency] == End || urgency == 0)
        {
            mesh.Twins[link] = heads[urgency];
            heads[urgency] = t;
        }
        else
        {
            mesh.Twins[link] = End;
            mesh.Twins[4 * tails[urgency] + 3] = t;
        }
        tails[urgency] = t;
        if (urgency < 64) low |= 1UL << urgency;
        else high |= 1UL << (urgency - 64);
    }

    /// <summary>Takes the next triangle out; -1 if none waits.</summary>
    public int Pop(out int urgency)
    {
        urgency = high != 0 ? 127 - BitOperations.LeadingZeroCount(high) : 63 - BitOperations.LeadingZeroCount(low);
        if (urgency < 0) return -1;
        int t = heads[urgency];
        int link = 4 * t + 3;
        heads[urgency] = mesh.Twins[link];
        mesh.Twins[link] = Triangulation.NotQueued;
        if (heads[urgency] == End)
        {
            if (urgency < 64) low &= ~(1UL << urgency);
            else high &= ~(1UL << (urgency - 64));
        }
        return t;
    }
}
