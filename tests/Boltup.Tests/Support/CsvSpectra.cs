using System.Globalization;
using System.Numerics;

namespace Boltup.Tests.Support;

/// <summary>Reads result tables without the program's own readers.</summary>
internal static class CsvSpectra
{
    /// <summary>Complex columns by a key column, in the order of the lines.</summary>
    public static Dictionary<string, Complex[]> Read(string path, string key) => Rows(path)
        .GroupBy(row => row[key])
        .ToDictionary(group => group.Key, group => group.Select(row => new Complex(Number(row["real"]), Number(row["imag"]))).ToArray());

    /// <summary>A real column by a key column; empty fields are NaN.</summary>
    public static Dictionary<string, double[]> ReadReal(string path, string key, string column) => Rows(path)
        .GroupBy(row => row[key])
        .ToDictionary(group => group.Key, group => group.Select(row => row[column].Length == 0 ? double.NaN : Number(row[column])).ToArray());

    private static IEnumerable<Dictionary<string, string>> Rows(string path)
    {
        string[] lines = File.ReadAllLines(path);
        string[] header = lines[0].Split(',');
        return lines.Skip(1).Select(line => header.Zip(line.Split(',')).ToDictionary(pair => pair.First, pair => pair.Second));
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
