namespace MeshSection.Dxf.Selection;

/// <summary>What is known about the kinds of entities that are not read.</summary>
internal static class EntityKinds
{
    /// <summary>What to do about a kind that may bound a section; null for a kind that never does.</summary>
    public static string? Advice(string kind) => kind switch
    {
        "HELIX" => "convert them to polylines with arcs",
        "MLINE" => "explode them to lines",
        "MPOLYGON" => "draw their boundaries as closed polylines",
        "REGION" or "3DSOLID" or "BODY" or "SURFACE" or "EXTRUDEDSURFACE" or "LOFTEDSURFACE" or
            "REVOLVEDSURFACE" or "SWEPTSURFACE" or "PLANESURFACE" or "NURBSURFACE" or "MESH" or "POLYLINE (mesh)" =>
            "explode them to lines and arcs",
        "ACAD_PROXY_ENTITY" or "ACAD_PROXY_OBJECT" => "explode them in the program that made them",
        _ => null,
    };
}
