using Boltup.Config.Binding;

namespace Boltup.Config.Documents;

/// <summary>One file of installed FRFs, with the coherence of the same measurement where there is one.</summary>
public sealed record BenchFrfDocument(FrfFileDocument Frf, FileReference? Coherence, Marked<int>? Averages);
