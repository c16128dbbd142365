using System.Numerics;
using System.Runtime.InteropServices;

namespace Boltup.Files.UniversalFile;

/// <summary>Whether numbers are all finite: x − x is 0 for those, and NaN for NaN and infinities.</summary>
internal static class FiniteCheck
{
    public static bool AreFinite(ReadOnlySpan<double> numbers)
    {
        ReadOnlySpan<Vector<double>> vectors = MemoryMarshal.Cast<double, Vector<double>>(numbers);
        Vector<double> differences = Vector<double>.Zero;
        foreach (Vector<double> vector in vectors)
        {
            differences += vector - vector;
        }

        double sum = Vector.Sum(differences);
        foreach (double number in numbers[(vectors.Length * Vector<double>.Count)..])
        {
            sum += number - number;
        }

        return sum == 0;
    }
}
