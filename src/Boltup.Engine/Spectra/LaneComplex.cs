using System.Runtime.Intrinsics;

namespace Boltup.Engine.Spectra;

/// <summary>One entry of a tile as a value: a complex number at each of 8 adjacent lines.</summary>
internal readonly record struct LaneComplex(Vector512<double> Real, Vector512<double> Imaginary)
{
    /// <summary>The same number at the conjugate.</summary>
    public LaneComplex Conjugate => new(Real, -Imaginary);

    /// <summary>j times the imaginary part.</summary>
    public LaneComplex ImaginaryPart => new(Vector512<double>.Zero, Imaginary);

    /// <summary>Re² + Im².</summary>
    public Vector512<double> Square => Real * Real + Imaginary * Imaginary;

    /// <summary>Reads an entry of a tile.</summary>
    public static LaneComplex At(ReadOnlySpan<double> tile, int entry)
    {
        ReadOnlySpan<double> numbers = tile.Slice(entry * Tiling.EntryLength, Tiling.EntryLength);
        return new LaneComplex(Vector512.Create(numbers), Vector512.Create(numbers[Tiling.Lanes..]));
    }

    public static LaneComplex operator +(LaneComplex a, LaneComplex b) => new(a.Real + b.Real, a.Imaginary + b.Imaginary);

    public static LaneComplex operator -(LaneComplex a, LaneComplex b) => new(a.Real - b.Real, a.Imaginary - b.Imaginary);

    public static LaneComplex operator *(LaneComplex a, LaneComplex b) =>
        new(a.Real * b.Real - a.Imaginary * b.Imaginary, a.Real * b.Imaginary + a.Imaginary * b.Real);

    public static LaneComplex operator *(double factor, LaneComplex a) => new(factor * a.Real, factor * a.Imaginary);

    public static LaneComplex operator *(Vector512<double> factor, LaneComplex a) => new(factor * a.Real, factor * a.Imaginary);

    /// <summary>Re(a·b), summed over the lanes.</summary>
    public static double RealOfProduct(LaneComplex a, LaneComplex b) => Vector512.Sum(a.Real * b.Real - a.Imaginary * b.Imaginary);
}
