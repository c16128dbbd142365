using Boltup.Engine.Prediction;

namespace Boltup.Engine.Identification;

/// <summary>An assembly of source, mounts and receiver, and which of its parts is the source.</summary>
public sealed record InstalledSource(AssemblyModel Assembly, string Source);
