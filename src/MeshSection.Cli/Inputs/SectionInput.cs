using MeshSection.Dxf;
using MeshSection.Files;
using MeshSection.Materials;
using MeshSection.Sections;
using MeshSection.Units;

namespace MeshSection.Cli.Inputs;

/// <summary>A section as read from a drawing or a section file.</summary>
/// <param name="Section">The section.</param>
/// <param name="Unit">The unit in which results are shown.</param>
/// <param name="Drawing">How the drawing was understood; null if there was none.</param>
internal sealed record SectionInput(Section Section, LengthUnit Unit, DrawingOutline? Drawing)
{
    /// <summary>Reads what the command line names.</summary>
    /// <exception cref="CommandException">Something in it is wrong.</exception>
    public static SectionInput Read(InputRequest request)
    {
        using (InputFiles.Open(request.Path))
        {
            // Whatever the extension, that there is no such file comes first.
        }

        try
        {
            var extension = Path.GetExtension(request.Path);
            return extension.ToLowerInvariant() switch
            {
                InputFiles.Drawing => OfDrawing(request),
                InputFiles.SectionFile => OfSectionFile(request),
                _ => throw new CommandException(
                    $"{request.Path}: expected a drawing (.dxf) or a section file (.json), not '{extension}'."),
            };
        }
        catch (SectionFileException fault)
        {
            throw new CommandException(fault.Message);
        }
    }

    private static SectionInput OfDrawing(InputRequest request)
    {
        var drawing = Outline(request.Path, request.Drawing);
        var material = request.Density is { } density ? new Material("material", density) : null;
        var title = Path.GetFileNameWithoutExtension(request.Path);
        return new SectionInput(new Section(drawing.Outline, material, title), drawing.Report.Unit, drawing);
    }

    private static SectionInput OfSectionFile(InputRequest request)
    {
        var file = SectionFileReader.Read(request.Path);
        RefuseDrawingOptions(request, file);
        var material = request.Density is { } density ? new Material("material", density) : file.Material;
        if (file.Drawing is not { } reference)
        {
            return new SectionInput(
                new Section(file.Outline!, material, file.Title), file.Unit ?? LengthUnit.Millimetre, null);
        }

        var tolerance = reference.Tolerance is { } gap ? new GivenLength(gap, LengthUnit.Millimetre) : (GivenLength?)null;
        var drawing = Outline(reference.Path, new DrawingRequest
        {
            Unit = reference.Unit,
            Layers = reference.Layers,
            Tolerance = tolerance,
        });
        return new SectionInput(new Section(drawing.Outline, material, file.Title), file.Unit ?? drawing.Report.Unit, drawing);
    }

    private static void RefuseDrawingOptions(InputRequest request, SectionFile file)
    {
        if (request.Drawing.FirstOption is { } given)
        {
            throw new CommandException(
                $"{given} is for drawings, and {request.Path} is a section file: say it there, under \"{(file.Drawing is null ? "units" : "outline")}\".");
        }
    }

    private static DrawingOutline Outline(string path, DrawingRequest request)
    {
        using var stream = InputFiles.Open(path);
        try
        {
            var drawing = new DxfReader().Read(stream);
            return DrawingOutliner.Outline(drawing, request.Options(drawing.Unit));
        }
        catch (DrawingException fault)
        {
            throw new CommandException($"{path}: {fault.Message}");
        }
    }
}
