using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Names and values that do not agree with each other.</summary>
public static partial class ConfigCodes
{
    public static readonly DiagnosticCode UnknownName = new(
        "CFG050", "name that names nothing",
        "A part, point, mass or mount is named that does not exist.",
        "front: { between: [compressor.m1, body.b9], through: soft }",
        "Correct the name, or add what it names.");

    public static readonly DiagnosticCode JoinedToItself = new(
        "CFG051", "joint of a point with itself",
        "Both ends of a joint or link are the same point, so it does nothing.",
        "front: { between: [body.b1, body.b1], rigid: [z] }",
        "Name two different points.");

    public static readonly DiagnosticCode SameJoint = new(
        "CFG052", "two joints between the same points",
        "Two joints connect the same two points. One of them is most likely a copy that was not edited.",
        "left: { between: [a.m1, b.b1], through: soft }\nright: { between: [a.m1, b.b1], through: soft }",
        "Correct the points, or make one joint of the two.");

    public static readonly DiagnosticCode LikeItself = new(
        "CFG053", "mount that is like itself",
        "The `like` keys of mounts lead in a circle, so none of them has a stiffness.",
        "soft: { like: hard }\nhard: { like: soft }",
        "Let one of the mounts have a stiffness of its own.");

    public static readonly DiagnosticCode GroundMisused = new(
        "CFG054", "ground where it means nothing",
        "`ground` does not move: it has no response, and a joint from ground to ground does nothing.",
        "floor: { at: ground.z }",
        "Name a point of a part.");

    public static readonly DiagnosticCode BadAxes = new(
        "CFG055", "unusable axes",
        "Axes of a point must be unit vectors, perpendicular to each other and right-handed within 1e-6; an axis "
            + "of rotation must have a direction.",
        "axes: { x: [0, 2, 0], y: [-1, 0, 0] }",
        "Give two perpendicular unit vectors and leave the third to the program.");

    public static readonly DiagnosticCode BadMatrix = new(
        "CFG056", "stiffness matrix that is not symmetric",
        "The stiffness matrix of a passive mount is symmetric.",
        "stiffness_matrix: [[1 N/mm, 2 N/mm, 0], [0, 1 N/mm, 0], [0, 0, 1 N/mm]]",
        "Give mirrored entries the same value.");

    public static readonly DiagnosticCode BadFrequencies = new(
        "CFG057", "unusable frequency range",
        "The range ends below its beginning, or has absurdly many lines.",
        "frequencies: { from: 200 Hz, to: 20 Hz, step: 1 Hz }",
        "Correct the range or the step.");

    public static readonly DiagnosticCode SameNode = new(
        "CFG058", "two points with one node",
        "Two points of a part have the same node number, so the data of a file would belong to both.",
        "m1: { node: 101 }\nm2: { node: 101 }",
        "Correct one of the node numbers.");

    public static readonly DiagnosticCode BaseCycle = new(
        "CFG060", "chain of bases without end",
        "The documents named by `based_on` lead back to one that is already in the chain, or the chain is absurdly "
            + "long.",
        "based_on: this-very-file.assembly.yaml",
        "Let the last document of the chain stand on its own.");

    public static readonly DiagnosticCode NothingToRemove = new(
        "CFG061", "nothing to remove",
        "`~` removes a key that a base gives, and no base gives this one.",
        "mounts: { sfot: ~ }",
        "Correct the name of the key, or leave it out.");
}
