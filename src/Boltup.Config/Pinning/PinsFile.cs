using Boltup.Config.Documents;
using Boltup.Config.Planning;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Pinning;

/// <summary>The pins beside an assembly.</summary>
public static class PinsFile
{
    private const string AssemblyEnding = ".assembly.yaml";
    private const string Ending = ".pins.yaml";

    /// <summary>Where the pins of an assembly are: <c>minibus.pins.yaml</c> beside <c>minibus.assembly.yaml</c>.</summary>
    public static string PathFor(string assemblyPath)
    {
        string name = Path.GetFileName(assemblyPath);
        string stem = name.EndsWith(AssemblyEnding, StringComparison.Ordinal) ? name[..^AssemblyEnding.Length] : Path.GetFileNameWithoutExtension(name);
        return Path.Combine(Path.GetDirectoryName(assemblyPath) ?? "", stem + Ending);
    }

    /// <summary>Pins the data files of an assembly as they are.</summary>
    /// <param name="accept">Whether pins that differ may be replaced.</param>
    /// <returns>What changed against the earlier pins, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static PinChange? Write(string assemblyPath, bool accept, LoadOptions options, DiagnosticBag diagnostics)
    {
        using AssemblyPlan? plan = AssemblyPlanner.Plan(assemblyPath, options with { ChecksPins = false }, diagnostics);
        if (plan is null)
        {
            return null;
        }

        string path = PathFor(plan.Document.Source.FullPath);
        string folder = plan.Document.Source.Folder;
        Pin[] pins = [.. plan.DataFiles.Select(file => Pin.Of(file.FullPath, folder))];
        PinsDocument? earlier = File.Exists(path) ? Load(path, plan.Document.Source, accept, options, diagnostics) : null;
        PinChange change = Compare(pins, earlier?.Files ?? []);
        if (diagnostics.HasErrors || (earlier is not null && !MayReplace(change, accept, earlier.Source, diagnostics)))
        {
            return null;
        }

        bool isWritten = (earlier is not null && change.IsNone)
            || Replace(path, PinsText.Of(Path.GetFileName(plan.Document.Source.FullPath), pins), diagnostics);
        return isWritten ? change : null;
    }

    /// <summary>Pins of another assembly, or ones that cannot be read, are no earlier pins where anything is accepted.</summary>
    private static PinsDocument? Load(string path, SourceFile assembly, bool accept, LoadOptions options, DiagnosticBag diagnostics)
    {
        var found = new DiagnosticBag();
        PinsDocument? pins = ConfigLoader.LoadPins(path, options, found).Document;
        bool isOwn = pins is not null && PinCheck.BelongsTo(pins, assembly, found);
        if (!accept)
        {
            diagnostics.AddRange(found.Items);
        }

        return isOwn ? pins : null;
    }

    private static PinChange Compare(Pin[] pins, IReadOnlyList<PinDocument> earlier)
    {
        Dictionary<string, string> known = earlier.DistinctBy(pin => pin.File.FullPath).ToDictionary(pin => pin.File.FullPath, pin => pin.Sha256);
        HashSet<string> used = [.. pins.Select(pin => pin.FullPath)];
        return new PinChange(
            Sorted(pins.Where(pin => known.TryGetValue(pin.FullPath, out string? digest) && digest != pin.Sha256).Select(pin => pin.Path)),
            Sorted(pins.Where(pin => !known.ContainsKey(pin.FullPath)).Select(pin => pin.Path)),
            Sorted(earlier.Where(pin => !used.Contains(pin.File.FullPath)).Select(pin => pin.File.Written)));
    }

    private static string[] Sorted(IEnumerable<string> paths) => [.. paths.Order(StringComparer.Ordinal)];

    private static bool MayReplace(PinChange change, bool accept, SourceFile earlier, DiagnosticBag diagnostics)
    {
        if (accept || change.IsNone)
        {
            return true;
        }

        diagnostics.Error(
            PlanCodes.PinsDiffer,
            $"the data files are not those of `{earlier.DisplayPath}`",
            new SourceSpan(earlier.DisplayPath),
            "if the changes are meant, run `boltup pin --accept`",
            [
                .. change.Changed.Select(path => $"changed: `{path}`"),
                .. change.Added.Select(path => $"not pinned yet: `{path}`"),
                .. change.Dropped.Select(path => $"no longer used: `{path}`"),
            ]);
        return false;
    }

    /// <summary>Writes beside the target first, so that a run that is killed leaves the earlier pins whole.</summary>
    private static bool Replace(string path, string text, DiagnosticBag diagnostics)
    {
        string draft = $"{path}.draft";
        try
        {
            File.WriteAllText(draft, text);
            File.Move(draft, path, overwrite: true);
            return true;
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException)
        {
            diagnostics.Error(PlanCodes.PinsNotWritten, $"`{Path.GetFileName(path)}` cannot be written", notes: exception.Message);
            return false;
        }
    }
}
