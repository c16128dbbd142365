using Boltup.Engine.Spectra;

namespace Boltup.Engine.Sensitivity;

/// <summary>Something that a level depends on.</summary>
/// <param name="Name">Name of a mount (of its joint, where it has none), or <c>part.point.direction</c> of a force or an FRF row.</param>
/// <param name="Direction">Direction of a mount, in the axes of the assembly; null where the name holds it.</param>
public sealed record SensitivityParameter(SensitivityKind Kind, string Name, Direction? Direction = null);
