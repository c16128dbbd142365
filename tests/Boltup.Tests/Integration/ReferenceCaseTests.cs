using System.Numerics;
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

    /// <summary>The third wrong combination: what the mounts exert in one assembly, taken for another one with other mounts.</summary>
    [Fact]
    public void ContactForcesOfOtherMounts_AreWrong() =>
        Assert.True(Near.RelativeError(Truth("contact-tabled"), JointForces(Constant.Value, "blocked")) > 0.1);

    private static PredictionResult Predict(string name)
    {
        var diagnostics = new DiagnosticBag();
        using AssemblyPlan? plan = AssemblyPlanner.Plan(
            Repository.Data("case1", $"{name}.assembly.yaml"), new LoadOptions(), diagnostics);
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

    private static void AssertWrong(PredictionResult result, string operation) =>
        Assert.True(Near.RelativeError(Truth("response"), Responses(result, operation)) > 0.1);

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
