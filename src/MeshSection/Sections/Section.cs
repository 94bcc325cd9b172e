using MeshSection.Geometry;
using MeshSection.Materials;

namespace MeshSection.Sections;

/// <summary>A cross-section: an outline filled with one material.</summary>
/// <param name="Outline">Its boundaries.</param>
/// <param name="Material">What fills it; null if nothing but its shape is known.</param>
/// <param name="Title">What it is called on tables and pictures; may be empty.</param>
public sealed record Section(Outline Outline, Material? Material = null, string Title = "");
