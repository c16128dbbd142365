namespace Boltup.Files.UniversalFile;

/// <summary>
/// Whether numbers are all finite: x − x is 0 for those, and NaN for NaN and infinities. Plain code with four sums side by side, because
/// vectors as wide as the machine's are compiled at start-up, which costs more than they save.
/// </summary>
internal static class FiniteCheck
{
    public static bool AreFinite(ReadOnlySpan<double> numbers)
    {
        (double a, double b, double c, double d) = (0, 0, 0, 0);
        while (numbers.Length >= 4)
        {
            a += numbers[0] - numbers[0];
            b += numbers[1] - numbers[1];
            c += numbers[2] - numbers[2];
            d += numbers[3] - numbers[3];
            numbers = numbers[4..];
        }

        foreach (double number in numbers)
        {
            a += number - number;
        }

        return a + b + c + d == 0;
    }
}
