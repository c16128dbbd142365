namespace Boltup.Tests.Config;

/// <summary>Bench documents, and assemblies with handovers, that draw diagnostics.</summary>
internal static class BenchCases
{
    /// <summary>A handover that the assemblies of <see cref="Handovers"/> name.</summary>
    public const string Handover = "boltup: forces/1\npoints: { m1: { at: [0 mm, 0 mm, 0 mm] } }\ndirections: [x]\n"
        + "holds: { from: 20 Hz, to: 500 Hz }\noperations:\n  slow: { file: compressor.uff, phase: common, amplitude: rms }\n";

    private const string Head = "boltup: bench/1\npoints: { m1: { node: 1 }, s1: { node: 2 }, v1: { node: 3, at: [0 mm, 0 mm, 0 mm] } }\n"
        + "interface: { points: [m1], directions: [x] }\n";

    private const string Data = "installed_frf: [ { file: compressor.uff } ]\n";
    private const string Sensors = "indicators: [s1]\nvalidation: [v1]\n";
    private const string Running = "operations: { run: { file: compressor.uff } }\n";
    private const string Rest = Data + Sensors + Running;

    public static readonly DiagnosticCase[] All =
    [
        new("CFG080", Head + Data + "indicators: [s1, v1]\nvalidation: [«v1»]\n" + Running, "cannot judge it"),
        new("CFG081", Head + Rest + "solve: «{ method: truncated }»\n", "below: 0.01"),
        new("CFG050", Head + Data + "indicators: [«s9»]\n" + Running, "s1"),
        new("CFG050", Head.Replace("[m1]", "[«m2»]", StringComparison.Ordinal) + Rest, "m1"),
        new("CFG021", Head + Rest + "solve: { method: truncated, below: 0.1, «damping»: 1 }\n", "tikhonov"),
        new("CFG058", "boltup: bench/1\npoints: { m1: { node: 1 }, s1: { node: «1» } }\ninterface: { points: [m1], directions: [x] }\n"
            + Data + "indicators: [s1]\n" + Running),
        new("CFG021", Head + Rest + "routes: { free: «{ method: free_velocity, operations: { run: { file: compressor.uff } } }» }\n", "`free_velocity` needs"),
        new("CFG021", Head + Rest + "routes: { mounts: { method: «mount_stiffness», operations: { run: { file: compressor.uff } } } }\n", "bench.assembly.yaml"),
        new("CFG050", Head + Rest + "routes: { sensors: { method: contact_force, operations: { «walk»: { file: compressor.uff } } } }\n", "run"),
        new("CFG083", Head + "virtual_points: { «m1»: { at: [0 mm, 0 mm, 0 mm], sensors: [v1] } }\n" + Rest, "name of its own"),
        new("CFG084", Head + "virtual_points: { v: { at: [0 mm, 0 mm, 0 mm], sensors: [«s1»] } }\n" + Rest, "s1: { at:"),
    ];

    public static readonly DiagnosticCase[] Handovers =
    [
        new("CFG082", Assembly("{ file: source.forces.yaml, operation: «slov», part: source }"), "did you mean `slow`"),
        new("CFG082", Assembly("{ file: «source.forces.yaml», part: source }"), "add `operation: slow`"),
        new("CFG021", Assembly("{ file: compressor.uff, operation: «slow», part: source }"), "forces.yaml"),
    ];

    private static string Assembly(string forces) => "boltup: assembly/1\nparts: { source: source.part.yaml }\n"
        + $"operations: {{ run: {{ blocked_forces: {forces} }} }}\n";
}
