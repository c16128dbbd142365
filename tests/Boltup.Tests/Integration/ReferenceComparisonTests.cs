using System.Numerics;
using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Comparing;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Files;
using Boltup.Tests.Support;
using MathNet.Numerics.Integration;

namespace Boltup.Tests.Integration;

/// <summary>Constant against tabled mounts, both against the direct finite element solution in Data/case1 (see its README).</summary>
public class ReferenceComparisonTests
{
    private const int Nodes = 20;

    /// <summary>In dB; it shrinks with more nodes.</summary>
    private const double QuadratureError = 1e-5;

    private static readonly Lazy<ComparedPredictions> Forth = new(() => Compare("constant", "tabled"));

    [Fact]
    public void Compare_ConstantAndTabledMounts_FindsTheTrueChangeOfEveryLevel()
    {
        double[] before = TrueLevels("response"), after = TrueLevels("response-tabled");
        ResponseChange[] blocked = Blocked(Forth.Value);
        Assert.Equal(before.Length, blocked.Length);
        for (int i = 0; i < blocked.Length; i++)
        {
            Assert.Equal(after[i] - before[i], blocked[i].Overall.Decibels, 1e-6);
        }
    }

    /// <summary>
    /// The change is some dB, far beyond what one derivative tells. Integrated over all mounts from the constant to the tabled ones the derivative
    /// is the true change of every level, by Gauss–Legendre quadrature.
    /// </summary>
    [Fact]
    public void FirstOrderEffects_IntegratedBetweenTheTrueAnswers_GiveTheTrueChange()
    {
        double[] before = TrueLevels("response"), after = TrueLevels("response-tabled");
        double[] sums = new double[before.Length];
        var diagnostics = new DiagnosticBag();
        using AssemblyPlan constant = Plan("constant", diagnostics), tabled = Plan("tabled", diagnostics);
        var rule = new GaussLegendreRule(0, 1, Nodes);
        for (int node = 0; node < Nodes; node++)
        {
            double share = rule.Abscissas[node];
            ComparedPredictions compared = AssemblyComparer.Compare(
                Blended(constant.Assembly, tabled.Assembly, share), Blended(constant.Assembly, tabled.Assembly, share + 1), diagnostics)!;
            for (int i = 0; i < sums.Length; i++)
            {
                sums[i] += rule.Weights[node] * Blocked(compared)[i].LinearDecibels;
            }
        }

        for (int i = 0; i < sums.Length; i++)
        {
            Assert.Equal(after[i] - before[i], sums[i], QuadratureError);
        }
    }

    /// <summary>The first assembly with a share of the way to the second in every mount.</summary>
    private static AssemblyModel Blended(AssemblyModel first, AssemblyModel second, double share) => first with
    {
        Joints = [.. first.Joints.Zip(second.Joints, (one, other) =>
            Joint.Through(new BlendedMount(one.Mount!, other.Mount!, share), one.Name, one.First, one.Second))],
    };

    private static ResponseChange[] Blocked(ComparedPredictions compared) => [.. compared.Responses.Where(response => response.Operation == "blocked")];

    private static ComparedPredictions Compare(string before, string changed)
    {
        var diagnostics = new DiagnosticBag();
        using AssemblyPlan one = Plan(before, diagnostics), other = Plan(changed, diagnostics);
        return AssemblyComparer.Compare(one.Assembly, other.Assembly, diagnostics)!;
    }

    private static AssemblyPlan Plan(string name, DiagnosticBag diagnostics) => AssemblyPlanner.Plan(
        Repository.Data("case1", $"{name}.assembly.yaml"), new LoadOptions { AllowOutsidePaths = true }, diagnostics)!;

    /// <summary>Overall levels of a truth file, in dB re 1, in the order of the file.</summary>
    private static double[] TrueLevels(string name)
    {
        var diagnostics = new DiagnosticBag();
        string path = Repository.Data("case1", "truth", $"{name}.csv");
        using DataFile file = DataFile.Open(path, path, diagnostics)!;
        return [.. file.Curves.Select(curve =>
        {
            var values = new Complex[curve.Axis.Count];
            Assert.True(file.ReadSpectrum(curve, values, diagnostics));
            return 10 * Math.Log10(values.Sum(value => Math.Pow(Complex.Abs(value), 2)));
        })];
    }

    /// <summary>On the way from one mount to another, or beyond it.</summary>
    private sealed class BlendedMount(MountLaw first, MountLaw second, double share) : MountLaw
    {
        public override IReadOnlyList<Direction> Directions => first.Directions;

        public override bool IsDiagonal => first.IsDiagonal && second.IsDiagonal;

        public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
        {
            double[] other = new double[Order * Order * Tiling.EntryLength];
            first.FillStiffness(axis, tile, stiffness);
            second.FillStiffness(axis, tile, other);
            for (int i = 0; i < other.Length; i++)
            {
                stiffness[i] += share * (other[i] - stiffness[i]);
            }
        }
    }
}
