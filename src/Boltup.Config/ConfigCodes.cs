using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>
/// Everything that can be wrong with a document: CFG001–011 syntax, 012–029 schema, 030–049 values and names,
/// 050–069 references and overlays, 070–079 files.
/// </summary>
public static partial class ConfigCodes
{
    /// <summary>All codes in order.</summary>
    public static IReadOnlyList<DiagnosticCode> All => DiagnosticCode.DeclaredIn(typeof(ConfigCodes));
}
