using System.Buffers.Text;
using System.Globalization;
using System.Text;

namespace MeshSection.Dxf.Tags;

/// <summary>
/// Reads an ASCII DXF: a line with a group code, a line with a value, with LF, CRLF or CR between them.
/// </summary>
internal sealed class AsciiTags : TagReader
{
    private const int LongestLine = 1 << 20;

    private readonly Stream _stream;
    private byte[] _buffer = new byte[1 << 16];
    private int _next;
    private int _end;
    private bool _streamIsRead;
    private bool _lineFeedMayFollow;
    private bool _lineIsTerminated;
    private bool _anyTag;
    private long _lines;
    private int _valueStart;
    private int _valueLength;
    private string? _unterminated;

    /// <param name="head">The first bytes, which were read already.</param>
    /// <param name="stream">The rest.</param>
    public AsciiTags(ReadOnlySpan<byte> head, Stream stream)
    {
        _stream = stream;
        head.CopyTo(_buffer);
        _end = head.Length;
        HasByteOrderMark = head.StartsWith((ReadOnlySpan<byte>)[0xEF, 0xBB, 0xBF]);
        _next = HasByteOrderMark ? 3 : 0;
    }

    public override bool HasByteOrderMark { get; }

    public override FilePlace Place => new(_lines);

    public override FilePlace CodePlace => new(_lines - 1);

    public override ReadOnlySpan<byte> Value => _buffer.AsSpan(_valueStart, _valueLength);

    public override string? UnterminatedValue => _unterminated;

    public override bool TryNumber(out double number) =>
        double.TryParse(Value, NumberStyles.Float, CultureInfo.InvariantCulture, out number) && double.IsFinite(number);

    public override bool TryInteger(out int number)
    {
        var digits = Value.Length > 0 && Value[0] == '+' ? Value[1..] : Value;
        return Utf8Parser.TryParse(digits, out number, out var used) && used == digits.Length;
    }

    public override bool HasMoreText()
    {
        while (TryLine(out var start, out var length))
        {
            if (Trimmed(start, length).Length > 0)
            {
                return true;
            }
        }

        return false;
    }

    protected override bool ReadTag()
    {
        if (!TryLine(out var start, out var length))
        {
            return false;
        }

        var digits = Trimmed(start, length);
        if (!Utf8Parser.TryParse(digits, out int code, out var used) || used != digits.Length)
        {
            var line = _lines;
            var text = ReadingFaults.Quoted(digits);
            if (digits.Length == 0 && !HasMoreText())
            {
                return false;
            }

            throw _anyTag ? ReadingFaults.GroupCode(new FilePlace(line), text) : ReadingFaults.NotDxf(new FilePlace(line), text);
        }

        var codeLine = _lines;
        if (!_lineIsTerminated || !TryLine(out _valueStart, out _valueLength))
        {
            throw ReadingFaults.CodeWithoutValue(new FilePlace(codeLine), code);
        }

        Code = code;
        _anyTag = true;
        var value = Trimmed(_valueStart, _valueLength);
        if (value.Length < _valueLength)
        {
            _valueStart += _buffer.AsSpan(_valueStart, _valueLength).IndexOf(value);
            _valueLength = value.Length;
        }

        _unterminated = _lineIsTerminated ? null : Encoding.Latin1.GetString(value);
        return true;
    }

    private ReadOnlySpan<byte> Trimmed(int start, int length) =>
        // The end-of-file mark of old systems (Ctrl-Z) counts as a blank.
        _buffer.AsSpan(start, length).Trim(" \t\u001a\0"u8);

    private bool TryLine(out int start, out int length)
    {
        if (_lineFeedMayFollow && (_next < _end || Fill()) && _buffer[_next] == '\n')
        {
            _next++;
        }

        _lineFeedMayFollow = false;
        var seen = 0;
        while (true)
        {
            var at = _buffer.AsSpan(_next + seen, _end - _next - seen).IndexOfAny((byte)'\n', (byte)'\r');
            if (at >= 0)
            {
                start = _next;
                length = seen + at;
                _lineFeedMayFollow = _buffer[start + length] == '\r';
                _lineIsTerminated = true;
                _next = start + length + 1;
                _lines++;
                return true;
            }

            seen = _end - _next;
            if (seen > LongestLine)
            {
                throw ReadingFaults.LongText(new FilePlace(_lines + 1));
            }

            if (!Fill())
            {
                start = _next;
                length = seen;
                _lineIsTerminated = false;
                _next = _end;
                _lines += seen > 0 ? 1 : 0;
                return seen > 0;
            }
        }
    }

    /// <summary>Moves what is left to the front of the buffer and reads more behind it.</summary>
    private bool Fill()
    {
        if (_streamIsRead)
        {
            return false;
        }

        var left = _end - _next;
        if (left == _buffer.Length)
        {
            Array.Resize(ref _buffer, 2 * _buffer.Length);
        }

        _buffer.AsSpan(_next, left).CopyTo(_buffer);
        _next = 0;
        _end = left + _stream.ReadAtLeast(_buffer.AsSpan(left), _buffer.Length - left, throwOnEndOfStream: false);
        _streamIsRead = _end < _buffer.Length;
        return _end > left;
    }
}
