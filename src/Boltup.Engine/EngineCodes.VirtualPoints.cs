using Boltup.Engine.Diagnostics;

namespace Boltup.Engine;

public static partial class EngineCodes
{
    public static readonly DiagnosticCode MotionNotSeen = new(
        "ENG050",
        "a virtual point whose channels miss a motion",
        "Six motions of a rigid piece need channels that see all of them. Sensors on one line do not see the rotation about it; impacts in one direction excite no other.",
        "virtual_points: { m1: { at: [0 mm, 0 mm, 0 mm], sensors: [s1, s2], impacts: [h1, h2] } }",
        "Use at least three triaxial sensors that do not lie on one line, and at least nine impacts in different places and directions.",
        ErrorKind.UnsupportedByData);

    public static readonly DiagnosticCode ExactlyDetermined = new(
        "ENG051",
        "a virtual point that nothing can judge",
        "With exactly six channels the fit is perfect by construction: its consistency is 1 with a flipped sensor too.",
        "two triaxial sensors",
        "Add channels, so that the fit has something to disagree with.");

    public static readonly DiagnosticCode ChannelNotRigid = new(
        "ENG052",
        "a channel does not move with the rigid piece",
        "The rigid motion that the other channels agree on does not explain this one. It is flipped or turned, stands elsewhere than stated, or the structure bends in between.",
        "a sensor glued with its y axis reversed",
        "Check sign, direction and position. Above the frequency at which the piece bends a virtual point has no meaning.");

    public static readonly DiagnosticCode VirtualPointFigures = new(
        "ENG053",
        "the figures of a virtual point",
        "Consistency is 1 where the channels move, or load the point, as a rigid piece would; 1/2 for a channel that is unrelated to the others, 0 for one that is flipped. The condition number says how well the channels tell the six motions apart.",
        "boltup check bracket.part.yaml",
        "Nothing to cure. Below about 0.9 look at the channel that is named.");

    public static readonly DiagnosticCode ChannelUnchecked = new(
        "ENG054",
        "a channel of a virtual point that no other checks",
        "Some motion is seen by this channel alone, so that it fits whatever it says: the directions normal to the plane of three triaxial sensors are an example. Its consistency of 1 is no evidence.",
        "three triaxial sensors on a flat plate: their three normal directions are just enough for one translation and two rotations",
        "Add a sensor, or impacts, so that every motion is seen at least once more than it needs.");
}
