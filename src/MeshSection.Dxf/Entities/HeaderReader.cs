using System.Text;
using MeshSection.Dxf.Tags;
using MeshSection.Units;

namespace MeshSection.Dxf.Entities;

/// <summary>Reads the few header variables that matter to an outline.</summary>
internal sealed class HeaderReader(TagReader tags)
{
    /// <summary>$ACADVER.</summary>
    public string? Release { get; private set; }

    /// <summary>True for the releases from R9 (AC1004) to R2018 (AC1032).</summary>
    public bool IsReleaseKnown => Release is "AC1004" or "AC1006" or "AC1009" or "AC1012" or "AC1014" or "AC1015"
        or "AC1018" or "AC1021" or "AC1024" or "AC1027" or "AC1032";

    /// <summary>$DWGCODEPAGE.</summary>
    public string? CodePage { get; private set; }

    /// <summary>The unit of $INSUNITS.</summary>
    public LengthUnit? Unit { get; private set; }

    /// <summary>True if $MEASUREMENT says metric, false if it says English, null if it is missing.</summary>
    public bool? IsMetric { get; private set; }

    /// <summary>The value of $INSUNITS if the format does not know it.</summary>
    public int? UnknownUnitCode { get; private set; }

    public void Read()
    {
        while (tags.Read() && tags.Code != 0)
        {
            if (tags.Is(9, "$ACADVER"u8) && Value(1))
            {
                Release = Encoding.Latin1.GetString(tags.Value);
            }
            else if (tags.Is(9, "$DWGCODEPAGE"u8) && Value(3))
            {
                CodePage = Encoding.Latin1.GetString(tags.Value);
            }
            else if (tags.Is(9, "$INSUNITS"u8) && Value(70))
            {
                ReadUnit();
            }

            else if (tags.Is(9, "$MEASUREMENT"u8) && Value(70))
            {
                IsMetric = tags.TryInteger(out var system) ? system switch { 0 => false, 1 => true, _ => null }
                    : throw ReadingFaults.Number(tags, "$MEASUREMENT");
            }

            if (!tags.HasTag || tags.Code == 0)
            {
                return;
            }
        }
    }

    private bool Value(int code) => tags.Read() && tags.Code == code;

    private void ReadUnit()
    {
        if (!tags.TryInteger(out var code))
        {
            throw ReadingFaults.Number(tags, "$INSUNITS");
        }

        Unit = LengthUnit.FromDrawingCode(code);
        UnknownUnitCode = Unit is null && code != 0 ? code : null;
    }
}
