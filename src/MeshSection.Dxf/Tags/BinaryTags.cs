using System.Buffers.Binary;
using System.Globalization;
using System.Text;

namespace MeshSection.Dxf.Tags;

/// <summary>
/// Reads a binary DXF: after a sentinel, group codes of one byte (R12 and before) or two, and values whose kind follows
/// from the code.
/// </summary>
internal sealed class BinaryTags : TagReader
{
    private const int LongestText = 1 << 20;

    // In the older form this byte announces a code of two bytes.
    private const int Escape = 255;

    private readonly Stream _stream;
    private readonly byte[] _buffer = new byte[1 << 16];
    private readonly bool _hasShortCodes;
    private int _next;
    private int _end;
    private long _read;
    private byte[] _text = new byte[256];
    private int _textLength;
    private double _number;
    private bool _isNumber;
    private long _codeAt;
    private long _valueAt;

    public BinaryTags(Stream stream)
    {
        _stream = stream;
        _read = Sentinel.Length;
        // The file begins with the code 0 and a name: of two zero bytes only the newer form has both.
        Fill();
        _hasShortCodes = _end >= 2 && _buffer[1] != 0;
    }

    /// <summary>The first 22 bytes of every binary DXF.</summary>
    public static ReadOnlySpan<byte> Sentinel => "AutoCAD Binary DXF\r\n\u001a\0"u8;

    public override FilePlace Place => new(_valueAt, IsByte: true);

    public override FilePlace CodePlace => new(_codeAt, IsByte: true);

    public override ReadOnlySpan<byte> Value
    {
        get
        {
            if (_isNumber && _textLength == 0)
            {
                _textLength = Encoding.ASCII.GetBytes(_number.ToString(CultureInfo.InvariantCulture), _text);
            }

            return _text.AsSpan(0, _textLength);
        }
    }

    private long Position => _read - (_end - _next);

    public override bool TryNumber(out double number)
    {
        number = _number;
        return _isNumber && double.IsFinite(_number);
    }

    public override bool TryInteger(out int number)
    {
        number = _isNumber && Math.Abs(_number) <= int.MaxValue && _number == Math.Floor(_number) ? (int)_number : 0;
        return _isNumber && number == _number;
    }

    public override bool HasMoreText()
    {
        while (TryByte(out var value))
        {
            if (value is not (0 or (byte)' ' or (byte)'\r' or (byte)'\n' or 26))
            {
                return true;
            }
        }

        return false;
    }

    protected override bool ReadTag()
    {
        _codeAt = Position;
        if (!TryCode(out var code))
        {
            return false;
        }

        Code = code;
        _valueAt = Position;
        (_isNumber, _textLength) = (true, 0);
        switch (Kind(code))
        {
            case ValueKind.Text:
                _isNumber = false;
                ReadText();
                break;
            case ValueKind.Real:
                _number = BinaryPrimitives.ReadDoubleLittleEndian(Bytes(stackalloc byte[8]));
                break;
            case ValueKind.Short:
                _number = BinaryPrimitives.ReadInt16LittleEndian(Bytes(stackalloc byte[2]));
                break;
            case ValueKind.Long:
                _number = BinaryPrimitives.ReadInt32LittleEndian(Bytes(stackalloc byte[4]));
                break;
            case ValueKind.Huge:
                _number = BinaryPrimitives.ReadInt64LittleEndian(Bytes(stackalloc byte[8]));
                break;
            case ValueKind.Flag:
                _number = Byte();
                break;
            case ValueKind.Chunk:
                _isNumber = false;
                for (var left = Byte(); left > 0; left--)
                {
                    Byte();
                }

                break;
            default:
                throw ReadingFaults.GroupCode(CodePlace, $"{code}");
        }

        return true;
    }

    /// <summary>The kind of value that a group code announces [Dxf2012, group code value types].</summary>
    private static ValueKind Kind(int code) => code switch
    {
        (>= 0 and <= 9) or (>= 100 and <= 109) or (>= 300 and <= 309) or (>= 320 and <= 369) or (>= 390 and <= 399) or
            (>= 410 and <= 419) or (>= 430 and <= 439) or (>= 470 and <= 481) or 999 or (>= 1000 and <= 1003) or
            (>= 1005 and <= 1009) => ValueKind.Text,
        (>= 10 and <= 59) or (>= 110 and <= 149) or (>= 210 and <= 239) or (>= 460 and <= 469) or
            (>= 1010 and <= 1059) => ValueKind.Real,
        (>= 60 and <= 79) or (>= 170 and <= 179) or (>= 270 and <= 289) or (>= 370 and <= 389) or (>= 400 and <= 409) or
            (>= 1060 and <= 1070) => ValueKind.Short,
        (>= 90 and <= 99) or (>= 420 and <= 429) or (>= 440 and <= 459) or 1071 => ValueKind.Long,
        >= 160 and <= 169 => ValueKind.Huge,
        >= 290 and <= 299 => ValueKind.Flag,
        (>= 310 and <= 319) or 1004 => ValueKind.Chunk,
        _ => ValueKind.Unknown,
    };

    private bool TryCode(out int code)
    {
        code = 0;
        if (!TryByte(out var low))
        {
            return false;
        }

        if (_hasShortCodes && low != Escape)
        {
            code = low;
            return true;
        }

        var first = _hasShortCodes ? Byte() : low;
        code = (short)(first | (Byte() << 8));
        return true;
    }

    private void ReadText()
    {
        while (Byte() is var next && next != 0)
        {
            if (_textLength == LongestText)
            {
                throw ReadingFaults.LongText(Place);
            }

            if (_textLength == _text.Length)
            {
                Array.Resize(ref _text, 2 * _text.Length);
            }

            _text[_textLength++] = next;
        }
    }

    private ReadOnlySpan<byte> Bytes(Span<byte> bytes)
    {
        for (var i = 0; i < bytes.Length; i++)
        {
            bytes[i] = Byte();
        }

        return bytes;
    }

    private byte Byte() => TryByte(out var value) ? value : throw ReadingFaults.CutBinary(new FilePlace(_read, IsByte: true));

    private bool TryByte(out byte value)
    {
        value = 0;
        if (_next == _end && !Fill())
        {
            return false;
        }

        value = _buffer[_next++];
        return true;
    }

    private bool Fill()
    {
        _next = 0;
        _end = _stream.ReadAtLeast(_buffer, _buffer.Length, throwOnEndOfStream: false);
        _read += _end;
        return _end > 0;
    }

    private enum ValueKind
    {
        Unknown,
        Text,
        Real,
        Short,
        Long,
        Huge,
        Flag,
        Chunk,
    }
}
