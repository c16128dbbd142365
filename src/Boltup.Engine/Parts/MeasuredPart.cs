using System.Numerics;
using System.Runtime.InteropServices;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>A part known by FRFs from files, measured or computed elsewhere.</summary>
public sealed class MeasuredPart : IPartModel
{
    private readonly Dictionary<DofPair, IFrfCurve> _curves;
    private readonly bool _fillByReciprocity;
    private readonly string _name;

    /// <param name="name">Name for messages.</param>
    /// <param name="curves">At least one FRF, at most one per pair of dofs.</param>
    /// <param name="fillByReciprocity">Whether a missing FRF may be taken from its reciprocal.</param>
    /// <param name="axis">The lines that all curves share.</param>
    public MeasuredPart(string name, IReadOnlyList<IFrfCurve> curves, bool fillByReciprocity, FrequencyAxis axis)
    {
        _name = name;
        _fillByReciprocity = fillByReciprocity;
        _curves = curves.ToDictionary(curve => new DofPair(curve.Response, curve.Excitation));
        Axis = axis;
        IEnumerable<DofPair> pairs = fillByReciprocity
            ? _curves.Keys.Concat(_curves.Keys.Select(Reciprocity.Swap))
            : _curves.Keys;
        Responses = pairs.Select(pair => pair.Response).ToHashSet();
        Excitations = pairs.Select(pair => pair.Excitation).ToHashSet();
    }

    public FrequencyAxis Axis { get; }

    public IReadOnlyCollection<Dof> Responses { get; }

    public IReadOnlyCollection<Dof> Excitations { get; }

    public bool HasFrf(Dof response, Dof excitation) => Find(response, excitation, out _) is not null;

