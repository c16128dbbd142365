using System.Numerics;
using Boltup.Config.Documents;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Config.Planning;

/// <summary>Reads what sensors measured, as the engine holds it: displacement in m, pressure in Pa, force in N.</summary>
internal sealed class SpectraPlanner(DataLibrary library, PointNames names, DiagnosticBag diagnostics)
{
    /// <summary>What the last file said about magnitudes; null when it said nothing.</summary>
    public Amplitude? Stated { get; private set; }

    /// <summary>The spectra of some dofs over the lines of the file, or null after an error.</summary>
    /// <param name="wanted">Dofs in the order of the result.</param>
    /// <param name="motion">What spectra along directions of motion are, when the document says so: a motion, or forces.</param>
    public SpectrumSet? Read(FileReference reference, IReadOnlyList<Dof> wanted, Quantity? motion)
    {
        if (library.Open(reference) is not { } file)
        {
            return null;
        }

        Dictionary<Dof, Curve> curves = Find(file, reference);
        if (Missing(wanted, curves) is { Length: > 0 } missing)
        {
            SayMissing(reference, file, wanted, missing, curves);
            return null;
        }

        Stated = wanted.Select(dof => curves[dof].Amplitude).FirstOrDefault(amplitude => amplitude is not null);
        FrequencyAxis axis = curves[wanted[0]].Axis;
        var values = new List<Complex[]>();
        foreach (Dof dof in wanted)
        {
            if (!SameAxis(curves[dof], curves[wanted[0]]) || ReadOne(file, curves[dof], dof, motion) is not { } spectrum)
            {
                return null;
            }

            values.Add(spectrum);
        }

        return new SpectrumSet(axis, wanted, values);
    }

    private Dictionary<Dof, Curve> Find(DataFile file, FileReference reference)
    {
        var curves = new Dictionary<Dof, Curve>();
        foreach (Curve curve in file.Curves.Where(curve => curve is { Kind: FunctionKind.Spectrum, Response: not null }))
        {
            if (names.Resolve(curve.Response!) is { } dof && !curves.TryAdd(dof, curve))
            {
                diagnostics.Error(
                    PlanCodes.DuplicateCurve, $"`{reference.Written}`: the spectrum of {dof} is given twice", curve.Span, "remove one of the two",
                    $"first at {curves[dof].Span}");
            }
        }

        return curves;
    }

    private static Dof[] Missing(IReadOnlyList<Dof> wanted, Dictionary<Dof, Curve> curves) => [.. wanted.Where(dof => !curves.ContainsKey(dof))];

    private void SayMissing(
        FileReference reference, DataFile file, IReadOnlyList<Dof> wanted, Dof[] missing, Dictionary<Dof, Curve> curves) => diagnostics.Error(
            PlanCodes.OtherSensors,
            missing.Length == wanted.Count
                ? $"`{reference.Written}` holds no spectrum of any sensor of the bench"
                : $"`{reference.Written}` holds no spectrum of {string.Join(", ", missing.Take(6).Select(dof => $"`{dof}`"))}{(missing.Length > 6 ? $" and {missing.Length - 6} more" : "")}",
            reference.Span,
            $"operational spectra and FRFs must come from the same sensors; `boltup inspect {file.DisplayPath}` shows what the file holds",
            curves.Count > 0 ? [$"found: {string.Join(", ", curves.Keys.Order().Take(12))}{(curves.Count > 12 ? ", …" : "")}"] : []);

    private bool SameAxis(Curve curve, Curve first)
    {
        bool same = curve.Axis.Matches(first.Axis);
        if (!same)
        {
            diagnostics.Error(
                PlanCodes.MixedAxes, $"{curve.Response} and {first.Response} are given at different frequencies", curve.Span,
                "give every sensor at every line", $"{first.Response}: {first.Axis}", $"{curve.Response}: {curve.Axis}");
        }

        return same;
    }

    private Complex[]? ReadOne(DataFile file, Curve curve, Dof dof, Quantity? motion)
    {
        if (OrderOf(curve, dof, motion) is not { } order)
        {
            return null;
        }

        var values = new Complex[curve.Axis.Count];
        if (!file.ReadSpectrum(curve, values, diagnostics))
        {
            return null;
        }

        for (int line = 0; line < values.Length; line++)
        {
            values[line] /= Complex.Pow(new Complex(0, curve.Axis.Omega(line)), order);
            if (!Complex.IsFinite(values[line]))
            {
                diagnostics.Error(
                    EngineCodes.NotFinite,
                    FormattableString.Invariant($"the spectrum of {dof} is no finite number at {curve.Axis[line]} Hz (line {line + 1})"),
                    curve.Span,
                    "repair the data, or leave the line out with `frequencies`");
                return null;
            }
        }

        return values;
    }

    /// <summary>Order of the time derivative of displacement that a spectrum is: 0 for pressure and force; null after an error.</summary>
    private int? OrderOf(Curve curve, Dof dof, Quantity? motion)
    {
        if (!dof.IsMotion || curve.ResponseQuantity == Quantity.Force || motion == Quantity.Force)
        {
            return 0;
        }

        if (curve.ResponseQuantity != Quantity.Unknown)
        {
            return FrfQuantity.DerivativeOrder(curve.ResponseQuantity);
        }

        if (motion is { } stated)
        {
            return FrfQuantity.DerivativeOrder(stated);
        }

        diagnostics.Error(
            PlanCodes.QuantityUnknown,
            $"nothing says whether the spectrum of {dof} is acceleration, velocity or displacement",
            curve.Span,
            "write `quantity: acceleration` beside the file, or velocity, or displacement");
        return null;
    }
}
