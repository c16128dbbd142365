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

    public static readonly DiagnosticCode VirtualPointTwice = new(
        "CFG083", "a virtual point with the name of a point",
        "A virtual point has dofs of its own, made from channels around it. A point of the same name would have the same dofs.",
        "points: { m1: { node: 1 } }\nvirtual_points: { m1: { at: [0 mm, 0 mm, 0 mm], sensors: [s1, s2, s3] } }",
        "Give one of the two another name.");

    public static readonly DiagnosticCode ChannelWithoutPlace = new(
        "CFG084", "a channel of a virtual point without a position",
        "The rigid relation between a channel and the point needs to know where the channel is.",
        "points: { s1: { node: 1 } }\nvirtual_points: { v: { at: [0 mm, 0 mm, 0 mm], sensors: [s1] } }",
        "Give the point of the channel a position with `at`, and axes where they are not those of the part.");
}
