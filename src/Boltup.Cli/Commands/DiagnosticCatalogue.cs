using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Files;
using Boltup.Reports;

namespace Boltup.Cli.Commands;

/// <summary>Every diagnostic that the program can give.</summary>
internal static class DiagnosticCatalogue
{
    private static readonly Type[] Catalogues =
        [typeof(CliCodes), typeof(ConfigCodes), typeof(PlanCodes), typeof(FileCodes), typeof(EngineCodes), typeof(ReportCodes)];

    public static IReadOnlyList<DiagnosticCode> All =>
        [.. Catalogues.SelectMany(DiagnosticCode.DeclaredIn).OrderBy(code => code.Code, StringComparer.Ordinal)];
}
