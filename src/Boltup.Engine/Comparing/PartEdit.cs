namespace Boltup.Engine.Comparing;

/// <summary>A part that may have other FRFs or other forces on it.</summary>
/// <param name="Cause">Place of its FRFs among the causes, −1 where both sides share them.</param>
/// <param name="ForceCause">Place of the forces.</param>
/// <param name="Base">Place of the part in the layout of the base.</param>
/// <param name="Changed">Place of the part in the layout of the changed assembly.</param>
internal sealed record PartEdit(int Cause, int ForceCause, int Base, int Changed);
