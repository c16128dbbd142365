namespace Boltup.Files.Text;

/// <summary>Reads lines of bytes forwards through one buffer; lines may end in LF, CR LF or CR.</summary>
/// <param name="windowAfterMove">
/// Bytes that are fetched first at another place; each further fetch doubles. Small for who jumps from header to header, so that the
/// data between are not fetched.
/// </param>
internal sealed class LineReader(ByteSource source, int windowAfterMove = LineReader.LargestWindow)
{
    private const int LargestWindow = 1 << 16;

    /// <summary>No line of any format is longer; what is longer is cut into pieces, so that binary bytes cannot fill the memory.</summary>
    private const int LongestLine = 1 << 16;

    private readonly byte[] _buffer = new byte[Math.Min(LargestWindow + LongestLine, source.Length + 1)];
    private long _bufferStart;
    private int _filled;
    private int _next;
    private readonly int _windowAfterMove = windowAfterMove;
    private int _window = windowAfterMove;

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

        (_bufferStart, _filled, _next, _window) = (offset, 0, 0, _windowAfterMove);
    }

    /// <summary>Reads a line without its end; the span holds until the next call.</summary>
    public bool TryRead(out ReadOnlySpan<byte> line)
    {
        line = default;
        if (AtEnd)
        {
            return false;
        }

        int length = FindEnd();
        while ((length < 0 || _next + length + 1 >= _filled) && TryRefill())
        {
            length = FindEnd();
        }

        LineStart = Position;
        int available = _filled - _next;
        if (available == 0)
        {
            return false; // the file has become shorter
        }

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

    private int FindEnd() => _buffer.AsSpan(_next, _filled - _next).IndexOfAny((byte)'\n', (byte)'\r');

    private bool TryRefill()
    {
        int kept = _filled - _next;
        if (kept > LongestLine)
        {
            return false;
        }

        _buffer.AsSpan(_next, kept).CopyTo(_buffer);
        _bufferStart += _next;
        _next = 0;
        int fetched = source.ReadAt(_bufferStart + kept, _buffer.AsSpan(kept, Math.Min(_window, _buffer.Length - kept)));
        _filled = kept + fetched;
        _window = Math.Min(2 * _window, LargestWindow);
        return fetched > 0;
    }
}
