using System.Numerics;
using System.Text.Json;
using Boltup.Engine.Diagnostics;
using Boltup.Files;
using Boltup.Files.Csv;
using Boltup.Tests.Support;

namespace Boltup.Tests.Cli;

/// <summary>
/// From the bench of the reference case to the vehicle of the reference case, through every file: the truth comes from an independent
/// finite element program (see Data/bench/README.md and Data/case1/README.md).
/// </summary>
public sealed class IdentifyCommandTests : IDisposable
{
    private static readonly string Truth = Repository.Data("case1", "truth", "response.csv");

    private static readonly string Clean = Repository.Data("bench", "clean.bench.yaml");
    private static readonly string Noisy = Repository.PathTo("configs", "supplier.bench.yaml");

    private readonly TemporaryFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    /// <summary>The data are stored in single precision.</summary>
    [Fact]
    public void Identify_CleanBench_TransfersToTheVehicle()
    {
        CommandRun run = Identify(Clean);
        Assert.Equal(0, run.ExitCode);
        Dictionary<string, Complex[]> predicted = PredictVehicle("running");
        foreach ((string dof, Complex[] truth) in CsvSpectra.Read(Truth, "dof"))
        {
            Near.Equal(truth, predicted[dof], 1e-5);
        }
    }

    /// <summary>Noisy data: two percent over all responses and 0.15 dB in level, although single forces are far off.</summary>
    [Fact]
    public void Identify_NoisyBench_TransfersWithinTwoPercent()
    {
        Assert.Equal(0, Identify(Noisy).ExitCode);
        Dictionary<string, Complex[]> predicted = PredictVehicle("5400 rpm");
        foreach ((string dof, Complex[] truth) in CsvSpectra.Read(Truth, "dof"))
        {
            Assert.InRange(Near.RelativeError(truth, predicted[dof]), 1e-4, 0.02);
            double levelDb = 10 * Math.Log10(predicted[dof].Sum(Power) / truth.Sum(Power));
            Assert.InRange(levelDb, -0.15, 0.15);
        }

        using JsonDocument summary = JsonDocument.Parse(File.ReadAllText(_folder.PathTo("out", "summary.json")));
        JsonElement validations = summary.RootElement.GetProperty("validations");
        Assert.InRange(validations[0].GetProperty("relative_error").GetDouble(), 1e-4, 5e-3);
        Assert.Equal("transfer", validations[1].GetProperty("check").GetString());
        Assert.InRange(validations[1].GetProperty("relative_error").GetDouble(), 1e-4, 0.02);
    }

    [Fact]
    public void Identify_CleanBench_SaysWhichCheckWasMade()
    {
        CommandRun run = Identify(Clean);
        Assert.Contains("on-board validation at 6 dofs that took no part", run.Out, StringComparison.Ordinal);
        Assert.Contains("does not show that the forces hold on another receiver", run.Out, StringComparison.Ordinal);
        using JsonDocument summary = JsonDocument.Parse(File.ReadAllText(_folder.PathTo("out", "summary.json")));
        JsonElement validation = summary.RootElement.GetProperty("validations")[0];
        Assert.InRange(validation.GetProperty("relative_error").GetDouble(), 0, 1e-4);
        Assert.Equal("on board", validation.GetProperty("check").GetString());
    }

    /// <summary>The free-velocity route finds the blocked forces; sensors under the mounts find contact forces, which are something else.</summary>
    [Fact]
    public void Identify_OtherRoutes_AreComparedUnderTheirOwnNames()
    {
        Identify(Clean);
        using JsonDocument summary = JsonDocument.Parse(File.ReadAllText(_folder.PathTo("out", "summary.json")));
        Dictionary<string, JsonElement> routes = summary.RootElement.GetProperty("routes").EnumerateArray().ToDictionary(route => route.GetProperty("name").GetString()!);
        Assert.Equal("blocked forces", routes["hung free"].GetProperty("finds").GetString());
        Assert.InRange(routes["hung free"].GetProperty("relative_difference_from_in_situ").GetDouble(), 0, 1e-3);
        Assert.Equal("contact forces of this bench", routes["force sensors"].GetProperty("finds").GetString());
        Assert.True(routes["force sensors"].GetProperty("relative_difference_from_in_situ").GetDouble() > 0.1);
    }

