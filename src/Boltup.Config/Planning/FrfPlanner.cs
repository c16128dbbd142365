using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Config.Planning;

/// <summary>Collects the FRFs of a part from its data files.</summary>
internal sealed class FrfPlanner(DataLibrary library, DiagnosticBag diagnostics)
{
    private readonly Dictionary<DofPair, DataCurve> _curves = [];

    /// <summary>The part, or null after an error.</summary>
    public MeasuredPart? Plan(string name, PartDocument document, FrfModelDocument model) =>
        Plan(name, document.Points, model.Files, document.FillsReciprocity?.Value ?? false);

    /// <summary>The FRFs of some files between some points, or null after an error.</summary>
    public MeasuredPart? Plan(string name, IReadOnlyList<PointDocument> points, IReadOnlyList<FrfFileDocument> files, bool fillByReciprocity)
    {
        var names = new PointNames(points, diagnostics);
        bool complete = true;
        foreach (FrfFileDocument file in files)
        {
            complete &= AddFile(file, names);
        }

        return complete && SharedAxis(name, files) is { } axis
            ? new MeasuredPart(name, [.. _curves.Values], fillByReciprocity, axis)
            : null;
    }

    private bool AddFile(FrfFileDocument document, PointNames names)
    {
        if (library.Open(document.File) is not { } file)
        {
            return false;
        }

        Curve[] frfs = [.. file.Curves.Where(curve => curve is { Kind: FunctionKind.Frf, Response: not null, Excitation: not null })];
        if (frfs.Length == 0)
        {
            diagnostics.Error(
                PlanCodes.NoCurves,
                $"`{document.File.Written}` holds no FRFs",
                document.File.Span,
                $"`boltup inspect {file.DisplayPath}` shows what it holds");
            return false;
        }

        bool complete = true;
        int leftOut = 0;
        foreach (Curve curve in frfs)
        {
            if (names.Resolve(curve.Response!) is { } response && names.Resolve(curve.Excitation!) is { } excitation)
            {
                complete &= QuantityOf(curve, document) is { } quantity && Add(new DataCurve(file, curve, response, excitation, quantity));
            }
            else
            {
                leftOut++;
            }
        }

        SayWhatWasLeftOut(document, file, leftOut, file.Curves.Count - frfs.Length);
        return complete;
    }

    private void SayWhatWasLeftOut(FrfFileDocument document, DataFile file, int otherPoints, int otherKinds)
    {
        if (otherPoints + otherKinds > 0)
        {
            diagnostics.Note(
                PlanCodes.CurvesLeftOut,
                $"`{document.File.Written}`: {otherPoints + otherKinds} of {file.Curves.Count} functions were not used",
                document.File.Span,
                notes: [$"{otherPoints} at points that the part does not list, {otherKinds} that are no FRFs"]);
        }
    }

    private bool Add(DataCurve curve)
    {
        var pair = new DofPair(curve.Response, curve.Excitation);
        if (_curves.TryAdd(pair, curve))
        {
            return true;
        }

        diagnostics.Error(
            PlanCodes.DuplicateCurve,
            $"the FRF {pair} is given twice",
            curve.Origin,
            "remove one of the two",
            $"first at {_curves[pair].Origin}");
        return false;
    }

    /// <summary>What the file says, or else what the document says; both must agree.</summary>
    private FrfQuantity? QuantityOf(Curve curve, FrfFileDocument document)
    {
        Dof response = curve.Response!;
        Dof excitation = curve.Excitation!;
        Quantity excited = curve.ExcitationQuantity != Quantity.Unknown ? curve.ExcitationQuantity
            : excitation.Direction == Direction.Q ? Quantity.VolumeVelocity
            : Quantity.Force;
        Quantity? stated = response.IsMotion ? document.MotionQuantity?.Value.Response : Quantity.Pressure;
        if (curve.ResponseQuantity == Quantity.Unknown)
        {
            return stated is { } quantity ? new FrfQuantity(quantity, excited) : SayUnknown(curve, document);
        }

        if (stated is { } other && other != curve.ResponseQuantity)
        {
            return SayConflict(curve, document);
        }

        bool usable = excited is Quantity.Force or Quantity.VolumeVelocity
            && (response.IsMotion
                ? curve.ResponseQuantity is Quantity.Displacement or Quantity.Velocity or Quantity.Acceleration
                : curve.ResponseQuantity == Quantity.Pressure);
        return usable ? new FrfQuantity(curve.ResponseQuantity, excited) : SayUnusable(curve);
    }

    private FrfQuantity? SayUnknown(Curve curve, FrfFileDocument document)
    {
        diagnostics.Error(
            PlanCodes.QuantityUnknown,
            $"nothing says whether {curve.Response} / {curve.Excitation} is receptance, mobility or accelerance",
            document.File.Span,
            $"write {{ file: {document.File.Written}, quantity: accelerance }}, or receptance, or mobility",
            $"the function is at {curve.Span}");
        return null;
    }

    private FrfQuantity? SayConflict(Curve curve, FrfFileDocument document)
    {
        diagnostics.Error(
            PlanCodes.QuantityConflict,
            $"the document says {Words(document.MotionQuantity?.Value.Response ?? Quantity.Pressure)}, the file says {Words(curve.ResponseQuantity)} for {curve.Response}",
            document.MotionQuantity?.Span ?? document.File.Span,
            "remove `quantity` if the file is right; correct the file if it is not",
            $"the function is at {curve.Span}");
        return null;
    }

    private FrfQuantity? SayUnusable(Curve curve)
    {
        diagnostics.Error(
            PlanCodes.QuantityNotUsable,
            $"{curve.Response} / {curve.Excitation} is {Words(curve.ResponseQuantity)} per {Words(curve.ExcitationQuantity)}, expected motion or sound pressure per force or volume velocity",
            curve.Span,
            "leave the function out of the file, or name another file");
        return null;
    }

    private static string Words(Quantity quantity) => quantity switch
    {
        Quantity.VolumeVelocity => "volume velocity",
        Quantity.Dimensionless => "a ratio",
        Quantity.Unknown => "an unknown quantity",
        _ => quantity.ToString().ToLowerInvariant(),
    };

    private FrequencyAxis? SharedAxis(string name, IReadOnlyList<FrfFileDocument> files)
    {
        FrequencyAxis? shared = null;
        foreach (FrequencyAxis axis in _curves.Values.Select(curve => curve.Axis).Distinct())
        {
            FrequencyAxis? both = shared is null ? axis : shared.SharedWith(axis);
            if (both is null)
            {
                diagnostics.Error(
                    PlanCodes.NoSharedLines,
                    $"the FRFs of part `{name}` have no common frequency line",
                    files[0].File.Span,
                    "bring the files to one grid",
                    $"found: {shared}",
                    $"and: {axis}");
                return null;
            }

            shared = both;
        }

        return shared;
    }
}
