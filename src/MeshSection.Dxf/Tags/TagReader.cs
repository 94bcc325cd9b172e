namespace MeshSection.Dxf.Tags;

/// <summary>
/// A DXF as a stream of tags: a group code and a value. The current tag stays until the next one is read; its value is a
/// view into a buffer.
/// </summary>
internal abstract class TagReader
{
    /// <summary>A reader of the form that the first bytes tell.</summary>
    public static TagReader Of(Stream stream)
    {
        var head = new byte[BinaryTags.Sentinel.Length];
        var length = stream.ReadAtLeast(head, head.Length, throwOnEndOfStream: false);
        FileKind.Check(head.AsSpan(0, length));
        return head.AsSpan(0, length).SequenceEqual(BinaryTags.Sentinel)
            ? new BinaryTags(stream)
            : new AsciiTags(head.AsSpan(0, length), stream);
    }

    /// <summary>True if the file begins with the mark of UTF-8.</summary>
    public virtual bool HasByteOrderMark => false;

    /// <summary>False before the first tag and at the end of the file.</summary>
    public bool HasTag { get; private set; }

    /// <summary>The group code of the current tag.</summary>
    public int Code { get; protected set; }

    /// <summary>Where the current value stands.</summary>
    public abstract FilePlace Place { get; }

    /// <summary>Where the current group code stands.</summary>
    public abstract FilePlace CodePlace { get; }

    /// <summary>The current value as text; in a text file without the blanks around it.</summary>
    public abstract ReadOnlySpan<byte> Value { get; }

    /// <summary>The last value of the file if it has no line break, so that it may be cut off; else null.</summary>
    public virtual string? UnterminatedValue => null;

    /// <summary>Moves to the next tag; comments are passed over.</summary>
    /// <returns>False at the end of the file.</returns>
    public bool Read()
    {
        do
        {
            HasTag = ReadTag();
        }
        while (HasTag && Code == 999);

        return HasTag;
    }

    public bool Is(int code, ReadOnlySpan<byte> value) => HasTag && Code == code && Value.SequenceEqual(value);

    /// <summary>The current value as a finite number.</summary>
    public abstract bool TryNumber(out double number);

    /// <summary>The current value as a whole number.</summary>
    public abstract bool TryInteger(out int number);

    /// <summary>True if anything but blanks follows the current tag.</summary>
    public abstract bool HasMoreText();

    /// <summary>Reads a tag, comments too.</summary>
    protected abstract bool ReadTag();
}
