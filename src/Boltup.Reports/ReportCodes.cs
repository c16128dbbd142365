using Boltup.Engine.Diagnostics;

namespace Boltup.Reports;

/// <summary>Diagnostics of writing results.</summary>
public static class ReportCodes
{
    public static readonly DiagnosticCode CannotWrite = new(
        "OUT001",
        "results cannot be written",
        "The operating system refuses to create or replace the output folder. Earlier results, if any, are still there as they were.",
        "boltup predict minibus.assembly.yaml -o /read-only/folder",
        "Choose another folder with `-o`, or free disk space and check permissions.");

    public static readonly DiagnosticCode ForeignFile = new(
        "OUT002",
        "a file that Boltup did not write stands in the way",
        "The output folder holds a file of the same name as a result, which no earlier run wrote. It is not overwritten.",
        "boltup predict minibus.assembly.yaml -o configs",
        "Choose another output folder with `-o`, or move the file away.");
}
