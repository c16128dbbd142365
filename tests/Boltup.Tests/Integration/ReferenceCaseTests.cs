using System.Numerics;
using System.Text.RegularExpressions;
using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Files;
using Boltup.Tests.Support;

namespace Boltup.Tests.Integration;

/// <summary>From YAML and data files to responses, against the direct finite element solution in Data/case1 (see its README).</summary>
public class ReferenceCaseTests
{
    /// <summary>The truth is written with ten digits.</summary>
    private const double Same = 1e-8;

    private static readonly Lazy<PredictionResult> Constant = new(() => Predict("constant"));
    private static readonly Lazy<PredictionResult> Tabled = new(() => Predict("tabled"));
    private static readonly Lazy<PredictionResult> BodyAlone = new(() => Predict("body-alone"));

    [Fact]
    public void InternalForces_OnTheCoupledAssembly_GiveTheTrueResponses()
    {
        AssertResponses("response", Constant.Value, "internal", Same);
        AssertResponses("response-tabled", Tabled.Value, "internal", Same);
    }

    [Fact]
    public void BlockedForces_OnTheCoupledAssembly_GiveTheTrueResponses()
    {
        AssertResponses("response", Constant.Value, "blocked", Same);
        AssertResponses("response-tabled", Tabled.Value, "blocked", Same);
    }

    [Fact]
    public void JointForces_OfTheCoupledAssembly_AreTheTrueMountForces()
    {
        foreach (string operation in new[] { "internal", "blocked" })
        {
            Near.Equal(Truth("contact"), JointForces(Constant.Value, operation), Same);
            Near.Equal(Truth("contact-tabled"), JointForces(Tabled.Value, operation), Same);
        }
    }

    [Fact]
    public void ContactForces_OnTheBodyAlone_GiveTheTrueResponses() => AssertResponses("response", BodyAlone.Value, "contact", Same);

    [Fact]
    public void ContactForces_OnTheCoupledAssembly_AreWrong() => AssertWrong(Constant.Value, "contact on coupled");

    [Fact]
    public void BlockedForces_OnTheBodyAlone_AreWrong() => AssertWrong(BodyAlone.Value, "blocked");

    [Fact]
    public void ContactForcesOfTheBench_OnTheBodyAlone_AreWrong() => AssertWrong(BodyAlone.Value, "bench contact", 0.4);

    /// <summary>
    /// The whole vehicle turned by a quarter about z and moved: a stiffness along x is then one along y, while a vertical acceleration and
    /// the sound at the ears do not change. The response along x becomes one along y.
    /// </summary>
    [Fact]
    public void BlockedForces_OnTheTurnedAssembly_GiveTheSameResponses()
    {
        string folder = Repository.Data("case1");
        string placed = "turned: { about: z, by: 90 deg }, moved: [2 m, 1 m, 0.5 m] }";
        string text = File.ReadAllText(Path.Combine(folder, "constant.assembly.yaml"))
            .Replace("compressor: ../../../../configs/parts/compressor.part.yaml", $"compressor: {{ file: compressor.part.yaml, {placed}", StringComparison.Ordinal)
            .Replace("body: ../../../../configs/parts/body.part.yaml", $"body: {{ file: body.part.yaml, {placed}", StringComparison.Ordinal)
            .Replace("compressor.part.yaml", Repository.PathTo("configs", "parts", "compressor.part.yaml"), StringComparison.Ordinal)
            .Replace("body.part.yaml", Repository.PathTo("configs", "parts", "body.part.yaml"), StringComparison.Ordinal)
            .Replace("file: ../../../../", $"file: {Repository.Root}/", StringComparison.Ordinal)
            .Replace("file: forces/", $"file: {folder}/forces/", StringComparison.Ordinal)
            .Replace("steering_column.x", "steering_column.y", StringComparison.Ordinal);
        text = Regex.Replace(text, @"\{ x: ([^,]+), y: ([^,]+),", "{ x: $2, y: $1,");
        using var temporary = new TemporaryFolder();
        PredictionResult turned = PredictFile(temporary.Write("turned.assembly.yaml", text));

        // By the right-hand rule the part's x points along the assembly's y.
        AssertResponses("response", turned, "blocked", Same);
    }

    private static PredictionResult Predict(string name) => PredictFile(Repository.Data("case1", $"{name}.assembly.yaml"));

    private static PredictionResult PredictFile(string path)
    {
        var diagnostics = new DiagnosticBag();
        using AssemblyPlan? plan = AssemblyPlanner.Plan(path, new LoadOptions { AllowOutsidePaths = true }, diagnostics);
        PredictionResult? result = plan is null ? null : Predictor.Predict(plan.Assembly, diagnostics);
        Assert.True(result is not null, string.Join("\n", diagnostics.Items.Select(item => $"{item.Span}: {item.Message}")));
        return result;
    }

    private static OperationResult Operation(PredictionResult result, string name) => result.Operations.Single(operation => operation.Name == name);

    private static Complex[] Responses(PredictionResult result, string operation) =>
        [.. Operation(result, operation).Responses.SelectMany(response => response.Values)];

    private static Complex[] JointForces(PredictionResult result, string operation) =>
        [.. Operation(result, operation).JointForces.SelectMany(force => force.Values)];

    private static void AssertResponses(string truth, PredictionResult result, string operation, double tolerance)
    {
        OperationResult found = Operation(result, operation);
        Complex[] expected = Truth(truth);
        int lines = found.Axis.Count;
        for (int i = 0; i < found.Responses.Count; i++)
        {
            Near.Equal(expected[(i * lines)..((i + 1) * lines)], [.. found.Responses[i].Values], tolerance);
        }
    }

    private static void AssertWrong(PredictionResult result, string operation, double least = 0.1) =>
        Assert.True(Near.RelativeError(Truth("response"), Responses(result, operation)) > least);

    /// <summary>All spectra of a truth file, one after the other in the order of the file.</summary>
    private static Complex[] Truth(string name)
    {
        var diagnostics = new DiagnosticBag();
        string path = Repository.Data("case1", "truth", $"{name}.csv");
        using DataFile file = DataFile.Open(path, path, diagnostics)!;
        var all = new List<Complex>();
        foreach (Curve curve in file.Curves)
        {
            var values = new Complex[curve.Axis.Count];
            Assert.True(file.ReadSpectrum(curve, values, diagnostics));
            all.AddRange(values);
        }

        return [.. all];
    }
}
