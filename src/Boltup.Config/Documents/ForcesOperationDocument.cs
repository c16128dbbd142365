using Boltup.Config.Binding;
using Boltup.Engine.Identification;
using Boltup.Engine.Prediction;

namespace Boltup.Config.Documents;

/// <summary>The forces of one operation of a handover.</summary>
public sealed record ForcesOperationDocument(Marked<string> Name, FileReference File, PhaseReference Phase, Amplitude Amplitude);
