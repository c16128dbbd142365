using System.Globalization;
using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;
using Boltup.Files;
using Boltup.Files.UniversalFile;

namespace Boltup.Benchmarks.Files;

/// <summary>
/// Rates of opening a file and reading every curve on one thread, next to a plain reader of lines in the same run. Seconds are those of
/// the processor, so that other work on the machine counts little.
/// </summary>
public static class FileRates
{
    private const int FileBytes = 50 << 20;
    private const int Lines = 4000;
    private const int Repetitions = 10;
    private const double Mega = 1e6;

    /// <summary>Prints MB/s for ASCII 58 and 58b and the ratio to a line reader with <c>double.Parse</c> on the same ASCII file.</summary>
    public static void Run(TextWriter output)
    {
        string folder = Directory.CreateTempSubdirectory().FullName;
        try
        {
            string text = Write(folder, new UniversalFileStorage(IsBinary: false));
            double plain = Rate(text, ReadPlainly);
            output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"plain line reader      {plain,8:F0} MB/s"));
            Print(output, "ASCII 58 double", text, plain);
            Print(output, "ASCII 58 single", Write(folder, new UniversalFileStorage(IsBinary: false, IsDouble: false)), plain);
            Print(output, "58b double", Write(folder, new UniversalFileStorage()), plain);
            Print(output, "58b double big-endian", Write(folder, new UniversalFileStorage(IsBigEndian: true)), plain);
            Print(output, "58b single", Write(folder, new UniversalFileStorage(IsDouble: false)), plain);
        }
        finally
        {
            Directory.Delete(folder, recursive: true);
        }
    }

    private static void Print(TextWriter output, string name, string path, double plain)
    {
        double rate = Rate(path, ReadAll);
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"{name,-22} {rate,8:F0} MB/s  x{rate / plain:F1}"));
    }

    private static double Rate(string path, Func<string, double> read)
    {
        double best = double.PositiveInfinity;
        for (int i = 0; i < Repetitions; i++)
        {
            TimeSpan start = Environment.CpuUsage.TotalTime;
            _ = read(path);
            best = Math.Min(best, (Environment.CpuUsage.TotalTime - start).TotalSeconds);
        }

        return new FileInfo(path).Length / best / Mega;
    }

    private static double ReadAll(string path)
    {
        var diagnostics = new DiagnosticBag();
        using DataFile file = DataFile.Open(path, path, diagnostics)!;
        var values = new Complex[Lines];
        double sum = 0;
        foreach (Curve curve in file.Curves)
        {
            file.ReadSpectrum(curve, values, diagnostics);
            sum += values[^1].Real;
        }

        return sum;
    }

    private static double ReadPlainly(string path)
    {
        double sum = 0;
        foreach (string line in File.ReadLines(path))
        {
            for (int start = 0; line.Length == 80 && start < 80 && line[^4] == 'E'; start += 20)
            {
                sum += double.Parse(line.AsSpan(start, 20), CultureInfo.InvariantCulture);
            }
        }

        return sum;
    }

    private static string Write(string folder, UniversalFileStorage storage)
    {
        string path = Path.Combine(folder, $"{storage.GetHashCode():X}.unv");
        FrequencyAxis axis = FrequencyAxis.Even(20, 0.5, Lines);
        Complex[] values = Values();
        using FileStream stream = File.Create(path, 1 << 20);
        var writer = new UniversalFileWriter(stream);
        for (int curve = 0; stream.Position < FileBytes; curve++)
        {
            writer.WriteFunction(CurveOf(axis, curve), values, storage);
        }

        return path;
    }

    private static Complex[] Values()
    {
        var random = new Random(1);
        return [.. Enumerable.Range(0, Lines).Select(_ => new Complex(Number(random), Number(random)))];
    }

    private static double Number(Random random) => (random.NextDouble() - 0.5) * Math.Pow(10, random.Next(-5, 3));

    private static Curve CurveOf(FrequencyAxis axis, int index) => new()
    {
        Index = index,
        Kind = FunctionKind.Frf,
        Response = new Dof((index + 1).ToString(CultureInfo.InvariantCulture), Direction.Z),
        Excitation = new Dof("101", Direction.X),
        ResponseQuantity = Quantity.Acceleration,
        ExcitationQuantity = Quantity.Force,
        Axis = axis,
        Title = "Invented",
        Span = new SourceSpan(""),
    };
}
