namespace Boltup.Files.Text;

/// <summary>Reads lines of bytes forwards through one buffer; lines may end in LF, CR LF or CR.</summary>
internal sealed class LineReader(ByteSource source)
{
    private const int InitialBuffer = 1 << 16;

    /// <summary>No line of any format is longer; what is longer is cut into pieces, so that binary bytes cannot fill the memory.</summary>
    private const int LongestLine = 1 << 16;

    private readonly byte[] _buffer = new byte[Math.Min(InitialBuffer + LongestLine, source.Length + 1)];
    private long _bufferStart;
    private int _filled;
    private int _next;

    /// <summary>Offset in the file of the line that is read next.</summary>
    public long Position => _bufferStart + _next;

    /// <summary>Offset in the file of the line that was read last.</summary>
    public long LineStart { get; private set; }

    /// <summary>Number, from 1, of the line that was read last; meaningless after binary data.</summary>
    public int LineNumber { get; private set; }

    /// <summary>The kinds of line end met so far.</summary>
    public LineEnds Ends { get; private set; }

    /// <summary>Whether the line that was read last had a line end; the last one of a file may have none.</summary>
    public bool LineIsEnded { get; private set; }

    public bool AtEnd => Position >= source.Length;

    /// <summary>Continues at another place.</summary>
    /// <param name="linesPassed">How many lines lie between.</param>
    public void MoveTo(long offset, int linesPassed = 0)
    {
        LineNumber += linesPassed;
        if (offset >= _bufferStart && offset <= _bufferStart + _filled)
        {
            _next = (int)(offset - _bufferStart);
            return;
        }

        (_bufferStart, _filled, _next) = (offset, 0, 0);
    }

    /// <summary>Reads a line without its end; the span holds until the next call.</summary>
    public bool TryRead(out ReadOnlySpan<byte> line)
    {
        line = default;
        if (AtEnd)
        {
            return false;
        }

        int length = _buffer.AsSpan(_next, _filled - _next).IndexOfAny((byte)'\n', (byte)'\r');
        if (length < 0 || _next + length + 1 >= _filled)
        {
            Refill();
            length = _buffer.AsSpan(_next, _filled - _next).IndexOfAny((byte)'\n', (byte)'\r');
        }

        LineStart = Position;
        int available = _filled - _next;
        length = Math.Min(length < 0 ? available : length, LongestLine);
        line = _buffer.AsSpan(_next, length);
        int endLength = PassEnd(_next + length);
        LineIsEnded = endLength > 0;
        _next += length + endLength;
        LineNumber++;
        return true;
    }

    private int PassEnd(int at)
    {
        if (at >= _filled || _buffer[at] is not ((byte)'\n' or (byte)'\r'))
        {
            return 0;
        }

        bool isPair = _buffer[at] == '\r' && at + 1 < _filled && _buffer[at + 1] == '\n';
        Ends |= isPair ? LineEnds.CrLf : _buffer[at] == '\r' ? LineEnds.Cr : LineEnds.Lf;
        return isPair ? 2 : 1;
    }

    private void Refill()
    {
        int kept = _filled - _next;
        _buffer.AsSpan(_next, kept).CopyTo(_buffer);
        _bufferStart += _next;
        _next = 0;
        _filled = kept + source.ReadAt(_bufferStart + kept, _buffer.AsSpan(kept));
    }
}
