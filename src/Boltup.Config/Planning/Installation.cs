using Boltup.Config.Yaml;
using Boltup.Engine.MountIdentification;

namespace Boltup.Config.Planning;

/// <summary>A measured installation, read and ready to be taken apart.</summary>
/// <param name="Inputs">Every file that the result depends on, documents first.</param>
public sealed record Installation(string Title, InstalledMounts Mounts, IReadOnlyList<SourceFile> Inputs);
