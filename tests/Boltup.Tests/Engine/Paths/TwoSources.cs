using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Paths;

/// <summary>Two invented sources on springs upon one base, a chain in x; the response is an acceleration of the base.</summary>
internal static class TwoSources
{
    public static readonly FrequencyAxis Axis = FrequencyAxis.Even(10, 5, 21);
    public static readonly JointEnd LeftFoot = Chain.End("left", 2);
    public static readonly JointEnd RightFoot = Chain.End("right", 2);
    public static readonly JointEnd BaseTop = Chain.End("base", 1);

    private static readonly PlacedPart[] Parts =
    [
        Chain.Part("left", [1, 2], [1e5], 0.02),
        Chain.Part("right", [1.5, 0.7], [6e4], 0.04),
        Chain.Part("base", [3, 4], [5e4], 0.02, (2, 2e5)),
    ];

    private static readonly Joint[] Joints =
    [
        Joint.Through(Chain.Mount(8e4, 0.1), "left mount", LeftFoot, BaseTop),
        Joint.Through(Chain.Mount(3e4, 0.2), "right mount", RightFoot, BaseTop),
    ];

    public static ForceSet Force(JointEnd at, Complex value) => Chain.Force(ForceKind.Applied, Axis, at, value);

    /// <summary>The operation with its paths.</summary>
    public static OperationResult Predict(ForceSum sum, params ForceSet[] forces) => Predict(sum, Amplitude.Rms, forces);

    public static OperationResult Predict(ForceSum sum, Amplitude amplitude, params ForceSet[] forces) =>
        Predict(Joints, sum, amplitude, forces);

    /// <summary>As <see cref="Predict(ForceSum, ForceSet[])"/>, with joints of the test's own.</summary>
    public static OperationResult Predict(Joint[] joints, ForceSum sum, Amplitude amplitude, params ForceSet[] forces)
    {
        Response response = Chain.At(Chain.End("base", 2)) with { As = Quantity.Acceleration };
        var assembly = new AssemblyModel("two sources", Axis, Parts, joints, [new Operation("run", sum, amplitude, forces)], [response]);
        var diagnostics = new DiagnosticBag();
        PredictionResult? result = Predictor.Predict(assembly, diagnostics, withPaths: true);
        Assert.True(result is not null, string.Join("\n", diagnostics.Items.Select(item => item.Message)));
        return result.Operations[0];
    }

    public static PathSpectra Paths(this OperationResult result, PathView view) => result.Paths!.Of(0, view);

    /// <summary>Sum of the contributions of an operation without energy sums.</summary>
    public static Complex[] Sum(this PathSpectra spectra)
    {
        Complex[][] terms = [.. spectra.Paths.Select((_, path) => spectra.Contribution(path))];
        return [.. Enumerable.Range(0, spectra.Lines).Select(line => terms.Aggregate(Complex.Zero, (sum, term) => sum + term[line]))];
    }
}
