using System.Globalization;
using System.Numerics;
using System.Text;
using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Tests.Support;

namespace Boltup.Tests.Config.Planning;

/// <summary>A small bench in files: two forces, three indicators, one validation sensor, four lines; numbers from a seed.</summary>
internal sealed class BenchFolder : IDisposable
{
    private static readonly double[] Hz = [100, 110, 120, 130];
    private static readonly string[] Sensors = ["s1.z", "s2.z", "s3.z", "v1.z"];
    private static readonly string[] Forces = ["m1.z", "m2.z"];

    private readonly TemporaryFolder _folder = new();

    public BenchFolder()
    {
        Write("frf.csv", FrfTable(Sensors, Forces));
        Write("run.csv", SpectrumTable(Sensors, 5));
    }

    public DiagnosticBag Diagnostics { get; } = new();

    public string Yaml { get; set; } = """
        boltup: bench/1
        points: { m1: { at: [0 mm, 0 mm, 0 mm] }, m2: { at: [100 mm, 0 mm, 0 mm] }, s1: {}, s2: {}, s3: {}, v1: {} }
        interface: { points: [m1, m2], directions: [z] }
        installed_frf: [ { file: frf.csv, quantity: accelerance } ]
        indicators: [s1, s2, s3]
        validation: [v1]
        operations:
          run: { file: run.csv, quantity: acceleration, amplitude: rms }
        """;

    public void Write(string name, string text) => _folder.Write(name, text);

    public void Replace(string old, string with) => Yaml = Yaml.Replace(old, with, StringComparison.Ordinal);

    public string PathTo(string name) => _folder.PathTo(name);

    public static string FrfTable(string[] responses, string[] excitations, int seed = 1) => Table(
        "response,excitation", responses.SelectMany(response => excitations.Select(excitation => $"{response},{excitation}")), seed);

    public static string SpectrumTable(string[] dofs, int seed) => Table("dof", dofs, seed);

    /// <summary>Auto and cross spectra of some mechanisms, each the spectrum of a seed, of the pairs that are asked for.</summary>
    public static string CrossTable(Func<int, int, bool> isGiven, params int[] seeds)
    {
        Complex[][][] mechanisms = [.. seeds.Select(seed =>
        {
            var random = new Random(seed);
            return Sensors.Select(_ => Hz.Select(_ => new Complex(random.NextDouble() - 0.5, random.NextDouble() - 0.5)).ToArray()).ToArray();
        })];
        var text = new StringBuilder("row,column,frequency_hz,real,imag\n");
        for (int i = 0; i < Sensors.Length * Sensors.Length * Hz.Length; i++)
        {
            int row = i / Hz.Length / Sensors.Length, column = i / Hz.Length % Sensors.Length, line = i % Hz.Length;
            Complex sum = mechanisms.Aggregate(Complex.Zero, (total, each) => total + each[row][line] * Complex.Conjugate(each[column][line]));
            if (isGiven(row, column))
            {
                text.Append(CultureInfo.InvariantCulture, $"{Sensors[row]},{Sensors[column]},{Hz[line]},{sum.Real},{sum.Imaginary}\n");
            }
        }

        return text.ToString();
    }

    public BenchPlan? Plan()
    {
        Write("a.bench.yaml", Yaml);
        return BenchPlanner.Plan("a.bench.yaml", new LoadOptions { WorkingDirectory = _folder.Path }, Diagnostics);
    }

    /// <summary>The one diagnostic that is an error, or else a warning.</summary>
    public Diagnostic Worst() => Diagnostics.Items.OrderBy(item => item.Severity == Severity.Error ? 0 : item.Severity == Severity.Warning ? 1 : 2).First();

    public void Dispose() => _folder.Dispose();

    private static string Table(string key, IEnumerable<string> keys, int seed)
    {
        var random = new Random(seed);
        var text = new StringBuilder($"{key},frequency_hz,real,imag\n");
        foreach (string name in keys)
        {
            foreach (double hz in Hz)
            {
                text.Append(CultureInfo.InvariantCulture, $"{name},{hz},{random.NextDouble() + 0.1},{random.NextDouble() + 0.1}\n");
            }
        }

        return text.ToString();
    }
}
