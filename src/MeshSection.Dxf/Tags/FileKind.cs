namespace MeshSection.Dxf.Tags;

/// <summary>Tells the files that people mistake for DXF by their first bytes.</summary>
internal static class FileKind
{
    public static void Check(ReadOnlySpan<byte> head)
    {
        if (head.Length >= 6 && head.StartsWith("AC10"u8) && IsDigit(head[4]) && IsDigit(head[5]))
        {
            throw ReadingFaults.Dwg();
        }

        if (head.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) || head.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]))
        {
            throw ReadingFaults.Utf16();
        }
    }

    private static bool IsDigit(byte b) => b is >= (byte)'0' and <= (byte)'9';
}
