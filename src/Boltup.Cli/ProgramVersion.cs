using System.Reflection;

namespace Boltup.Cli;

internal static class ProgramVersion
{
    /// <summary>Version of the program without build metadata.</summary>
    public static string Text { get; } = typeof(ProgramVersion).Assembly
        .GetCustomAttribute<AssemblyInformationalVersionAttribute>()!.InformationalVersion.Split('+')[0];
}
