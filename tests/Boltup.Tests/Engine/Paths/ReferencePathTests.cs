using System.Numerics;
using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Files;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Paths;

/// <summary>Contributions in the reference case against its direct finite element solution (Data/case1, see its README).</summary>
public class ReferencePathTests
{
    private const string Forces = "examples/minibus/forces/5400rpm.csv";

    /// <summary>The parts are written with ten digits and more.</summary>
    private const double Same = 1e-8;

    private const double Sum = 1e-12;

    private static readonly Dictionary<string, string> Nodes = new()
    {
        ["seat rail"] = "211.z",
        ["steering column"] = "212.x",
        ["floor"] = "213.z",
        ["driver ear"] = "291.p",
        ["passenger ear"] = "292.p",
    };

    private static readonly Lazy<PredictionResult> Predicted = new(Predict);

    [Fact]
    public void Of_Forces_AreTheTrueInstalledTransfersTimesTheTrueBlockedForces()
    {
        OperationPaths paths = Blocked.Paths!;
        Dictionary<string, Complex[]> truth = InstalledTransfers();
        Dictionary<string, Complex[]> forces = BlockedForces();
        for (int response = 0; response < Nodes.Count; response++)
        {
            PathSpectra spectra = paths.Of(response, PathView.Forces);
            Assert.Equal(12, spectra.Paths.Count);
            for (int path = 0; path < spectra.Paths.Count; path++)
            {
                string dof = spectra.Paths[path].Name.Replace("compressor.m", "", StringComparison.Ordinal);
                Complex[] transfer = truth[$"{Nodes[Blocked.Responses[response].Name]} / 10{dof}"];
                Complex[] expected = [.. transfer.Zip(forces[$"m{dof}"], (h, f) => h * f)];
                Near.Equal(expected, spectra.Contribution(path), Same);
            }
        }
    }

    [Theory]
    [InlineData(PathView.Forces)]
    [InlineData(PathView.Joints)]
    public void Of_EitherView_SumsToTheResponseAtEveryLine(PathView view)
    {
        foreach (OperationResult operation in Predicted.Value.Operations)
        {
            for (int response = 0; response < Nodes.Count; response++)
            {
                AssertSum(operation.Paths!.Of(response, view), operation.Responses[response].Values);
            }
        }
    }

    [Fact]
    public void Of_Joints_NamesThemAsTheAssemblyDoes()
    {
        string[] names = [.. Blocked.Paths!.Of(0, PathView.Joints).Paths.Select(path => path.Name)];
        Assert.Equal(12, names.Length);
        Assert.Equal(["mount 1 x", "mount 1 y", "mount 1 z", "mount 2 x"], names[..4]);
    }

    private static OperationResult Blocked => Predicted.Value.Operations.Single(operation => operation.Name == "blocked");

    /// <summary>Relative to the response where the terms do not cancel, else to the terms: their digits are all that there is.</summary>
    private static void AssertSum(PathSpectra spectra, IReadOnlyList<Complex> response)
    {
        Complex[][] terms = [.. spectra.Paths.Select((_, path) => spectra.Contribution(path))];
        for (int line = 0; line < response.Count; line++)
        {
            Complex sum = terms.Aggregate(Complex.Zero, (total, term) => total + term[line]);
            Assert.InRange(Complex.Abs(sum - response[line]) / terms.Max(term => Complex.Abs(term[line])), 0, Sum);
        }

        Complex[] sums = [.. Enumerable.Range(0, response.Count).Select(line => terms.Aggregate(Complex.Zero, (total, term) => total + term[line]))];
        Near.Equal(response, sums, Sum);
    }

    private static PredictionResult Predict()
    {
        var diagnostics = new DiagnosticBag();
        var options = new LoadOptions { AllowOutsidePaths = true };
        using AssemblyPlan plan = AssemblyPlanner.Plan(Repository.Data("case1", "constant.assembly.yaml"), options, diagnostics)!;
        return Predictor.Predict(plan.Assembly, diagnostics, withPaths: true)!;
    }

    private static Dictionary<string, Complex[]> InstalledTransfers()
    {
        using DataFile file = Open(Repository.Data("case1", "truth", "installed.unv"));
        return file.Curves.ToDictionary(curve => $"{curve.Response} / {curve.Excitation}", curve => Read(file, curve));
    }

    private static Dictionary<string, Complex[]> BlockedForces()
    {
        using DataFile file = Open(Repository.PathTo(Forces.Split('/')));
        return file.Curves.ToDictionary(curve => (curve.Response ?? curve.Excitation)!.ToString(), curve => Read(file, curve));
    }

    private static DataFile Open(string path) => DataFile.Open(path, path, new DiagnosticBag())!;

    private static Complex[] Read(DataFile file, Curve curve)
    {
        var values = new Complex[curve.Axis.Count];
        Assert.True(file.ReadSpectrum(curve, values, new DiagnosticBag()));
        return values;
    }
}
