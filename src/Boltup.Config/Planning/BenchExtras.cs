using Boltup.Config.Yaml;
using Boltup.Engine.Identification;

namespace Boltup.Config.Planning;

/// <summary>What a bench document gives beyond the bench: another installation, the bench as an assembly, other routes.</summary>
public sealed class BenchExtras : IDisposable
{
    private readonly AssemblyPlan? _assembly;

    internal BenchExtras(SecondInstallation? second, AssemblyPlan? assembly, string? source, IReadOnlyList<RouteMeasurement> routes)
    {
        (Second, _assembly, Routes) = (second, assembly, routes);
        Installed = assembly is null ? null : new InstalledSource(assembly.Assembly, source!);
    }

    /// <summary>The source on another receiver; null when there is none.</summary>
    public SecondInstallation? Second { get; }

    /// <summary>The bench as an assembly; null when the document gives none.</summary>
    public InstalledSource? Installed { get; }

    /// <summary>Other ways to the forces.</summary>
    public IReadOnlyList<RouteMeasurement> Routes { get; }

    /// <summary>Files that the assembly depends on.</summary>
    internal IReadOnlyList<SourceFile> Inputs => _assembly?.Inputs ?? [];

    public void Dispose() => _assembly?.Dispose();
}
