using Boltup.Config.Binding;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>A part given by FRF data.</summary>
public sealed record FrfModelDocument(IReadOnlyList<FrfFileDocument> Files) : PartModelDocument;

/// <summary>One file of FRFs.</summary>
/// <param name="MotionQuantity">What its motion rows are, when the document says so: receptance, mobility or accelerance.</param>
public sealed record FrfFileDocument(FileReference File, Marked<FrfQuantity>? MotionQuantity);
