using System.Numerics;

namespace Boltup.Tests.Support;

/// <summary>Comparison of complex numbers and spectra by relative error.</summary>
internal static class Near
{
    public static void Equal(Complex expected, Complex actual, double relative)
    {
        double error = Complex.Abs(actual - expected) / Complex.Abs(expected);
        Assert.True(error <= relative, FormattableString.Invariant($"expected {expected}, found {actual}: relative error {error:E2} > {relative:E1}"));
    }

    public static void Equal(IReadOnlyList<Complex> expected, IReadOnlyList<Complex> actual, double relative)
    {
        double error = RelativeError(expected, actual);
        Assert.True(error <= relative, FormattableString.Invariant($"relative error {error:E2} > {relative:E1}"));
    }

    /// <summary>‖actual − expected‖₂ / ‖expected‖₂ over all lines.</summary>
    public static double RelativeError(IReadOnlyList<Complex> expected, IReadOnlyList<Complex> actual)
    {
        Assert.Equal(expected.Count, actual.Count);
        double difference = expected.Zip(actual, (e, a) => Square(a - e)).Sum();
        return Math.Sqrt(difference / expected.Sum(Square));
    }

    private static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;
}
