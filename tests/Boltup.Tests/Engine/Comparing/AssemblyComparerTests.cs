using System.Numerics;
using Boltup.Engine.Comparing;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Parts;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Engine.Sensitivity;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Comparing;

public class AssemblyComparerTests
{
    /// <summary>Small enough that what is left out, of second order, is far below a thousandth of the change.</summary>
    private const double Small = 1e-6;

    private const double FirstOrder = 1e-3;

    [Fact]
    public void Compare_Levels_AreThoseOfTheTwoPredictions()
    {
        AssemblyModel before = Triaxial.Of(), changed = Triaxial.Of(Softer());
        ComparedPredictions compared = Compare(before, changed);
        Assert.Equal(2, compared.Responses.Count);
        for (int i = 0; i < 2; i++)
        {
            ResponseChange response = compared.Responses[i];
            Assert.Equal(Power(before, i), response.Overall.BasePower, 1e-12 * response.Overall.BasePower);
            Assert.Equal(Power(changed, i), response.Overall.ChangedPower, 1e-12 * response.Overall.ChangedPower);

            // Every line has its whole cell inside the bands, so they share out all of the power.
            Assert.Equal(response.Overall.BasePower, response.Bands.Sum(band => band.Level.BasePower), 1e-12 * response.Overall.BasePower);
        }
    }

    [Fact]
    public void Compare_Itself_ChangesNothing()
    {
        AssemblyModel before = Triaxial.Of();
        ComparedPredictions compared = Compare(before, before with { Title = "copy" });
        Assert.All(compared.Responses, response => Assert.Equal(0, response.Overall.Decibels));
        Assert.All(compared.Responses, response => Assert.Empty(response.Causes));
        Assert.Empty(compared.NotCompared.Concat(compared.NotAttributed));
    }

    [Fact]
    public void Compare_SmallChangeOfAMount_IsAttributedToIt()
    {
        var changed = new GrownMount(Triaxial.Springs(), Direction.Y, Small, lossOnly: false);
        AssertAttributed(Compare(Triaxial.Of(), Triaxial.Of(changed)), "mount m");
    }

    [Fact]
    public void Compare_SmallChangeOfAPart_IsAttributedToIt() =>
        AssertAttributed(Compare(Triaxial.Of(), Triaxial.Of(row: ("receiver", "2", "y", 1 + Small))), "part source", "part receiver");

    [Fact]
    public void Compare_SmallChangeOfAForce_IsAttributedToTheForces() =>
        AssertAttributed(Compare(Shared(), Shared() with { Operations = Triaxial.Of(force: 1 + Small).Operations }), "forces");

    [Fact]
    public void Compare_SeveralSmallChanges_AddUp()
    {
        AssemblyModel changed = Triaxial.Of(new GrownMount(Triaxial.Springs(), Direction.Z, Small, lossOnly: false), 1 - Small) with { Parts = Shared().Parts };
        ComparedPredictions compared = Compare(Shared(), changed);
        AssertAttributed(compared, "forces", "mount m");
        Assert.All(compared.Responses, response => Assert.Equal(2, response.Causes.Count));
    }

    [Fact]
    public void Compare_AnotherMountAtOneJoint_IsAttributedToTheJoint()
    {
        AssemblyModel before = Shared();
        Joint other = Joint.Through(Softer(), "1", before.Joints[0].First, before.Joints[0].Second) with { MountName = "softer" };
        ComparedPredictions compared = Compare(before, before with { Joints = [other, before.Joints[1]] });
        Assert.All(compared.Responses, response => Assert.Equal(["joint 1"], response.Causes.Select(cause => cause.Cause)));
    }

    [Fact]
    public void Compare_RemovedJoint_IsComparedAndNotAttributed()
    {
        AssemblyModel before = Shared() with { Operations = [Applied(Shared().Operations[0])] };
        ComparedPredictions compared = Compare(before, before with { Joints = [before.Joints[0]] });
        Assert.Contains("joint 2 was removed", compared.NotAttributed);
        Assert.All(compared.Responses, response => Assert.NotEqual(0, response.Overall.Decibels));
    }

    [Fact]
    public void Compare_Paths_HaveThePowersOfTheContributions()
    {
        AssemblyModel before = Triaxial.Of();
        ComparedPredictions compared = Compare(before, Triaxial.Of(Softer()));
        OperationResult result = Predictor.Predict(before, new DiagnosticBag(), withPaths: true)!.Operations[0];
        foreach (ResponseChange response in compared.Responses)
        {
            IReadOnlyList<RankedPath> ranked = result.RankedPaths.First(paths => paths.Response == response.Response && paths.View == PathView.Joints).Overall.Paths;
            Assert.Equal(ranked.Select(path => path.Path.Name).Order(), response.Paths.Select(path => path.Path).Order());
            Assert.All(ranked, path => Assert.Equal(path.Power, response.Paths.Single(other => other.Path == path.Path.Name).Level.BasePower, 1e-12 * path.Power));
            double[] moved = [.. response.Paths.Select(path => Math.Abs(path.Level.ChangedPower - path.Level.BasePower))];
            Assert.Equal(moved.OrderDescending(), moved);
        }
    }

    [Fact]
    public void Compare_ForcesOnThePartOfTheResponse_ArePathsToo()
    {
        AssemblyModel before = Direct(1e5);
        IReadOnlyList<RankedPath> ranked = Predictor.Predict(before, new DiagnosticBag(), withPaths: true)!.Operations[0]
            .RankedPaths.First(paths => paths.View == PathView.Joints).Overall.Paths;
        PathChange found = Compare(before, Direct(2e5)).Responses[0].Paths.Single(path => path.Path == "forces on receiver");
        double power = ranked.Single(path => path.Path.Name == found.Path).Power;
        Assert.Equal(power, found.Level.BasePower, 1e-12 * power);
    }

