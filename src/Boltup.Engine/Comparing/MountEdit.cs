using Boltup.Engine.Coupling;

namespace Boltup.Engine.Comparing;

/// <summary>A joint whose mount may differ.</summary>
/// <param name="Cause">Place among the causes.</param>
/// <param name="First">First constraint of the joint in the base.</param>
internal sealed record MountEdit(int Cause, Joint Base, Joint Changed, int First);
