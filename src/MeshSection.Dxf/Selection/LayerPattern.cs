namespace MeshSection.Dxf.Selection;

/// <summary>A layer name in which * stands for any characters and ? for one, in any case.</summary>
internal sealed class LayerPattern(string text)
{
    /// <summary>True if it names one layer in full.</summary>
    public bool IsFullName { get; } = !text.AsSpan().ContainsAny('*', '?');

    public bool Matches(string name)
    {
        // On a mismatch the last star takes one character more; earlier stars need never be tried again.
        var (at, star, taken) = (0, -1, 0);
        var i = 0;
        while (i < name.Length)
        {
            if (at < text.Length && text[at] == '*')
            {
                star = at++;
                taken = i;
            }
            else if (at < text.Length && (text[at] == '?' || Same(text[at], name[i])))
            {
                at++;
                i++;
            }
            else if (star >= 0)
            {
                at = star + 1;
                i = ++taken;
            }
            else
            {
                return false;
            }
        }

        return text.AsSpan(at).IndexOfAnyExcept('*') < 0;
    }

    private static bool Same(char a, char b) => char.ToUpperInvariant(a) == char.ToUpperInvariant(b);
}
