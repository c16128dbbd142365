namespace Boltup.Tests.Config;

/// <summary>Documents without mistakes.</summary>
internal static class Samples
{
    public const string MeasuredPart = """
        boltup: part/1
        title: Refrigerant compressor, hung free
        points:
          m1: { node: 101, at: [92 mm, 61 mm, 0 mm] }
          m2: { node: 102, at: [92 mm, -61 mm, 0 mm], axes: { x: [0, 1, 0], y: [-1, 0, 0] } }   # z completes
        frf:
          - { file: compressor.uff }
          - { file: extra.csv, quantity: accelerance }
        reciprocity: fill

        """;

    public const string LumpedPart = """
        boltup: part/1
        title: Three-mass source
        lumped:
          direction: x
          masses: { s1: 1.5 kg, s2: 0.7 kg, s3: 0.4 kg }
          links:
            - { between: [s1, s2], stiffness: 400 N/mm, loss_factor: 0.02 }
            - { between: [s3, ground], stiffness: 20 N/mm, damping: 12 N·s/m }

        """;

    public const string Assembly = """
        boltup: assembly/1
        title: Minibus with compressor on the base mounts
        frequencies: { from: 20 Hz, to: 2000 Hz, step: 1 Hz }
        parts:
          compressor: parts/compressor.part.yaml
          body: { file: parts/body.part.yaml, turned: { about: z, by: 90 deg }, moved: [1.2 m, 0 m, 0.3 m] }
        mounts:
          soft: { stiffness: { x: 90 N/mm, y: 90 N/mm, z: 140 N/mm }, loss_factor: 0.12, damping: { z: 12 N·s/m } }
          softer: { like: soft, scale: 0.8 }
          softest: { like: softer, scale: 0.5 }
          tabled: { table: mounts/tabled.csv }
          full:
            stiffness_matrix:
              - [90 N/mm, 1 N/mm, 0]
              - [1 N/mm, 90 N/mm, 0]
              - [0, 0, 140 N/mm]
        joints:
          front left: { between: [compressor.m1, body.s1], through: soft }
          front right: { between: [compressor.m2, ground], rigid: [x, y, z] }
        joint_gap: 8 mm
        operations:
          2400 rpm:
            title: idle
            amplitude: peak
            sum: energy
            blocked_forces: { file: forces/2400rpm.csv, part: compressor }
          shaker check:
            applied_forces:
              - { file: forces/shaker.csv, part: body }
              - { file: forces/2400rpm.csv, part: compressor }
        responses:
          driver ear: { at: body.s2.p }
          seat rail: { at: body.s3.z, as: velocity }
          foot: { at: body.s3.x }
        targets: {}

        """;

    /// <summary>A folder with everything that <see cref="Assembly"/> names.</summary>
    public static ConfigFolder Folder() => new ConfigFolder()
        .With(".git/HEAD", "")
        .With("a.assembly.yaml", Assembly)
        .With("parts/compressor.part.yaml", MeasuredPart)
        .With("parts/body.part.yaml", LumpedPart)
        .With("parts/compressor.uff", "").With("parts/extra.csv", "")
        .With("mounts/tabled.csv", "").With("forces/2400rpm.csv", "").With("forces/shaker.csv", "");
}
