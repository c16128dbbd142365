using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Planning;

public static partial class PlanCodes
{
    public static readonly DiagnosticCode FewIndicators = new(
        "PLN020",
        "fewer indicators than forces",
        "Each indicator dof gives one equation at a line, and each interface dof is one unknown.",
        "four triaxial sensors are 12 dofs, and four points in six directions are 24 forces",
        "Add sensors until there are more indicator dofs than forces, better twice as many.");

    public static readonly DiagnosticCode NotOverDetermined = new(
        "PLN021",
        "as many indicators as forces",
        "The forces then fit the measurement exactly, whatever its errors. ISO 20270 asks for more indicators than forces.",
        "12 indicator dofs and 12 forces",
        "Add sensors, better twice as many dofs as forces.");

    public static readonly DiagnosticCode ForceWithoutFrf = new(
        "PLN022",
        "an interface dof without FRFs",
        "A blocked force is found from the FRFs between its dof and the sensors. A dof that was not excited cannot be left out: its force "
            + "is there when the source runs, and the other forces would take it over.",
        "interface: { points: [m1], directions: [x, y, z] }  # and FRFs from m1.x and m1.z only",
        "Measure the missing FRFs, use a virtual point, or describe an interface that really has fewer directions.",
        ErrorKind.UnsupportedByData);

    public static readonly DiagnosticCode SensorWithoutFrf = new(
        "PLN023",
        "a sensor without FRFs",
        "No function in the files of `installed_frf` has a response at this point.",
        "indicators: [s9]  # a sensor of another set-up",
        "Correct the node of the point, add the file, or remove the sensor from the list.");

    public static readonly DiagnosticCode OtherSensors = new(
        "PLN024",
        "operational data from other sensors",
        "FRFs and operational spectra must come from the same sensors: the identification compares them line by line.",
        "FRFs at nodes 311 to 318, operation at nodes 411 to 418",
        "Name the file of this bench, or correct the node numbers of the points.");

    public static readonly DiagnosticCode InterfaceNotInAssembly = new(
        "PLN025",
        "the bench as an assembly does not have the interface",
        "Contact forces are those of joints at the interface points of the source. A point without a joint, or a direction that its joint does not carry, has no contact force.",
        "model: { assembly: bench.assembly.yaml, source: compressor }  # whose points are f1…f4, and the interface names m1…m4",
        "Name points and directions in the assembly as on the bench.");

    public static readonly DiagnosticCode CoherenceMissing = new(
        "PLN026",
        "an FRF without coherence",
        "Coherence is given for some of the installed FRFs only, so that their noise is not known as a whole.",
        "installed_frf: [{ file: bench.unv, coherence: bench_coherence.unv, averages: 10 }]  # and a pair is missing in the second file",
        "Give the coherence of every FRF, or of none.");

    public static readonly DiagnosticCode ForcesElsewhere = new(
        "PLN027", "blocked forces identified at other places",
        "Blocked forces belong to the points, axes and side of the mounts where they were identified. Applied anywhere "
            + "else they are forces of another source.",
        "identified at [92 mm, 61 mm, 0 mm], and the part's m1 is at [92 mm, 61 mm, -40 mm], below the mount",
        "Apply them to the part whose points are those of the bench; correct positions or axes of the part, or identify again.");

    public static readonly DiagnosticCode OutsideForceBand = new(
        "PLN028", "blocked forces used outside the band in which they hold",
        "The supplier says up to where the bench tells the forces, and why the band ends there. Outside of it they are "
            + "noise with the look of a spectrum.",
        "holds: { from: 50 Hz, to: 800 Hz }, and the assembly is computed up to 2000 Hz",
        "Restrict `frequencies` to the band, or ask the supplier for forces over a wider one.");

    public static readonly DiagnosticCode PhaseUnknown = new(
        "PLN029",
        "forces without a phase reference cannot be added in phase",
        "Auto and cross spectra say how forces of one source belong together, not how they lie in time to the forces of another file.",
        "blocked_forces: [{ file: fan.csv, part: fan }, { file: road.csv, part: axle }]  # road.csv holds row,column,…",
        "Say `sum: energy` in the operation.");
}
