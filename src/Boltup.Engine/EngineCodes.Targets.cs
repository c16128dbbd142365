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

    public static readonly DiagnosticCode FewLinesInBand = new(
        "ENG081",
        "a limited third octave that holds few lines",
        "A line stands for the frequencies around it and its power is split at the edges of bands (IEC 61260-1). With fewer than five lines in a band this splitting decides the level more than the spectrum does.",
        "targets: { bands: { response: ear, third_octaves: { 25 Hz: 60 dB } } }  # lines every 5 Hz",
        "Use finer lines. The tones of a machine that runs at constant speed are an exception: each lies wholly in one band unless it is at an edge.");
}
