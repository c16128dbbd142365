namespace Boltup.Cli;

/// <summary>Keeps the details of a defect for a report, away from the screen.</summary>
internal static class CrashLog
{
    /// <returns>Path of the log.</returns>
    public static string Write(Exception exception)
    {
        string path = Path.Combine(Path.GetTempPath(), $"boltup-crash-{Environment.ProcessId}.log");
        File.WriteAllText(path, $"boltup {ProgramVersion.Text}\n{Environment.CommandLine}\n{exception}\n");
        return path;
    }
}
