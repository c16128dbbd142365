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

    public static readonly DiagnosticCode ForcesElsewhere = new(
        "CFG082", "blocked forces identified at other places",
        "Blocked forces belong to the points, axes and side of the mounts where they were identified. Applied anywhere "
            + "else they are forces of another source.",
        "identified at [92 mm, 61 mm, 0 mm], and the part's m1 is at [92 mm, 61 mm, -40 mm], below the mount",
        "Apply them to the part whose points are those of the bench; correct positions or axes of the part, or identify again.");

    public static readonly DiagnosticCode NoSuchOperation = new(
        "CFG083", "an operation that the forces do not hold",
        "The handover file of blocked forces holds other operations than the one that is named.",
        "{ file: source.forces.yaml, operation: 2500 rpm, part: compressor }",
        "Name one of the operations of the file.");

    public static readonly DiagnosticCode OutsideForceBand = new(
        "CFG084", "blocked forces used outside the band in which they hold",
        "The supplier says up to where the bench tells the forces, and why the band ends there. Outside of it they are "
            + "noise with the look of a spectrum.",
        "holds: { from: 50 Hz, to: 800 Hz }, and the assembly is computed up to 2000 Hz",
        "Restrict `frequencies` to the band, or ask the supplier for forces over a wider one.");
}
