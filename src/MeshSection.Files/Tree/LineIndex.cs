namespace MeshSection.Files.Tree;

/// <summary>Turns byte offsets of a UTF-8 text into lines and columns.</summary>
internal readonly ref struct LineIndex
{
    private readonly ReadOnlySpan<byte> _text;
    private readonly List<int> _starts;

    public LineIndex(ReadOnlySpan<byte> text)
    {
        _text = text;
        _starts = [0];
        for (var i = 0; i < text.Length; i++)
        {
            if (text[i] == (byte)'\n')
            {
                _starts.Add(i + 1);
            }
        }
    }

    public TextPlace PlaceOf(long offset)
    {
        var found = _starts.BinarySearch((int)offset);
        return Within(found >= 0 ? found : ~found - 1, (int)offset);
    }

    public TextPlace PlaceOf(long line, long byteInLine) =>
        Within((int)line, (int)Math.Min(_starts[(int)line] + byteInLine, _text.Length));

    private TextPlace Within(int line, int offset)
    {
        // A byte that continues a character, 10xxxxxx, is no column of its own.
        var column = 1;
        foreach (var unit in _text[_starts[line]..offset])
        {
            column += (unit & 0xC0) == 0x80 ? 0 : 1;
        }

        return new TextPlace(line + 1, column);
    }
}
