using System.Globalization;
using System.Text;

namespace MeshSection.Dxf.Tags;

/// <summary>Turns the bytes of names into text, by the code page that the drawing states.</summary>
internal sealed class TagText
{
    private static readonly UTF8Encoding StrictUtf8 = new(false, throwOnInvalidBytes: true);

    private readonly Encoding _codePage;
    private readonly bool _isUtf8;
    private readonly string? _assumedCodePage;
    private readonly Dictionary<string, string> _names = new(StringComparer.Ordinal);
    private byte[] _lastBytes = [];
    private string _lastName = "";

    /// <summary>UTF-8 from release AC1021 on, or if the file says so by its first bytes; else the stated code page.</summary>
    /// <param name="release">The release that the drawing states, if any.</param>
    /// <param name="codePage">The value of $DWGCODEPAGE, if any, such as "ANSI_932".</param>
    /// <param name="hasByteOrderMark">True if the file begins with the mark of UTF-8.</param>
    public TagText(string? release, string? codePage, bool hasByteOrderMark)
    {
        _isUtf8 = hasByteOrderMark || string.CompareOrdinal(release, "AC1021") >= 0;
        var stated = CodePage(codePage);
        _codePage = stated ?? Provider(1252)!;
        _assumedCodePage = stated is not null ? null
            : codePage is null ? "The drawing names no code page; names were read as windows-1252."
            : $"The drawing names the code page '{codePage}', which is not known; names were read as windows-1252.";
    }

    /// <summary>What had to be assumed to read the names so far; null if nothing had.</summary>
    public string? Assumption { get; private set; }

    /// <summary>The text of a value. The same text is the same string, so that a million entities share a layer name.</summary>
    public string Decode(ReadOnlySpan<byte> bytes)
    {
        if (bytes.SequenceEqual(_lastBytes))
        {
            return _lastName;
        }

        var text = Unescaped(Ascii.IsValid(bytes) ? Encoding.ASCII.GetString(bytes) : Foreign(bytes));
        _lastBytes = bytes.ToArray();
        _lastName = _names.TryGetValue(text, out var known) ? known : _names[text] = text;
        return _lastName;
    }

    private string Foreign(ReadOnlySpan<byte> bytes)
    {
        if (!_isUtf8)
        {
            Assumption ??= _assumedCodePage;
            return _codePage.GetString(bytes);
        }

        try
        {
            return StrictUtf8.GetString(bytes);
        }
        catch (DecoderFallbackException)
        {
            Assumption = $"Some names are not in UTF-8, as this release demands; they were read as {_codePage.WebName}.";
            return _codePage.GetString(bytes);
        }
    }

    private static Encoding? CodePage(string? name) => name?.ToUpperInvariant() switch
    {
        null => null,
        "BIG5" => Provider(950),
        "GB2312" => Provider(936),
        "KSC5601" => Provider(949),
        "JOHAB" => Provider(1361),
        "ASCII" => Provider(1252),
        "UTF8" or "UTF-8" => Encoding.UTF8,
        var other => Provider(TrailingNumber(other)),
    };

    private static Encoding? Provider(int codePage) => CodePagesEncodingProvider.Instance.GetEncoding(codePage);

    private static int TrailingNumber(string name)
    {
        var digits = name.AsSpan(name.AsSpan().LastIndexOfAnyExceptInRange('0', '9') + 1);
        return int.TryParse(digits, NumberStyles.None, CultureInfo.InvariantCulture, out var number) ? number : 0;
    }

    /// <summary>Replaces \U+ and four hexadecimal digits by the character that they stand for.</summary>
    private static string Unescaped(string text)
    {
        var at = text.IndexOf("\\U+", StringComparison.OrdinalIgnoreCase);
        if (at < 0)
        {
            return text;
        }

        var plain = new StringBuilder(text.Length);
        var done = 0;
        for (; at >= 0; at = text.IndexOf("\\U+", done, StringComparison.OrdinalIgnoreCase))
        {
            plain.Append(text, done, at - done);
            if (at + 7 <= text.Length && ushort.TryParse(
                text.AsSpan(at + 3, 4), NumberStyles.AllowHexSpecifier, CultureInfo.InvariantCulture, out var code))
            {
                plain.Append((char)code);
                done = at + 7;
            }
            else
            {
                plain.Append(text, at, 3);
                done = at + 3;
            }
        }

        return plain.Append(text, done, text.Length - done).ToString();
    }
}
