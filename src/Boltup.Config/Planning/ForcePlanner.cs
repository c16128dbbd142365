using System.Numerics;
using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Config.Planning;

/// <summary>Reads the forces of the operations; they are few, and their lines decide where an operation is computed.</summary>
internal sealed class ForcePlanner(AssemblyDocument assembly, DataLibrary library, DiagnosticBag diagnostics)
{
    /// <summary>The operation, or null after an error.</summary>
    public Operation? Plan(OperationDocument document)
    {
        Amplitude? stated = document.Amplitude?.Value;
        ForceSet[]?[] read = [.. document.Forces.Select(forces => ReadSets(forces, ref stated))];
        bool isFree = read.Any(sets => sets?.Length > 1);
        if (isFree && document.Forces.Count > 1 && document.Sum == ForceSum.Phase)
        {
            diagnostics.Error(
                PlanCodes.PhaseUnknown,
                $"operation `{document.Name}` adds forces in phase, and auto and cross spectra have no phase reference",
                document.Name.Span,
                "say `sum: energy`");
        }

        if (stated is null)
        {
            diagnostics.Note(
                EngineCodes.AmplitudeAssumed,
                $"operation `{document.Name}`: nothing says whether its forces are rms or peak; taken as rms",
                document.Name.Span,
                "say `amplitude: rms` or `amplitude: peak`");
        }

        return read.Contains(null)
            ? null
            : new Operation(
                document.Name.Value, isFree ? ForceSum.Energy : document.Sum, stated ?? Amplitude.Rms, [.. read.SelectMany(sets => sets!)])
            { Origin = document.Name.Span };
    }

    /// <summary>One set, or one for each principal component where there is no phase reference: powers add.</summary>
    private ForceSet[]? ReadSets(ForceDocument document, ref Amplitude? stated)
    {
        if (library.Open(document.DataFile) is not { } file)
        {
            return null;
        }

        stated ??= document.HandoverOperation?.Amplitude;

        if (CrossSpectraPlanner.Recognises(file))
        {
            return ReadCrossSpectra(document);
        }

        Curve[] curves = [.. file.Curves.Where(curve => curve is { Kind: FunctionKind.Spectrum, Response: not null })];
        if (curves.Length == 0)
        {
            diagnostics.Error(
                PlanCodes.NoCurves,
                $"`{document.DataFile.Written}` holds no force spectra",
                document.DataFile.Span,
                $"`boltup inspect {file.DisplayPath}` shows what it holds; a force CSV has the header `dof,frequency_hz,real,imag`");
            return null;
        }

        stated ??= curves.Select(curve => curve.Amplitude).FirstOrDefault(amplitude => amplitude is not null);
        return AreForces(curves) && ShareAxis(curves) && Read(document, file, curves) is { } set ? [set] : null;
    }

    private bool AreForces(Curve[] curves)
    {
        bool fine = true;
        foreach (Curve curve in curves.Where(curve => curve.ResponseQuantity is not (Quantity.Force or Quantity.VolumeVelocity or Quantity.Unknown)))
        {
            fine = false;
            diagnostics.Error(
                PlanCodes.NotAForce,
                $"{curve.Response} is {curve.ResponseQuantity.ToString().ToLowerInvariant()}, expected force",
                curve.Span,
                "name a file of forces");
        }

        return fine;
    }

    private bool ShareAxis(Curve[] curves)
    {
        Curve? other = Array.Find(curves, curve => !curve.Axis.Matches(curves[0].Axis));
        if (other is not null)
        {
            diagnostics.Error(
                PlanCodes.MixedAxes,
                $"{other.Response} and {curves[0].Response} are given at different frequencies",
                other.Span,
                "give every force at every line; a force that is zero is written as 0",
                $"{curves[0].Response}: {curves[0].Axis}",
                $"{other.Response}: {other.Axis}");
        }

        return other is null;
    }

    private ForceSet[]? ReadCrossSpectra(ForceDocument document)
    {
        PointNames names = NamesOf(document);
        var planner = new CrossSpectraPlanner(library, dof => names.Resolve(dof) ?? dof, (_, _) => 0, diagnostics);
        if (planner.Read(document.DataFile, wanted: null) is not { } columns)
        {
            return null;
        }

        CheckHandover(document, columns[0].Axis);
        return [.. columns.Select(column => new ForceSet(document.Kind, document.Part.Value, column.Axis, column.Dofs, column.Values)
        {
            Origin = document.File.Span,
        })];
    }

    private PointNames NamesOf(ForceDocument document) =>
        new(assembly.FindPart(document.Part.Value)!.Document!.Points, new DiagnosticBag());

    private void CheckHandover(ForceDocument document, FrequencyAxis axis)
    {
        if (document.Handover is { } handover)
        {
            new HandoverCheck(assembly, document, handover, diagnostics).Run(axis);
        }
    }

    private ForceSet? Read(ForceDocument document, DataFile file, Curve[] curves)
    {
        PointNames names = NamesOf(document);
        var spectra = new List<Complex[]>();
        foreach (Curve curve in curves)
        {
            var values = new Complex[curve.Axis.Count];
            if (!file.ReadSpectrum(curve, values, diagnostics))
            {
                return null;
            }

            spectra.Add(values);
        }

        CheckHandover(document, curves[0].Axis);

        // A file names dofs by node or by the part's own point names.
        return new ForceSet(
            document.Kind,
            document.Part.Value,
            curves[0].Axis,
            [.. curves.Select(curve => names.Resolve(curve.Response!) ?? curve.Response!)],
            spectra)
        { Origin = document.File.Span };
    }
}
