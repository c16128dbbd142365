using Boltup.Engine.Diagnostics;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>Where the values of a function end. Declared sizes are checked against the bytes before anything is believed.</summary>
internal sealed partial class DatasetWalker
{
    private const int IeeeFormat = 2;

    private DataLayout? FindBinary(string id, FunctionHeader header, SourceSpan place)
    {
        if (!FixedColumns.TryInteger(id, 7, 6, out int byteOrder)
            || !FixedColumns.TryInteger(id, 13, 6, out int floatFormat)
            || !FixedColumns.TryInteger(id, 31, 12, out int declaredBytes))
        {
            LeaveOut(FileCodes.BadHeader, "the first line of a 58b record cannot be understood", place);
            SkipDataset();
            return null;
        }

        if (floatFormat != IeeeFormat || byteOrder is not (1 or 2))
        {
            LeaveOut(
                FileCodes.UnsupportedFloats,
                $"a 58b record has float format {floatFormat} and byte order {byteOrder}, expected format 2 (IEEE) and order 1 or 2",
                place);
            MoveBehindBinary(_lines.Position, declaredBytes);
            return null;
        }

        var layout = new DataLayout(_lines.Position, 0, header.Count, true, byteOrder == 2, !header.IsEven, header.Parts, header.IsDouble);
        if (!header.IsEven && header.IsDouble && declaredBytes == (long)header.Count * (4 + 8 * header.Parts))
        {
            layout = layout with { HasSingleAbscissa = true };
        }

        return Settle(layout, declaredBytes, place);
    }

    /// <summary>Finds the end by the byte count, or by the number of values, or by searching; moves the reader behind it.</summary>
    private DataLayout? Settle(DataLayout layout, long declaredBytes, SourceSpan place)
    {
        long neededBytes = (long)layout.Points * layout.BytesPerPoint;
        if (declaredBytes >= neededBytes && ClosesAt(layout.Offset + declaredBytes))
        {
            if (declaredBytes > neededBytes)
            {
                _liberties.Take(Liberty.TooManyValues);
            }

            return layout;
        }

        if (declaredBytes != neededBytes && ClosesAt(layout.Offset + neededBytes))
        {
            _liberties.Take(Liberty.WrongByteCount);
            return layout;
        }

        if (layout.Offset + neededBytes == _source.Length)
        {
            _liberties.Take(Liberty.NoFinalDelimiter);
            _lines.MoveTo(_source.Length);
            return layout;
        }

        return SettleBySearch(layout, declaredBytes, place);
    }

    private DataLayout? SettleBySearch(DataLayout layout, long declaredBytes, SourceSpan place)
    {
        long end = DelimiterSearch.FindEnd(_source, layout.Offset);
        long points = ((end < 0 ? _source.Length : end) - layout.Offset) / layout.BytesPerPoint;
        if (end < 0 || points == 0 || (declaredBytes == (long)layout.Points * layout.BytesPerPoint && points < layout.Points))
        {
            LeaveOut(
                FileCodes.Truncated,
                $"a 58b record holds {Math.Min(points, layout.Points)} of {layout.Points} values",
                place);
            _lines.MoveTo(end < 0 ? _source.Length : end);
            return null;
        }

        _liberties.Take(points < layout.Points ? Liberty.TooFewValues : Liberty.SearchedEnd);
        _lines.MoveTo(end);
        SkipDataset();
        return layout with { Points = (int)Math.Min(points, layout.Points) };
    }

    /// <summary>Whether the record is closed at an offset; if so, the reader stands behind the delimiter.</summary>
    private bool ClosesAt(long offset)
    {
        if (offset > _source.Length || offset < _lines.Position - _source.Length)
        {
            return false;
        }

        long before = _lines.Position;
        _lines.MoveTo(offset);
        bool passed = false;
        while (_lines.TryRead(out ReadOnlySpan<byte> line))
        {
            if (IsDelimiter(line))
            {
                if (passed)
                {
                    _liberties.Take(Liberty.LineEndBeforeDelimiter);
                }

                return true;
            }

            if (!line.IsEmpty)
            {
                break;
            }

            passed = true;
        }

        _lines.MoveTo(before);
        return false;
    }