    /// <summary>The bench as an assembly says the contact forces before they are measured: those of the finite element program.</summary>
    [Fact]
    public void Identify_BenchAsAssembly_PredictsTheMeasuredContactForces()
    {
        Identify(Clean);
        Dictionary<string, double[]> ratios = CsvSpectra.ReadReal(_folder.PathTo("out", "bench_stiffness.csv"), "dof", "contact_to_blocked_db");
        Dictionary<string, Complex[]> blocked = CsvSpectra.Read(_folder.PathTo("out", "blocked_forces", "running.csv"), "dof");
        foreach ((string dof, Complex[] contact) in CsvSpectra.Read(Repository.Data("bench", "bench_contact_true.csv"), "dof"))
        {
            string source = $"m{dof[2]}{dof[3..]}";
            double[] found = [.. blocked[source].Zip(ratios[source], (force, ratio) => force.Magnitude * Math.Pow(10, ratio / 20))];
            double error = Math.Sqrt(found.Zip(contact, (f, c) => Math.Pow(f - c.Magnitude, 2)).Sum() / contact.Sum(c => c.Magnitude * c.Magnitude));
            Assert.True(error < 1e-4, $"{dof}: {error}");
        }
    }

    /// <summary>
    /// Two runs without a common phase, one the spectra of the bench and one twice as strong in other phases: the cabin gets √((1 + 4)/2) times
    /// the magnitude, through G_ff in the handover.
    /// </summary>
    [Fact]
    public void Identify_RunsWithFreePhase_TransferAsCrossSpectra()
    {
        string bench = File.ReadAllText(Clean).Replace("file: bench_operation_clean.unv", $"runs: [{Repository.Data("bench", "bench_operation_clean.unv")}, twice.csv], phase: free, quantity: acceleration", StringComparison.Ordinal);
        bench = bench[..bench.IndexOf("model:", StringComparison.Ordinal)].Replace("bench_insitu", Repository.Data("bench", "bench_insitu"), StringComparison.Ordinal);
        string path = _folder.Write("free.bench.yaml", bench);
        _folder.Write("twice.csv", Turned(Repository.Data("bench", "bench_operation_clean.unv"), new Complex(1.2, 1.6)));
        CommandRun run = CommandRun.Of("identify", path, "-o", _folder.PathTo("out"), "--no-pictures", "--allow-outside");
        Assert.True(run.ExitCode == 0, run.Error);
        Dictionary<string, Complex[]> predicted = PredictVehicle("running");
        foreach ((string dof, Complex[] truth) in CsvSpectra.Read(Truth, "dof"))
        {
            Near.Equal([.. truth.Select(value => (Complex)(Math.Sqrt(2.5) * value.Magnitude))], predicted[dof], 1e-4);
        }
    }

    /// <summary>Motion of both ends of the mounts times their stiffness: the contact forces of the finite element program, found from the prediction.</summary>
    [Fact]
    public void Identify_MountStiffnessRoute_FindsTheContactForces()
    {
        string both = _folder.Write("both.assembly.yaml", $$"""
            boltup: assembly/1
            based_on: {{Repository.PathTo("configs", "bench.assembly.yaml")}}
            operations:
              running: { amplitude: rms, applied_forces: { file: {{Repository.Data("case1", "forces", "internal.csv")}}, part: compressor } }
            responses:
            {{string.Join('\n', MountEnds().Select(end => $"  {end}: {{ at: {(end[0] == 'm' ? "compressor" : "bench")}.{end} }}"))}}
            """);
        Assert.Equal(0, CommandRun.Of("predict", both, "-o", _folder.PathTo("both"), "--no-pictures", "--allow-outside").ExitCode);
        string[] rows = File.ReadAllLines(_folder.PathTo("both", "responses.csv"));
        _folder.Write("both.csv", "dof,frequency_hz,real,imag\n" + string.Concat(rows.Skip(1).Select(row => string.Join(',', row.Split(',')[1..5]) + "\n")));
        string bench = File.ReadAllText(Clean)
            .Replace("bench_", Repository.Data("bench") + "/bench_", StringComparison.Ordinal)
            .Replace("../../../../configs", Repository.PathTo("configs"), StringComparison.Ordinal);
        bench = bench[..bench.IndexOf("routes:", StringComparison.Ordinal)]
            + "routes:\n  mounts: { method: mount_stiffness, operations: { running: { file: both.csv, quantity: acceleration, amplitude: rms } } }\n";
        CommandRun run = CommandRun.Of("identify", _folder.Write("mounts.bench.yaml", bench), "-o", _folder.PathTo("out"), "--no-pictures", "--allow-outside");
        Assert.True(run.ExitCode == 0, run.Error);
        Dictionary<string, Complex[]> found = CsvSpectra.Read(_folder.PathTo("out", "routes", "mounts-running.csv"), "dof");
        foreach ((string dof, Complex[] contact) in CsvSpectra.Read(Repository.Data("bench", "bench_contact_true.csv"), "dof"))
        {
            Near.Equal(contact, found[$"m{dof[2]}{dof[3..]}"], 1e-4);
        }
    }

