using System.Numerics;
using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Config.Units;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Config.Planning;

/// <summary>Reads the dynamic stiffness of a mount from a table: one stiffness per direction, or the four terms of a two-port.</summary>
internal sealed class TablePlanner(DataLibrary library, DiagnosticBag diagnostics)
{
    /// <summary>Relative difference up to which two quantities are the same condition.</summary>
    private const double SameCondition = 1e-9;

    /// <summary>The law, or null after an error.</summary>
    public MountLaw? Plan(TableLawDocument law)
    {
        if (library.Open(law.File) is not { } file)
        {
            return null;
        }

        Curve[] curves = [.. file.Curves.Where(curve => curve.Kind == FunctionKind.MountStiffness)];
        if (curves.Length == 0)
        {
            diagnostics.Error(
                PlanCodes.NoCurves,
                $"`{law.File.Written}` is no table of dynamic stiffness",
                law.File.Span,
                "a table is a CSV with the header `direction,frequency_hz,real,imag`");
            return null;
        }

        return Choose(curves, law) is { } chosen && ReadAll(file, chosen) is { } tables ? Build(chosen, tables, law) : null;
    }

    /// <summary>The curves at the condition that the document names; nothing is interpolated between conditions.</summary>
    private Curve[]? Choose(Curve[] curves, TableLawDocument law)
    {
        string[] listed = [.. curves.Select(curve => curve.At).OfType<string>().Distinct()];
        if (law.At is null && listed.Length == 0)
        {
            return curves;
        }

        if (law.At is null)
        {
            diagnostics.Error(
                PlanCodes.ConditionNeeded,
                $"`{law.File.Written}` holds the stiffness at {listed.Length} conditions, and nothing says at which one it is meant",
                law.File.Span,
                $"write `table: {{ file: {law.File.Written}, at: {listed[0]} }}`",
                Words.Known("conditions", listed));
            return null;
        }

        Curve[] chosen = [.. curves.Where(curve => curve.At is { } at && IsSame(at, law.At.Value))];
        if (chosen.Length == 0)
        {
            diagnostics.Error(
                PlanCodes.NoSuchCondition,
                $"`{law.File.Written}` has no stiffness at `{law.At.Value}`",
                law.At.Span,
                listed.Length == 0 ? "remove `at`: the table has no column `at`" : "choose a condition that is listed; nothing is interpolated between them",
                Words.Known("conditions", listed));
            return null;
        }

        return chosen;
    }

    /// <summary>Equal texts, or equal quantities such as `1.2 kN` and `1200 N`.</summary>
    private static bool IsSame(string listed, string wanted) => QuantityIn(listed) is { Unit: { } unit } a && QuantityIn(wanted) is { Unit: not null } b
        ? unit.Dimension == b.Unit!.Dimension && Math.Abs(a.Si - b.Si) <= SameCondition * Math.Abs(a.Si)
        : listed.Trim() == wanted.Trim();

    private static ParsedQuantity QuantityIn(string text)
    {
        ParsedQuantity parsed = QuantityParser.Parse(text);
        return parsed.Unit is { } unit ? QuantityParser.Parse(text, unit.Dimension) : parsed;
    }

    private List<StiffnessTable>? ReadAll(DataFile file, Curve[] curves)
    {
        var tables = new List<StiffnessTable>();
        foreach (Curve curve in curves)
        {
            var values = new Complex[curve.Axis.Count];
            if (!file.ReadSpectrum(curve, values, diagnostics))
            {
                return null;
            }

            tables.Add(new StiffnessTable(curve.Response!.Direction, curve.Axis, values));
        }

        return tables;
    }

    private MountLaw? Build(Curve[] curves, List<StiffnessTable> tables, TableLawDocument law)
    {
        if (curves[0].Term is null)
        {
            return new TabledMount(tables);
        }

        var directions = curves.Zip(tables).GroupBy(pair => pair.Second.Direction);
        TwoPortTable?[] ports = [.. directions.Select(pairs => BuildTwoPort(pairs.ToDictionary(pair => pair.First.Term!, pair => pair.Second), law))];
        return Array.Exists(ports, port => port is null) ? null : new TwoPortMount(ports.OfType<TwoPortTable>());
    }

    /// <summary>A transfer stiffness that is missing is the other one: a passive mount is reciprocal (ISO 10846-1).</summary>
    private TwoPortTable? BuildTwoPort(Dictionary<string, StiffnessTable> terms, TableLawDocument law)
    {
        StiffnessTable? k12 = terms.GetValueOrDefault("k12") ?? terms.GetValueOrDefault("k21");
        StiffnessTable? k21 = terms.GetValueOrDefault("k21") ?? k12;
        string direction = Dof.NameOf(terms.Values.First().Direction);
        if (k12 is null || k21 is null || !terms.TryGetValue("k11", out StiffnessTable? k11) || !terms.TryGetValue("k22", out StiffnessTable? k22))
        {
            diagnostics.Error(
                PlanCodes.TermMissing,
                $"`{law.File.Written}` has only {Words.List(terms.Keys.Order(StringComparer.Ordinal))} in direction {direction}",
                law.File.Span,
                "give k11, k21 and k22; k12 is taken as k21 where it is missing");
            return null;
        }

        if (ReferenceEquals(k12, k21))
        {
            diagnostics.Note(
                PlanCodes.TransferTermFilled,
                $"`{law.File.Written}`: one of k12 and k21 in direction {direction} is taken from the other, as a passive mount is reciprocal",
                law.File.Span);
        }

        return new TwoPortTable(k11, k12, k21, k22);
    }
}
