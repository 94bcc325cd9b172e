namespace MeshSection.Dxf.Selection;

/// <summary>What is known about the kinds of entities that are not read.</summary>
internal static class EntityKinds
{
    /// <summary>What to do about a kind that may bound a section; null for a kind that never does.</summary>
    public static string? Advice(string kind) => kind switch
    {
        "SPLINE" or "ELLIPSE" or "HELIX" or "MLINE" => "convert them to polylines with arcs",
        "HATCH" or "MPOLYGON" => "make sure that their boundaries are also drawn as lines, arcs or polylines",
        "INSERT" => "explode the blocks",
        "REGION" or "3DFACE" or "3DSOLID" or "BODY" or "SURFACE" or "MESH" or "POLYLINE (mesh)" =>
            "explode them to lines and arcs",
        "SOLID" or "TRACE" => "draw their edges as a closed polyline",
        "ACAD_PROXY_ENTITY" => "explode them in the program that made them",
        _ => null,
    };
}
