using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

public static partial class ConfigCodes
{
    public static readonly DiagnosticCode ValidationIsIndicator = new(
        "CFG080", "a sensor that judges itself",
        "A validation sensor shows what the forces predict where they were not fitted. A sensor that took part in the "
            + "identification agrees with it by construction.",
        "indicators: [s1, s2, v1]\nvalidation: [v1]",
        "Remove the point from `indicators` or from `validation`.");

    public static readonly DiagnosticCode NoiseUnknown = new(
        "CFG081", "the noise of the FRFs is not known",
        "Leaving out what noise hides needs the standard deviation of every FRF, which follows from coherence and number "
            + "of averages.",
        "solve: { method: truncated }  # and installed_frf without coherence",
        "Give `coherence` and `averages` with every file, or a threshold such as `below: 0.01`.");

    public static readonly DiagnosticCode NoSuchOperation = new(
        "CFG082", "an operation that the forces do not hold",
        "The handover file of blocked forces holds other operations than the one that is named.",
        "{ file: source.forces.yaml, operation: 2500 rpm, part: compressor }",
        "Name one of the operations of the file.");
}
