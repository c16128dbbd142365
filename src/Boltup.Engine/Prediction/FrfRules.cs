using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>Does a part know every FRF that the coupling needs?</summary>
internal static class FrfRules
{
    private const int Listed = 8;

    public static void Check(PartLayout part, DiagnosticBag found)
    {
        Dof[] rows = OwnDofs(part.Rows);
        Dof[] columns = OwnDofs(part.Columns);
        IPartModel model = part.Part.Model;
        Dof[] deadRows = [.. rows.Where(row => !model.Responses.Contains(row))];
        Dof[] deadColumns = [.. columns.Where(column => !model.Excitations.Contains(column))];
        Say(part, "has no data at", [.. deadRows.Intersect(deadColumns)], [.. model.Responses.Union(model.Excitations)], found);
        Say(part, "does not respond at", [.. deadRows.Except(deadColumns)], model.Responses, found);
        Say(part, "cannot be excited at", [.. deadColumns.Except(deadRows)], model.Excitations, found);
        SayMissingPairs(part, rows.Except(deadRows), [.. columns.Except(deadColumns)], found);
    }

    private static Dof[] OwnDofs(IEnumerable<DofCombination> combinations) =>
        [.. combinations.SelectMany(combination => combination.Terms).Select(term => term.Dof).Distinct()];

    private static void Say(PartLayout part, string what, Dof[] dofs, IReadOnlyCollection<Dof> known, DiagnosticBag found)
    {
        if (dofs.Length > 0)
        {
            found.Error(
                EngineCodes.MissingFrf,
                $"part `{part.Part.Name}` {what} {List(dofs)}, which the assembly needs",
                part.Part.Origin,
                "join only directions that the data have, or measure the dofs; `reciprocity: fill` in the part takes them from the reciprocal FRF",
                $"the data have {List([.. known.OrderBy(dof => dof.ToString(), StringComparer.Ordinal)])}");
        }
    }

    private static void SayMissingPairs(PartLayout part, IEnumerable<Dof> rows, Dof[] columns, DiagnosticBag found)
    {
        string[] missing =
            [.. rows.SelectMany(row => columns
                .Where(column => !part.Part.Model.HasFrf(row, column))
                .Select(column => $"{row} / {column}"))];
        if (missing.Length > 0)
        {
            found.Error(
                EngineCodes.MissingFrf,
                $"part `{part.Part.Name}` lacks {missing.Length} FRF{(missing.Length == 1 ? "" : "s")} that the assembly needs",
                part.Part.Origin,
                "measure or compute them; `reciprocity: fill` in the part takes them from the reciprocal FRF where that is there",
                $"missing (response / excitation): {Shorten(missing)}");
        }
    }

    private static string List(Dof[] dofs) => Shorten([.. dofs.Select(dof => $"`{dof}`")]);

    private static string Shorten(string[] names) =>
        string.Join(", ", names.Take(Listed)) + (names.Length > Listed ? $" and {names.Length - Listed} more" : "");
}
