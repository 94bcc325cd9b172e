using System.Collections.Immutable;
using MeshSection.Dxf.Space;

namespace MeshSection.Dxf.Entities;

/// <summary>Entities under a name, to be put into the drawing any number of times.</summary>
/// <param name="Name">The name.</param>
/// <param name="Base">The point that goes where the block is put.</param>
/// <param name="Entities">What it holds, in the order of the file.</param>
/// <param name="IsExternal">True if the entities lie in another file.</param>
public sealed record Block(string Name, SpacePoint Base, ImmutableArray<Entity> Entities, bool IsExternal);
