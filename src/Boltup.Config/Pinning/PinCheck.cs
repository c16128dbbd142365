using Boltup.Config.Documents;
using Boltup.Config.Planning;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Pinning;

/// <summary>
/// Compares the data files of an assembly with the pins beside it and beside the assemblies that it is based on. The pins of a base speak
/// only for the files that both read.
/// </summary>
internal sealed class PinCheck(IReadOnlyList<SourceFile> dataFiles, LoadOptions options, DiagnosticBag diagnostics)
{
    private readonly Dictionary<string, string> _digests = new(StringComparer.Ordinal);

    public void Run(AssemblyDocument assembly)
    {
        foreach (SourceFile document in assembly.Bases.Prepend(assembly.Source))
        {
            bool isTop = document == assembly.Source;
            if (LoadFor(document) is { } pins)
            {
                Compare(pins, isTop);
                if (isTop)
                {
                    SayWhatIsMissing(pins);
                }
            }
        }
    }

    /// <summary>Whether pins name the assembly that they lie beside; an error where they do not.</summary>
    public static bool BelongsTo(PinsDocument pins, SourceFile assembly, DiagnosticBag diagnostics)
    {
        string expected = Path.GetFileName(assembly.FullPath);
        bool belongs = pins.Assembly.Value == expected;
        if (!belongs)
        {
            diagnostics.Error(
                PlanCodes.PinsOfAnother,
                $"these are the pins of `{pins.Assembly.Value}`, expected those of `{expected}`",
                pins.Assembly.Span,
                $"run `boltup pin --accept {assembly.DisplayPath}`");
        }

        return belongs;
    }

    private PinsDocument? LoadFor(SourceFile assembly)
    {
        string path = PinsFile.PathFor(assembly.FullPath);
        if (!File.Exists(path))
        {
            return null;
        }

        PinsDocument? pins = ConfigLoader.LoadPins(path, options, diagnostics).Document;
        return pins is not null && BelongsTo(pins, assembly, diagnostics) ? pins : null;
    }

    private void Compare(PinsDocument pins, bool isTop)
    {
        foreach (PinDocument pin in pins.Files)
        {
            if (dataFiles.FirstOrDefault(file => file.FullPath == pin.File.FullPath) is not { } file)
            {
                SayUnused(pin, isTop);
            }
            else if (DigestOf(file) is { } found && found != pin.Sha256)
            {
                diagnostics.Error(
                    PlanCodes.PinDoesNotMatch,
                    $"`{file.DisplayPath}` changed since it was pinned",
                    pin.File.Span,
                    "restore the file, or accept the change with `boltup pin --accept`",
                    $"pinned: {pin.Sha256}",
                    $"found: {found}");
            }
        }
    }

    private void SayUnused(PinDocument pin, bool isTop)
    {
        if (isTop)
        {
            diagnostics.Warning(
                PlanCodes.PinUnused, $"`{pin.File.Written}` is pinned, and the assembly does not read it", pin.File.Span, "drop it with `boltup pin --accept`");
        }
    }

    private void SayWhatIsMissing(PinsDocument pins)
    {
        HashSet<string> pinned = [.. pins.Files.Select(pin => pin.File.FullPath)];
        foreach (SourceFile file in dataFiles.Where(file => !pinned.Contains(file.FullPath)))
        {
            diagnostics.Error(
                PlanCodes.PinMissing,
                $"`{file.DisplayPath}` is not pinned",
                new SourceSpan(pins.Source.DisplayPath),
                "add it with `boltup pin --accept`");
        }
    }

    private string DigestOf(SourceFile file)
    {
        if (!_digests.TryGetValue(file.FullPath, out string? digest))
        {
            digest = FileDigest.Of(file.FullPath);
            _digests.Add(file.FullPath, digest);
        }

        return digest;
    }
}
