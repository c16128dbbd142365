using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;

namespace Boltup.Reports.Results;

/// <summary>Writes everything that a prediction leaves behind.</summary>
public static class ResultWriter
{
    public const string ResponsesFile = "responses.csv";
    public const string JointForcesFile = "joint_forces.csv";
    public const string SummaryFile = "summary.json";

    /// <summary>Writes data files, and pictures side by side with them, and replaces earlier results as a whole.</summary>
    /// <param name="inputs">Computes the fingerprints of the inputs; runs side by side with the rest.</param>
    /// <returns>Names of the files in the folder, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static IReadOnlyList<string>? Write(
        PredictionResult result, Func<IReadOnlyList<InputFingerprint>> inputs, string folder, ResultOptions options, DiagnosticBag diagnostics)
    {
        using OutputFolder? output = OutputFolder.Prepare(folder, diagnostics);
        if (output is null)
        {
            return null;
        }

        Parallel.Invoke(
            () => output.Write(ResponsesFile, stream => ResultTables.WriteResponses(stream, result)),
            () => output.Write(JointForcesFile, stream => ResultTables.WriteJointForces(stream, result)),
            () =>
            {
                IReadOnlyList<InputFingerprint> fingerprints = inputs();
                output.Write(SummaryFile, stream => SummaryJson.Write(stream, result, fingerprints, options.ProgramVersion));
            });
        return output.Commit(diagnostics);
    }
}
