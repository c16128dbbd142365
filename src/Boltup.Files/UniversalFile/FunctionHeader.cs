namespace Boltup.Files.UniversalFile;

/// <summary>The eleven header lines of a dataset 58.</summary>
internal sealed record FunctionHeader
{
    public required IReadOnlyList<string> IdLines { get; init; }

    /// <summary>1 time, 2 auto-spectrum, 3 cross-spectrum, 4 FRF, 5 transmissibility, 6 coherence, 9 PSD, 12 spectrum, 27 order.</summary>
    public required int FunctionType { get; init; }

    public required ChannelField Response { get; init; }

    public required ChannelField Reference { get; init; }

    /// <summary>2 real single, 4 real double, 5 complex single, 6 complex double.</summary>
    public required int OrdinateType { get; init; }

    /// <summary>Number of points as declared, which nothing has checked yet.</summary>
    public required int Count { get; init; }

    public required bool IsEven { get; init; }

    public required double First { get; init; }

    public required double Step { get; init; }

    public required AxisField Abscissa { get; init; }

    public required AxisField Numerator { get; init; }

    public required AxisField Denominator { get; init; }

    public bool IsComplex => OrdinateType is 5 or 6;

    public bool IsDouble => OrdinateType is 4 or 6;

    /// <summary>Numbers per point: real, or real and imaginary part.</summary>
    public int Parts => IsComplex ? 2 : 1;
}
