using System.Text;
using Boltup.Engine.Prediction;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>The small datasets: points, units, qualifiers.</summary>
internal sealed partial class DatasetWalker
{
    /// <summary>Dataset 15: node and coordinates in one line (4I10,1P3E13.5); 2411: in two (4I10 / 1P3D25.16).</summary>
    private void ReadPoints(int dataset)
    {
        _liberties.Place = new(_displayPath, _lines.LineNumber);
        while (TryReadInside(out ReadOnlySpan<byte> line))
        {
            if (Blanks.Trim(line).IsEmpty)
            {
                continue;
            }

            string node = Encoding.Latin1.GetString(line);
            string coordinates = node;
            (int start, int width) = (40, 13);
            if (dataset == 2411)
            {
                if (!TryReadInside(out ReadOnlySpan<byte> second))
                {
                    return;
                }

                coordinates = Encoding.Latin1.GetString(second);
                (start, width) = (0, 25);
            }

            AddPoint(node, coordinates, start, width);
        }
    }

    private void AddPoint(string nodeLine, string coordinates, int start, int width)
    {
        if (FixedColumns.TryInteger(nodeLine, 0, 10, out int node)
            && node > 0
            && TryCoordinate(coordinates, start, width, out double x)
            && TryCoordinate(coordinates, start + width, width, out double y)
            && TryCoordinate(coordinates, start + 2 * width, width, out double z))
        {
            double metres = 1 / _units.LengthFactor;
            _points.Add(new MeasuredPoint(FormattableString.Invariant($"{node}"), metres * x, metres * y, metres * z));
            return;
        }

        LeaveOut(FileCodes.BadHeader, "a point has no readable number or place", new(_displayPath, _lines.LineNumber));
    }

    /// <summary>A place is never guessed: blank is no coordinate.</summary>
    private static bool TryCoordinate(string line, int start, int width, out double value) =>
        FixedColumns.TryReal(line, start, width, out value) && double.IsFinite(value) && FixedColumns.Text(line, start, width).Length > 0;

    /// <summary>Dataset 164: code and name, then the factors for length, force and temperature (3D25.17).</summary>
    private void ReadUnits()
    {
        if (!TryReadInside(out _))
        {
            return;
        }

        bool hasFactors = TryReadInside(out ReadOnlySpan<byte> line);
        string factors = Encoding.Latin1.GetString(line);
        if (hasFactors)
        {
            SkipDataset();
        }

        if (hasFactors
            && FixedColumns.TryReal(factors, 0, 25, out double length)
            && FixedColumns.TryReal(factors, 25, 25, out double force)
            && length > 0 && force > 0 && double.IsFinite(length) && double.IsFinite(force))
        {
            _units = new UnitSystem(length, force);
            if (_units != UnitSystem.Si)
            {
                _liberties.Note(FileCodes.UnitConverted, FormattableString.Invariant($"units of dataset 164 were converted to SI: length ÷ {length}, force ÷ {force}"));
            }

            return;
        }

        LeaveOut(FileCodes.BadHeader, "dataset 164 has no readable factors for length and force", new(_displayPath, _lines.LineNumber));
    }

    /// <summary>Dataset 1858: the third field of its second line is 2 for peak and 3 for rms amplitudes (from memory).</summary>
    private void ReadQualifiers()
    {
        if (!TryReadInside(out _) || !TryReadInside(out ReadOnlySpan<byte> line))
        {
            return;
        }

        if (FixedColumns.TryInteger(Encoding.Latin1.GetString(line), 12, 6, out int amplitude))
        {
            _amplitude = amplitude switch
            {
                2 => Amplitude.Peak,
                3 => Amplitude.Rms,
                _ => null,
            };
        }

        SkipDataset();
    }
}
