using System.Buffers.Binary;

namespace MeshSection.Plots;

/// <summary>Tells a reader of a PNG how large it is to be printed.</summary>
/// <remarks>Portable Network Graphics (PNG) Specification, 3rd edition: 11.3.4.3 pHYs, annex D (CRC).</remarks>
internal static class PngResolution
{
    // The signature and the header chunk, which comes first, always have this length.
    private const int EndOfHeader = 8 + 25;
    private const int DataLength = 9;

    /// <summary>The same picture with its resolution stated.</summary>
    /// <param name="png">A PNG that states none.</param>
    /// <param name="pixelsPerMetre">Both ways.</param>
    public static byte[] State(ReadOnlySpan<byte> png, uint pixelsPerMetre)
    {
        Span<byte> chunk = stackalloc byte[DataLength + 12];
        BinaryPrimitives.WriteUInt32BigEndian(chunk, DataLength);
        "pHYs"u8.CopyTo(chunk[4..]);
        BinaryPrimitives.WriteUInt32BigEndian(chunk[8..], pixelsPerMetre);
        BinaryPrimitives.WriteUInt32BigEndian(chunk[12..], pixelsPerMetre);
        chunk[16] = 1; // the unit is the metre
        BinaryPrimitives.WriteUInt32BigEndian(chunk[17..], Crc(chunk[4..17]));
        return [.. png[..EndOfHeader], .. chunk, .. png[EndOfHeader..]];
    }

    private static uint Crc(ReadOnlySpan<byte> bytes)
    {
        var crc = uint.MaxValue;
        foreach (var b in bytes)
        {
            crc ^= b;
            for (var bit = 0; bit < 8; bit++)
            {
                crc = (crc & 1) == 0 ? crc >> 1 : (crc >> 1) ^ 0xEDB88320;
            }
        }

        return ~crc;
    }
}
