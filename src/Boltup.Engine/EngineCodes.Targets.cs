using Boltup.Engine.Diagnostics;

namespace Boltup.Engine;

public static partial class EngineCodes
{
    public static readonly DiagnosticCode TargetOutsideBand = new(
        "ENG080",
        "a target that is not judged",
        "None of the frequencies that the target speaks of is computed in the operation, so that nothing can be said about it. It is neither kept nor missed.",
        "targets: { rumble: { response: driver ear, limit: 40 dB, from: 2000 Hz, to: 4000 Hz } }  # and FRFs up to 1000 Hz",
        "Correct the band, or compute the operation at the frequencies of the target.");
}
