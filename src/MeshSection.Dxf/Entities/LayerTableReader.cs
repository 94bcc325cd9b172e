using MeshSection.Dxf.Tags;

namespace MeshSection.Dxf.Entities;

/// <summary>Reads the layers of the tables section; other tables are passed over.</summary>
internal sealed class LayerTableReader(TagReader tags, TagText text)
{
    public void Read(List<Layer> layers)
    {
        tags.Read();
        while (tags.HasTag)
        {
            if (tags.Is(0, "LAYER"u8))
            {
                layers.Add(ReadLayer());
            }
            else if (tags.Is(0, "ENDSEC"u8) || tags.Is(0, "SECTION"u8) || tags.Is(0, "EOF"u8))
            {
                return;
            }
            else
            {
                tags.Read();
            }
        }
    }

    private Layer ReadLayer()
    {
        var name = "";
        var isOff = false;
        var isFrozen = false;
        var isPlotted = true;
        var colour = DrawingColour.Plain;
        while (tags.Read() && tags.Code != 0)
        {
            switch (tags.Code)
            {
                case 2:
                    name = text.Decode(tags.Value);
                    break;
                case 62:
                    var index = Integer(name);
                    isOff = index < 0;
                    colour = colour with { Index = index < 0 && index != int.MinValue ? -index : index };
                    break;
                case 70:
                    isFrozen = (Integer(name) & 1) != 0;
                    break;
                case 420:
                    colour = colour with { Rgb = Integer(name) & 0xFFFFFF };
                    break;
                case 290:
                    isPlotted = Integer(name) != 0;
                    break;
            }
        }

        // The layer of the points that dimensions hang on never plots, whatever the table says.
        return new Layer(name, isOff, isFrozen, isPlotted && !name.Equals("DEFPOINTS", StringComparison.OrdinalIgnoreCase), colour);
    }

    private int Integer(string layer) => tags.TryInteger(out var number)
        ? number
        : throw ReadingFaults.Number(tags, $"the layer '{layer}'");
}