    public FrfMatrix? Evaluate(
        FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
    {
        var frf = new FrfMatrix(axis, rows, columns);
        var reader = new CurveReader(axis, diagnostics);
        var filled = new List<string>();
        bool complete = true;
        for (int row = 0; row < rows.Count; row++)
        {
            for (int column = 0; column < columns.Count; column++)
            {
                IFrfCurve curve = Find(rows[row], columns[column], out bool reciprocal)
                    ?? throw new ArgumentException($"part `{_name}` has no FRF {rows[row]} / {columns[column]}");
                int reciprocalPower = reciprocal ? Reciprocity.OmegaPower(rows[row], columns[column]) : 0;
                complete &= reader.TryRead(curve, reciprocalPower, frf.Values, row, column);
                if (reciprocal)
                {
                    filled.Add($"{rows[row]} / {columns[column]} from {curve.Response} / {curve.Excitation}");
                }
            }
        }

        SayWhatWasFilled(filled, diagnostics);
        reader.SayWhatWasInterpolated(_name);
        return complete ? frf : null;
    }

    private void SayWhatWasFilled(List<string> filled, DiagnosticBag diagnostics)
    {
        if (filled.Count > 0)
        {
            diagnostics.Note(
                EngineCodes.FilledByReciprocity,
                $"part `{_name}`: {filled.Count} missing FRF{(filled.Count == 1 ? " was" : "s were")} taken from the reciprocal",
                notes: [.. filled]);
        }
    }

    private IFrfCurve? Find(Dof response, Dof excitation, out bool reciprocal)
    {
        reciprocal = false;
        var pair = new DofPair(response, excitation);
        if (_curves.TryGetValue(pair, out IFrfCurve? direct))
        {
            return direct;
        }

        reciprocal = _fillByReciprocity;
        return reciprocal ? _curves.GetValueOrDefault(Reciprocity.Swap(pair)) : null;
    }

    /// <summary>Reads curves into tiles: axis mapping, quantity conversion and the check for numbers that are none.</summary>
    private sealed class CurveReader(FrequencyAxis axis, DiagnosticBag diagnostics)
    {
        private readonly Dictionary<FrequencyAxis, AxisMap?> _maps = [];
        private readonly HashSet<FrequencyAxis> _interpolated = [];
        private readonly double[] _factors = new double[axis.Count];
        private readonly double[] _mapped = new double[2 * axis.Count];
        private Complex[] _source = [];
        private (int Power, bool Valid) _factorsFor;

        public bool TryRead(IFrfCurve curve, int reciprocalPower, TiledMatrix target, int row, int column)
        {
            int power = reciprocalPower - FrfQuantity.DerivativeOrder(curve.Quantity.Response);
            if (power < 0 && axis.FirstHz == 0)
            {
                diagnostics.Error(
                    EngineCodes.ZeroFrequency,
                    $"{curve.Response} / {curve.Excitation} at 0 Hz cannot be turned into receptance",
                    curve.Origin,
                    "start the `frequencies` of the assembly above 0 Hz");
                return false;
            }

            if (MapFor(curve) is not { } map)
            {
                return false;
            }

            if (_source.Length < curve.Axis.Count)
            {
                _source = new Complex[curve.Axis.Count];
            }

            Span<Complex> values = _source.AsSpan(0, curve.Axis.Count);
            if (!curve.TryRead(values, diagnostics))
            {
                return false;
            }

            PrepareFactors(power);
            Complex unit = UnitFactor(power, negated: reciprocalPower != 0);
            map.Apply(MemoryMarshal.Cast<Complex, double>(values), _mapped);
            return Store(curve, unit, target, row, column);
        }

        public void SayWhatWasInterpolated(string part)
        {
            foreach (FrequencyAxis source in _interpolated)
            {
                diagnostics.Warning(
                    EngineCodes.FrfInterpolated,
                    $"part `{part}`: FRFs were interpolated at {Lines(_maps[source]!.Interpolated)}",
                    help: "a resonance narrower than three lines of the data is misjudged by interpolation; measure on a finer grid or ask for the lines of the data",
                    notes: [$"data: {source}", $"asked for: {axis}"]);
            }
        }

        private static string Lines(int count) => count == 1 ? "1 line" : $"{count} lines";

        private AxisMap? MapFor(IFrfCurve curve)
        {
            if (!_maps.TryGetValue(curve.Axis, out AxisMap? map))
            {
                map = AxisMap.Between(curve.Axis, axis);
                _maps.Add(curve.Axis, map);
                if (map is { Interpolated: > 0 })
                {
                    _interpolated.Add(curve.Axis);
                }
            }

            if (map is null)
            {
                diagnostics.Error(
                    EngineCodes.OutsideBand,
                    $"{curve.Response} / {curve.Excitation} has no data over the whole of the frequencies asked for",
                    curve.Origin,
                    "narrow `frequencies` to the band of the data; nothing is extrapolated",
                    $"found: {curve.Axis}",
                    $"expected: {axis}");
            }

            return map;
        }

        private void PrepareFactors(int power)
        {
            if (_factorsFor == (power, true))
            {
                return;
            }

            for (int line = 0; line < axis.Count; line++)
            {
                _factors[line] = Math.Pow(axis.Omega(line), power);
            }

            _factorsFor = (power, true);
        }

        /// <summary>j^power, negated for a reciprocal of unlike kinds.</summary>
        private static Complex UnitFactor(int power, bool negated)
        {
            Complex unit = (((power % 4) + 4) % 4) switch
            {
                0 => Complex.One,
                1 => Complex.ImaginaryOne,
                2 => -Complex.One,
                _ => -Complex.ImaginaryOne,
            };
            return negated ? -unit : unit;
        }

        /// <summary>Turns, scales and stores the mapped values; plain numbers, since this is where a measured part spends its time.</summary>
        private bool Store(IFrfCurve curve, Complex unit, TiledMatrix target, int row, int column)
        {
            (double re, double im) = (unit.Real, unit.Imaginary);
            for (int tile = 0; tile < target.TileCount; tile++)
            {
                Span<double> entry = target.Entry(tile, row, column);
                for (int lane = 0; lane < Tiling.Lanes; lane++)
                {
                    int line = Math.Min(tile * Tiling.Lanes + lane, axis.Count - 1);
                    double x = _factors[line] * _mapped[2 * line];
                    double y = _factors[line] * _mapped[2 * line + 1];
                    if (!double.IsFinite(x + y))
                    {
                        return RefuseNumber(curve, line);
                    }

                    entry[lane] = re * x - im * y;
                    entry[Tiling.Lanes + lane] = re * y + im * x;
                }
            }

            return true;
        }

        private bool RefuseNumber(IFrfCurve curve, int line)
        {
            diagnostics.Error(
                EngineCodes.NotFinite,
                FormattableString.Invariant($"{curve.Response} / {curve.Excitation} is no finite number at {axis[line]} Hz (line {line + 1})"),
                curve.Origin,
                "repair the data or leave the line out with `frequencies`");
            return false;
        }
    }
}
