using System.Globalization;
using System.Text;

namespace MeshSection.Dxf.Overlay;

/// <summary>Writes the tags of an ASCII DXF, and gives each object its handle.</summary>
/// <param name="stream">Where to; left open.</param>
internal sealed class TagWriter(Stream stream) : IDisposable
{
    private readonly StreamWriter _text = new(stream, new UTF8Encoding(false), leaveOpen: true) { NewLine = "\n" };
    private int _handles = 1;

    /// <summary>A handle that no object has yet.</summary>
    public string NewHandle() => (_handles++).ToString("X", CultureInfo.InvariantCulture);

    public TagWriter Tag(int code, string value)
    {
        _text.WriteLine(code.ToString(CultureInfo.InvariantCulture));
        _text.WriteLine(value);
        return this;
    }

    public TagWriter Tag(int code, int value) => Tag(code, value.ToString(CultureInfo.InvariantCulture));

    /// <summary>A number in so many digits that it is read back in the same bits.</summary>
    public TagWriter Tag(int code, double value) => Tag(code, value.ToString("R", CultureInfo.InvariantCulture) is var digits &&
        digits.AsSpan().ContainsAny('.', 'E') ? digits : digits + ".0");

    /// <summary>A place in the plane, under a code and the two that belong to it.</summary>
    public TagWriter Place(int code, double x, double y) => Tag(code, x).Tag(code + 10, y).Tag(code + 20, 0.0);

    /// <summary>Text, with what ASCII lacks as \U+ and four digits, and without line breaks.</summary>
    public TagWriter Words(int code, string words)
    {
        var ascii = new StringBuilder(words.Length);
        foreach (var letter in words)
        {
            ascii.Append(letter < ' ' ? " " : letter < 127 ? letter.ToString() : $"\\U+{(int)letter:X4}");
        }

        return Tag(code, ascii.ToString());
    }

    public void Dispose() => _text.Dispose();
}
