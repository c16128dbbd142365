using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Pinned data files.</summary>
public static partial class ConfigCodes
{
    public static readonly DiagnosticCode BadDigest = new(
        "CFG120", "pin that is no SHA-256",
        "A pin is the SHA-256 of a file: 64 hexadecimal digits. Anything else cannot be compared with a file.",
        "files: [ { file: ../data/body.unv, sha256: 3f2a } ]",
        "Write the pins anew with `boltup pin --accept`; they are not meant to be edited.");
}