    private void MoveBehindBinary(long offset, long bytes)
    {
        if (bytes < 0 || !ClosesAt(offset + bytes))
        {
            long end = DelimiterSearch.FindEnd(_source, offset);
            _lines.MoveTo(end < 0 ? _source.Length : end);
            SkipDataset();
        }
    }

    /// <summary>Regular rows let the reader jump to the end of the values; otherwise they are counted line by line.</summary>
    private DataLayout? FindAscii(FunctionHeader header, SourceSpan place)
    {
        var layout = new DataLayout(
            _lines.Position, _hasBinary ? 0 : _lines.LineNumber + 1, header.Count, false, false, !header.IsEven, header.Parts, header.IsDouble);
        return JumpOverRows(layout) ? layout : CountRows(layout, place);
    }

    private bool JumpOverRows(DataLayout layout)
    {
        int[] widths = layout.RowWidths;
        long numbers = (long)layout.Points * layout.NumbersPerPoint;
        long rows = (numbers + widths.Length - 1) / widths.Length;
        int rowWidth = widths.Sum();
        int lastFields = (int)(numbers - (rows - 1) * widths.Length);
        int lastWidth = widths.Take(lastFields).Sum();
        int firstLine = _lines.LineNumber;
        if (layout.Offset + (rows - 1) * rowWidth + lastWidth > _source.Length || !_lines.TryRead(out ReadOnlySpan<byte> first))
        {
            return false;
        }

        bool isRegular = first.Length == (rows == 1 ? lastWidth : rowWidth);
        long lineEnd = _lines.Position - layout.Offset - first.Length;
        long lastRow = layout.Offset + (rows - 1) * (rowWidth + lineEnd);
        if (isRegular && lastRow + lastWidth <= _source.Length)
        {
            _lines.MoveTo(lastRow, (int)(rows - 2)); // one row has been read
            if (_lines.TryRead(out ReadOnlySpan<byte> last) && last.Length == lastWidth
                && _lines.TryRead(out ReadOnlySpan<byte> delimiter) && IsDelimiter(delimiter))
            {
                return true;
            }
        }

        _lines.MoveTo(layout.Offset, firstLine - _lines.LineNumber);
        return false;
    }

    private DataLayout? CountRows(DataLayout layout, SourceSpan place)
    {
        int[] widths = layout.RowWidths;
        long declared = (long)layout.Points * layout.NumbersPerPoint;
        long found = 0;
        bool closed = false;
        bool padded = false;
        while (_lines.TryRead(out ReadOnlySpan<byte> line))
        {
            if (IsDelimiter(line) && (found >= declared || IsFollowedByDatasetOrEnd()))
            {
                closed = true;
                break;
            }

            int fields = AsciiData.FieldsIn(line, widths);
            if (!_lines.LineIsEnded && line.Length < widths.Take(fields).Sum())
            {
                fields--; // the file ends within a number
            }

            padded |= fields < widths.Length && line.Length > widths.Take(fields).Sum();
            found += fields;
        }

        return Judge(layout, found, declared, closed, padded, place);
    }

    private DataLayout? Judge(DataLayout layout, long found, long declared, bool closed, bool padded, SourceSpan place)
    {
        long points = found / layout.NumbersPerPoint;
        if (points == 0 || (!closed && found < declared))
        {
            LeaveOut(FileCodes.Truncated, $"a record holds {points} of {layout.Points} values", place);
            return null;
        }

        if (!closed)
        {
            _liberties.Take(Liberty.NoFinalDelimiter);
        }

        if (padded)
        {
            _liberties.Take(Liberty.PaddedRow);
        }

        if (found != declared)
        {
            _liberties.Take(found < declared ? Liberty.TooFewValues : Liberty.TooManyValues);
        }

        return layout with { Points = (int)Math.Min(points, layout.Points) };
    }

    /// <summary>Tells a delimiter from a value −1 that stands alone in its row: after a delimiter comes another one, or the end.</summary>
    private bool IsFollowedByDatasetOrEnd()
    {
        long here = _lines.Position;
        int number = _lines.LineNumber;
        bool ends = true;
        while (_lines.TryRead(out ReadOnlySpan<byte> line))
        {
            if (!Blanks.Trim(line).IsEmpty)
            {
                ends = IsDelimiter(line);
                break;
            }
        }

        _lines.MoveTo(here, number - _lines.LineNumber);
        return ends;
    }
}
