using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.MountIdentification;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Reads the FRFs between both ends of mounts out of a part file that describes a whole installation.</summary>
public sealed class InstallationReader
{
    private const int Listed = 4;

    private static readonly Direction[] SixDirections =
        [Direction.X, Direction.Y, Direction.Z, Direction.RX, Direction.RY, Direction.RZ];

    private readonly PlacedPart _part;
    private readonly DiagnosticBag _diagnostics;

    private InstallationReader(PlacedPart part, DiagnosticBag diagnostics) => (_part, _diagnostics) = (part, diagnostics);

    /// <summary>Reads an installation.</summary>
    /// <param name="between">For each mount the points at its ends, as <c>first,second</c>.</param>
    /// <returns>The installation, or null after errors in <paramref name="diagnostics"/>.</returns>
    public static Installation? Read(string path, IReadOnlyList<string> between, LoadOptions options, DiagnosticBag diagnostics)
    {
        LoadResult<Documents.PartDocument> loaded = ConfigLoader.LoadPart(path, options, diagnostics);
        using var library = new DataLibrary(options, diagnostics);
        if (loaded.Document is not { } document || LonePart.Plan(document, library, diagnostics) is not { } part)
        {
            return null;
        }

        var reader = new InstallationReader(part, diagnostics);
        return reader.EndsOf(between) is { } mounts && reader.Read(mounts) is { } installed
            ? new Installation(part.Name, installed, [.. loaded.FilesRead, .. library.Files])
            : null;
    }

    private MountEnds[]? EndsOf(IReadOnlyList<string> between)
    {
        var mounts = new List<MountEnds>();
        HashSet<string> points = [.. _part.Model.Responses.Concat(_part.Model.Excitations).Select(dof => dof.Point)];
        var taken = new HashSet<string>(StringComparer.Ordinal);
        foreach (string text in between)
        {
            string[] ends = text.Split(',', StringSplitOptions.TrimEntries);
            if (ends.Length != 2 || ends[0].Length == 0 || ends[1].Length == 0)
            {
                _diagnostics.Error(PlanCodes.BadEnds, $"`{text}` does not name the two ends of a mount", help: "write two points, such as `--between m1,b1`");
            }
            else if (CheckEnds(ends, points, taken))
            {
                mounts.Add(new MountEnds(ends[0], ends[1]));
            }
        }

        return _diagnostics.HasErrors ? null : [.. mounts];
    }

    private bool CheckEnds(string[] ends, HashSet<string> points, HashSet<string> taken)
    {
        foreach (string end in ends)
        {
            if (!points.Contains(end))
            {
                _diagnostics.Error(
                    PlanCodes.BadEnds, $"`{_part.Name}` has no point `{end}`", _part.Origin, NearestName.Suggest(end, points), Words.Known("points", points));
                return false;
            }

            if (!taken.Add(end))
            {
                _diagnostics.Error(PlanCodes.BadEnds, $"point `{end}` is named twice", help: "every end of a mount is a point of its own");
                return false;
            }
        }

        return true;
    }

    private InstalledMounts? Read(MountEnds[] mounts)
    {
        if (_part.Model.Axis is not { } axis)
        {
            _diagnostics.Error(PlanCodes.NotMeasured, $"`{_part.Name}` is a model without measured lines", _part.Origin, "name a part with `frf`");
            return null;
        }

        Dof[] dofs = [.. mounts.SelectMany(DofsOf)];
        DofCombination[] combinations = [.. dofs.Select(_part.InAssemblyAxes)];
        return !_diagnostics.HasErrors && HasEveryFrf(combinations) && _part.Evaluate(axis, combinations, combinations, _diagnostics) is { } receptance
            ? new InstalledMounts(axis, dofs, receptance, mounts)
            : null;
    }

    /// <summary>The directions that are measured at both ends, first at the one and then at the other.</summary>
    private IEnumerable<Dof> DofsOf(MountEnds mount)
    {
        Direction[] directions = [.. SixDirections.Where(direction =>
            IsMeasured(new Dof(mount.First, direction)) && IsMeasured(new Dof(mount.Second, direction)))];
        if (directions.Length == 0)
        {
            _diagnostics.Error(
                PlanCodes.EndsNotMeasured,
                $"`{_part.Name}` has no direction that responds and is excited at both `{mount.First}` and `{mount.Second}`",
                _part.Origin,
                "measure driving-point FRFs at both ends of the mount; `reciprocity: fill` in the part supplies reciprocal ones");
        }

        return directions.Select(direction => new Dof(mount.First, direction)).Concat(directions.Select(direction => new Dof(mount.Second, direction)));
    }

    private bool IsMeasured(Dof dof) => _part.InAssemblyAxes(dof).Terms.All(term => _part.Model.HasFrf(term.Dof, term.Dof));

    private bool HasEveryFrf(DofCombination[] combinations)
    {
        Dof[] own = [.. combinations.SelectMany(combination => combination.Terms).Select(term => term.Dof).Distinct()];
        string[] missing = [.. own.SelectMany(row => own.Where(column => !_part.Model.HasFrf(row, column)).Select(column => $"{row} / {column}"))];
        if (missing.Length > 0)
        {
            _diagnostics.Error(
                PlanCodes.EndsNotMeasured,
                $"`{_part.Name}` lacks {missing.Length} of the {own.Length * own.Length} FRFs between the ends of the mounts",
                _part.Origin,
                "measure them; `reciprocity: fill` in the part takes them from the reciprocal FRF where that is there",
                $"missing (response / excitation): {string.Join(", ", missing.Take(Listed))}{(missing.Length > Listed ? " and more" : "")}");
        }

        return missing.Length == 0;
    }
}