    private static IEnumerable<string> MountEnds() =>
        "mb".SelectMany(side => Enumerable.Range(1, 4).SelectMany(i => "xyz".Select(direction => $"{side}{i}.{direction}")));

    [Fact]
    public void Identify_UniversalFileAsked_WritesTheSameForces()
    {
        Identify(Clean, "--uff");
        File.WriteAllText(_folder.PathTo("vehicle.assembly.yaml"), Vehicle("out/blocked_forces/running.uff, part: compressor"));
        Dictionary<string, Complex[]> fromUniversal = Predict();
        File.WriteAllText(_folder.PathTo("vehicle.assembly.yaml"), Vehicle("out/blocked_forces/running.csv, part: compressor"));
        Assert.All(Predict(), response => Near.Equal(response.Value, fromUniversal[response.Key], 1e-14));
    }

    [Fact]
    public void Identify_Twice_GivesTheSameBytes()
    {
        Identify(Noisy);
        Directory.Move(_folder.PathTo("out"), _folder.PathTo("first"));
        Identify(Noisy);
        foreach (string file in Directory.EnumerateFiles(_folder.PathTo("first"), "*", SearchOption.AllDirectories))
        {
            Assert.Equal(File.ReadAllBytes(file), File.ReadAllBytes(file.Replace(_folder.PathTo("first"), _folder.PathTo("out"), StringComparison.Ordinal)));
        }
    }

    private CommandRun Identify(string bench, params string[] more) =>
        CommandRun.Of(["identify", bench, "-o", _folder.PathTo("out"), "--no-pictures", .. more]);

    private Dictionary<string, Complex[]> PredictVehicle(string operation)
    {
        File.WriteAllText(_folder.PathTo("vehicle.assembly.yaml"), Vehicle($"out/source.forces.yaml, operation: {operation}, part: compressor"));
        return Predict();
    }

    /// <summary>The spectra of a file, multiplied, as a CSV.</summary>
    private static string Turned(string path, Complex factor)
    {
        using DataFile file = DataFile.Open(path, path, new DiagnosticBag())!;
        using var text = new StringWriter();
        CsvWriter.WriteSpectra(text, file.Curves[0].Axis, file.Curves.Select(curve =>
        {
            var values = new Complex[curve.Axis.Count];
            file.ReadSpectrum(curve, values, new DiagnosticBag());
            return (curve.Response!, values.Select(value => factor * value).ToArray());
        }));
        return text.ToString();
    }

    private static string Vehicle(string forces) => $$"""
        boltup: assembly/1
        based_on: {{Repository.Data("case1", "constant.assembly.yaml")}}
        operations:
          internal: ~
          blocked: ~
          contact on coupled: ~
          running: { amplitude: rms, blocked_forces: { file: {{forces}} } }
        """;

    /// <summary>Responses under the names of the truth.</summary>
    private Dictionary<string, Complex[]> Predict()
    {
        CommandRun run = CommandRun.Of(
            "predict", _folder.PathTo("vehicle.assembly.yaml"), "-o", _folder.PathTo("vehicle"), "--no-pictures", "--allow-outside");
        Assert.True(run.ExitCode == 0, run.Error);
        Dictionary<string, string> dofs = new()
        {
            ["seat rail"] = "seat_rail.z",
            ["steering column"] = "steering_column.x",
            ["floor"] = "floor.z",
            ["driver ear"] = "driver_ear.p",
            ["passenger ear"] = "passenger_ear.p",
        };
        return CsvSpectra.Read(_folder.PathTo("vehicle", "responses.csv"), "response").ToDictionary(response => dofs[response.Key], response => response.Value);
    }

    private static double Power(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;
}
