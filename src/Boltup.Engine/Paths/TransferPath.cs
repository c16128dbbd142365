namespace Boltup.Engine.Paths;

/// <summary>One term of a response.</summary>
/// <param name="Name">
/// <c>part.point.direction</c> of a force, along the part's own directions; name and direction of a joint as in <c>front left z</c>, along
/// the directions of the assembly.
/// </param>
public sealed record TransferPath(PathKind Kind, string Name);
