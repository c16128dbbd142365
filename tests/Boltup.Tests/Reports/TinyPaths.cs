using System.Numerics;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Engine.Paths;

namespace Boltup.Tests.Reports;

/// <summary>A prediction with paths: two invented sources on one base.</summary>
internal static class TinyPaths
{
    public static readonly PredictionResult Predicted = TinyResult.Of(TwoSources.Predict(
        ForceSum.Phase,
        TwoSources.Force(TwoSources.LeftFoot, new Complex(1, 0.5)),
        TwoSources.Force(TwoSources.RightFoot, new Complex(-0.3, 0.8))));

    public static OperationResult Operation => Predicted.Operations[0];

    public static PathRanking ByJoint => Operation.RankedPaths[1].Overall;

    public static FrequencyAxis Axis => Operation.Axis;
}