    [Fact]
    public void Compare_OtherResponses_ComparesWhatBothHave()
    {
        AssemblyModel before = Triaxial.Of();
        AssemblyModel changed = before with { Responses = [before.Responses[0], before.Responses[1] with { Name = "nearer" }] };
        ComparedPredictions compared = Compare(before, changed);
        Assert.Equal("far", Assert.Single(compared.Responses).Response);
        Assert.Equal(["only the base has response `near` in m/s", "only the changed assembly has response `nearer` in m/s"], compared.NotCompared);
    }

    [Fact]
    public void Compare_OtherLines_ComparesTheSharedOnes()
    {
        AssemblyModel before = Triaxial.Of();
        FrequencyAxis fewer = Triaxial.Axis.Within(0, 80)!;
        ComparedPredictions compared = Compare(before, before with { Axis = fewer });
        Assert.Equal([$"operation `run` is compared on the {fewer.Count} lines that both sides have"], compared.NotCompared);
        Assert.All(compared.Responses, response => Assert.Equal(0, response.Overall.Decibels, 1e-9));
    }

    [Fact]
    public void Compare_SharedPart_IsReadOnce()
    {
        var counting = new CountingPart(Triaxial.Of().Parts[1].Model);
        PlacedPart receiver = new("receiver", counting, [], Boltup.Engine.Geometry.Rotation.None, Boltup.Engine.Geometry.Vector3d.Zero);
        AssemblyModel before = Triaxial.Of() with { Parts = [Triaxial.Of().Parts[0], receiver] };
        Compare(before, Triaxial.Of(Softer()) with { Parts = before.Parts });
        Assert.Equal(1, counting.Evaluations);
    }

    [Fact]
    public void Compare_WarningOfBothSides_IsSaidOnce()
    {
        var diagnostics = new DiagnosticBag();
        AssemblyModel before = Shared();
        AssemblyComparer.Compare(before, Triaxial.Of(Softer()) with { Parts = before.Parts }, diagnostics);
        Assert.NotEmpty(diagnostics.Items);
        Assert.Equal(diagnostics.Items.Count, diagnostics.Items.DistinctBy(item => item.Message).Count());
    }

    private static DiagonalMount Softer() => new([.. Triaxial.Directions.Select(direction => new SpringDamper(direction, 1.5e5, 0.1, 0))]);

    /// <summary>The assembly of the tests, with parts that two assemblies can share.</summary>
    private static AssemblyModel Shared() => TheAssembly;

    private static readonly AssemblyModel TheAssembly = Triaxial.Of();

    private static Operation Applied(Operation operation) =>
        operation with { Forces = [.. operation.Forces.Select(set => set with { Kind = ForceKind.Applied })] };

    private static AssemblyModel Direct(double stiffness)
    {
        PlacedPart[] parts = [Chain.Part("source", [1, 2], [1e5], 0.02), Chain.Part("receiver", [3, 4], [5e4], 0.02, (2, 2e5))];
        Joint joint = Joint.Through(Chain.Mount(stiffness, 0.1), "j", Chain.End("source", 2), Chain.End("receiver", 1));
        var operation = new Operation("run", ForceSum.Phase, Amplitude.Peak,
            [Chain.Force(ForceKind.Applied, Triaxial.Axis, Chain.End("source", 1), 1), Chain.Force(ForceKind.Applied, Triaxial.Axis, Chain.End("receiver", 1), 0.5)]);
        return new AssemblyModel("direct", Triaxial.Axis, parts, [joint], [operation], [Chain.At(Chain.End("receiver", 2))]);
    }

    private static ComparedPredictions Compare(AssemblyModel before, AssemblyModel changed)
    {
        var diagnostics = new DiagnosticBag();
        ComparedPredictions? compared = AssemblyComparer.Compare(before, changed, diagnostics);
        Assert.True(compared is not null, string.Join("\n", diagnostics.Items.Select(item => item.Message)));
        return compared;
    }

    private static void AssertAttributed(ComparedPredictions compared, params string[] causes)
    {
        Assert.Empty(compared.NotAttributed);
        foreach (ResponseChange response in compared.Responses)
        {
            Assert.NotEmpty(response.Causes);
            Assert.All(response.Causes, cause => Assert.Contains(cause.Cause, causes));
            Assert.True(
                Math.Abs(response.LinearDecibels - response.Overall.Decibels) < FirstOrder * response.Causes.Sum(cause => Math.Abs(cause.Decibels)),
                FormattableString.Invariant($"{response.Response}: linear {response.LinearDecibels}, actual {response.Overall.Decibels}"));
        }
    }

    private static double Power(AssemblyModel assembly, int response) => Predictor.Predict(assembly, new DiagnosticBag())!.Operations[0]
        .Responses[response].Values.Sum(value => Math.Pow(Complex.Abs(value), 2));

    private sealed class CountingPart(IPartModel model) : IPartModel
    {
        private int _evaluations;

        public int Evaluations => _evaluations;

        public FrequencyAxis? Axis => model.Axis;

        public IReadOnlyCollection<Dof> Responses => model.Responses;

        public IReadOnlyCollection<Dof> Excitations => model.Excitations;

        public bool HasFrf(Dof response, Dof excitation) => model.HasFrf(response, excitation);

        public FrfMatrix? Evaluate(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
        {
            Interlocked.Increment(ref _evaluations);
            return model.Evaluate(axis, rows, columns, diagnostics);
        }
    }
}
