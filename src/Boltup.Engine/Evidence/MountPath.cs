using Boltup.Engine.Mounts;

namespace Boltup.Engine.Evidence;

/// <summary>A mount between a point of the source and a point of the receiver.</summary>
public sealed record MountPath(MountLaw Mount, string SourcePoint, string ReceiverPoint);
