using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Files.UniversalFile;

/// <summary>Turns headers into curves: dofs, quantities, signs, units.</summary>
internal sealed class FunctionBuilder(Liberties liberties)
{
    /// <summary>Standard acceleration of free fall in m/s² (ISO 80000-3).</summary>
    private const double StandardGravity = 9.80665;

    /// <summary>Smallest step relative to the last line; below, lines would merge when an axis is rounded to 12 digits.</summary>
    private const double SmallestStep = 1e-10;

    private readonly AxisPool _axes = new();
    private double _lastFirst;
    private double _lastStep;
    private int _lastCount;
    private FrequencyAxis? _lastEvenAxis;

    /// <summary>Whether a function that does not name its abscissa must be over frequency.</summary>
    public bool ImpliesFrequency(FunctionHeader header)
    {
        bool implies = header.Abscissa.DataType == 0
            && DataTypes.KindOf(header.FunctionType) is not (FunctionKind.General or FunctionKind.Order or FunctionKind.Other);
        if (implies)
        {
            liberties.Take(Liberty.NoAbscissaType);
        }

        return implies;
    }

    /// <summary>Lines first + i·step, or null when they are no axis; equal axes are one instance.</summary>
    public FrequencyAxis? EvenAxis(double first, double step, int count)
    {
        if (_lastEvenAxis is null || _lastFirst != first || _lastStep != step || _lastCount != count)
        {
            FrequencyAxis? axis = RebuildEven(first, step, count);
            _lastEvenAxis = axis is null ? null : _axes.Share(axis.Hz);
            (_lastFirst, _lastStep, _lastCount) = (first, step, count);
        }

        return _lastEvenAxis;
    }

    /// <summary>The axis that first line, step and number of lines in a header stand for, or null.</summary>
    public static FrequencyAxis? RebuildEven(double first, double step, int count)
    {
        double last = first + step * (count - 1);
        bool isAxis = first >= 0 && double.IsFinite(last) && (count == 1 || step > SmallestStep * last);
        return isAxis ? FrequencyAxis.Even(first, count == 1 ? 0 : step, count) : null;
    }

    public FrequencyAxis? UnevenAxis(double[] hz) => _axes.Share(hz);

    public (Curve Curve, FunctionRecord Record) Build(
        FunctionHeader header, DataLayout layout, FrequencyAxis axis, UnitSystem units, Amplitude? amplitude, int index, SourceSpan place)
    {
        FunctionKind kind = DataTypes.KindOf(header.FunctionType);
        Quantity numerator = DataTypes.QuantityOf(header.Numerator);
        Quantity denominator = DataTypes.QuantityOf(header.Denominator);
        Dof? response = DofOf(header.Response, numerator, header, 0, out double responseSign);
        Dof? reference = DofOf(header.Reference, denominator, header, 1, out double referenceSign);
        bool isRatio = kind is FunctionKind.Coherence;
        bool isReal = isRatio || kind is FunctionKind.AutoSpectrum or FunctionKind.PowerSpectralDensity;
        SayStorage(header, kind, isReal);
        double factor = isRatio ? 1 : FactorOf(
            kind,
            responseSign * referenceSign,
            ToSi(header.Numerator, numerator, response?.Direction, units),
            ToSi(header.Denominator, denominator, reference?.Direction, units),
            units != UnitSystem.Si && UnitSystem.AreOfPower(header.Numerator, numerator, response?.Direction));
        var curve = new Curve
        {
            Index = index,
            Kind = kind,
            Response = response,
            Excitation = reference,
            ResponseQuantity = isRatio ? Quantity.Dimensionless : numerator,
            ExcitationQuantity = denominator,
            Axis = axis,
            Amplitude = amplitude,
            IsComplex = header.IsComplex,
            IsDouble = header.IsDouble,
            Title = header.IdLines[0],
            Span = place,
        };
        return (curve, new FunctionRecord(layout, factor, KeepsImaginary: !isReal));
    }

    /// <summary>Power goes with the square of its quantity, and has no sign; the exponents of the file may be those of the power already.</summary>
    private static double FactorOf(FunctionKind kind, double sign, double numerator, double denominator, bool isPowerFactor) => kind switch
    {
        FunctionKind.AutoSpectrum or FunctionKind.PowerSpectralDensity => isPowerFactor ? numerator : numerator * numerator,
        FunctionKind.CrossSpectrum => sign * numerator * denominator,
        _ => sign * numerator / denominator,
    };

    private void SayStorage(FunctionHeader header, FunctionKind kind, bool isReal)
    {
        if (header.IdLines.All(string.IsNullOrEmpty))
        {
            liberties.Take(Liberty.BlankIdentification);
        }

        if (header.Numerator.DataType == DataTypes.ReactionForce || header.Denominator.DataType == DataTypes.ReactionForce)
        {
            liberties.Take(Liberty.ReactionForce);
        }

        if (isReal && header.IsComplex)
        {
            liberties.Take(Liberty.ComplexRatio);
        }

        if (kind is FunctionKind.Frf or FunctionKind.Spectrum && !header.IsComplex)
        {
            liberties.Take(Liberty.RealFrf);
        }
    }

    private double ToSi(AxisField field, Quantity quantity, Direction? direction, UnitSystem units)
    {
        if (units == UnitSystem.Si && quantity == Quantity.Acceleration && string.Equals(field.Unit, "g", StringComparison.OrdinalIgnoreCase))
        {
            liberties.Note(FileCodes.UnitConverted, "accelerations in g were converted to m/s² with 9.80665 m/s²");
            return StandardGravity;
        }

        return units.ToSi(field, quantity, direction);
    }

    /// <summary>The dof along its positive direction, with the sign that turns the values so.</summary>
    private Dof? DofOf(ChannelField channel, Quantity quantity, FunctionHeader header, int side, out double sign)
    {
        sign = 1;
        string point = FormattableString.Invariant($"{channel.Node}");
        if (quantity is Quantity.Pressure or Quantity.VolumeVelocity && channel.Node != 0)
        {
            if (channel.Direction != 0)
            {
                liberties.Take(Liberty.PressureWithDirection);
            }

            return new Dof(point, quantity == Quantity.Pressure ? Direction.P : Direction.Q);
        }

        if (channel.Node == 0 || channel.Direction == 0 || Math.Abs(channel.Direction) > 6)
        {
            return DofFromName(channel, header, side);
        }

        if (channel.Direction < 0)
        {
            sign = -1;
            liberties.Note(FileCodes.SignTurned, "functions along negative directions were turned to the positive ones");
        }

        return new Dof(point, (Direction)(Math.Abs(channel.Direction) - 1));
    }

    /// <summary>A name of the form point.direction in the entity, or in an identification line such as <c>m1.x / m2.y</c>.</summary>
    private Dof? DofFromName(ChannelField channel, FunctionHeader header, int side)
    {
        IEnumerable<string> names = header.IdLines
            .Select(line => line.Split('/', StringSplitOptions.TrimEntries))
            .Where(pieces => pieces.Length == 2)
            .Select(pieces => pieces[side])
            .Prepend(channel.Entity);
        foreach (string name in names)
        {
            if (Dof.TryParse(name, out Dof? dof))
            {
                liberties.Take(Liberty.DofFromName);
                return dof;
            }
        }

        return null;
    }
}
