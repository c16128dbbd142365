using Boltup.Engine.Diagnostics;
using Boltup.Engine.MountIdentification;
using Boltup.Engine.Spectra;
using Boltup.Reports.Results;

namespace Boltup.Reports.MountIdentification;

/// <summary>Mounts that were identified in an installation, and where they come from.</summary>
public sealed record MountReport(
    string Title,
    FrequencyAxis Axis,
    IReadOnlyList<IdentifiedMount> Mounts,
    IReadOnlyList<Diagnostic> Diagnostics,
    IReadOnlyList<InputFingerprint> Inputs,
    string ProgramVersion);
