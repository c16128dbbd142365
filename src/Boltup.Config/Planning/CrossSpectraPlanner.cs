using System.Globalization;
using System.Numerics;
using Boltup.Config.Documents;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Config.Planning;

/// <summary>
/// Reads auto and cross spectra, G_ij = uᵢ·conj(uⱼ) with i the response and j the reference of the function, and turns them into columns
/// without a common phase.
/// </summary>
/// <param name="resolve">The name of a dof of the file; null where it is not wanted.</param>
/// <param name="orderOf">Order of the time derivative that spectra of a dof are, by the quantity that the file states.</param>
internal sealed class CrossSpectraPlanner(
    DataLibrary library, Func<Dof, Dof?> resolve, Func<Dof, Quantity, int> orderOf, DiagnosticBag diagnostics)
{
    /// <summary>Share of √(G_ii·G_jj) by which G_ij and conj(G_ji) may differ, and a diagonal may be complex: single precision, and text.</summary>
    private const double Tolerance = 1e-4;

    /// <summary>Whether the values that were read last are densities per Hz.</summary>
    public bool IsDensity { get; private set; }

    /// <summary>The columns over the lines of the file, or null after an error.</summary>
    /// <param name="wanted">The dofs in the order of the result; null takes all that the file has.</param>
    public IReadOnlyList<SpectrumSet>? Read(FileReference reference, IReadOnlyList<Dof>? wanted)
    {
        if (library.Open(reference) is not { } file)
        {
            return null;
        }

        Dictionary<(Dof Row, Dof Column), Curve> curves = Find(file);
        IReadOnlyList<Dof> dofs = wanted ?? [.. curves.Keys.Select(pair => pair.Row).Distinct()];
        (Dof, Dof)[] missing = [.. Pairs(dofs).Where(pair => !curves.ContainsKey(pair) && !curves.ContainsKey((pair.Column, pair.Row)))];
        if (missing.Length > 0)
        {
            SayMissing(reference, file, dofs, missing);
            return null;
        }

        IsDensity = curves.Values.Any(curve => curve.Kind == FunctionKind.PowerSpectralDensity);
        FrequencyAxis axis = curves[(dofs[0], dofs[0])].Axis;
        var spectra = new TiledMatrix(axis.Count, dofs.Count, dofs.Count);
        foreach ((Dof Row, Dof Column) pair in Pairs(dofs))
        {
            if (!Fill(reference, file, curves, dofs, pair, axis, spectra))
            {
                return null;
            }
        }

        return IsHermitian(reference, dofs, axis, spectra) ? PrincipalComponents.Of(axis, dofs, spectra) : null;
    }

    /// <summary>Whether a file holds such spectra.</summary>
    public static bool Recognises(DataFile file) => file.Curves.Any(curve => curve.Kind == FunctionKind.CrossSpectrum);

    private static IEnumerable<(Dof Row, Dof Column)> Pairs(IReadOnlyList<Dof> sensors) =>
        sensors.SelectMany(row => sensors.Select(column => (row, column)));

    private Dictionary<(Dof Row, Dof Column), Curve> Find(DataFile file)
    {
        var curves = new Dictionary<(Dof, Dof), Curve>();
        foreach (Curve curve in file.Curves)
        {
            bool isAuto = curve.Kind is FunctionKind.AutoSpectrum or FunctionKind.PowerSpectralDensity;
            if ((isAuto || curve.Kind == FunctionKind.CrossSpectrum) && curve.Response is { } response && resolve(response) is { } row
                && resolve(curve.Excitation ?? response) is { } column)
            {
                curves.TryAdd((row, column), curve);
            }
        }

        return curves;
    }

    private void SayMissing(FileReference reference, DataFile file, IReadOnlyList<Dof> sensors, (Dof Row, Dof Column)[] missing) =>
        diagnostics.Error(
            PlanCodes.OtherSensors,
            $"`{reference.Written}` lacks {missing.Length} of {sensors.Count * sensors.Count} auto and cross spectra",
            reference.Span,
            $"every pair of dofs needs its cross spectrum (one half is enough); `boltup inspect {file.DisplayPath}` shows what the file holds",
            $"missing: {string.Join(", ", missing.Take(6).Select(pair => $"{pair.Row} with {pair.Column}"))}{(missing.Length > 6 ? ", …" : "")}");

    private bool Fill(
        FileReference reference,
        DataFile file,
        Dictionary<(Dof Row, Dof Column), Curve> curves,
        IReadOnlyList<Dof> sensors,
        (Dof Row, Dof Column) pair,
        FrequencyAxis axis,
        TiledMatrix spectra)
    {
        bool mirrored = !curves.TryGetValue(pair, out Curve? curve);
        curve ??= curves[(pair.Column, pair.Row)];
        var values = new Complex[curve.Axis.Count];
        if (!curve.Axis.Matches(axis))
        {
            diagnostics.Error(PlanCodes.MixedAxes, $"the spectra in `{reference.Written}` are on different lines", curve.Span,
                "export all pairs with the same resolution");
            return false;
        }

        if (!file.ReadSpectrum(curve, values, diagnostics))
        {
            return false;
        }

        int row = orderOf(pair.Row, curve.ResponseQuantity), column = orderOf(pair.Column, curve.ResponseQuantity);
        for (int line = 0; line < values.Length; line++)
        {
            Complex value = mirrored ? Complex.Conjugate(values[line]) : values[line];
            var omega = new Complex(0, axis.Omega(line));
            values[line] = value / (Complex.Pow(omega, row) * Complex.Conjugate(Complex.Pow(omega, column)));
        }

        spectra.ScatterSpectrum(Index(sensors, pair.Row), Index(sensors, pair.Column), values);
        return true;
    }

    private static int Index(IReadOnlyList<Dof> sensors, Dof dof) => sensors.TakeWhile(sensor => sensor != dof).Count();

    private bool IsHermitian(FileReference reference, IReadOnlyList<Dof> sensors, FrequencyAxis axis, TiledMatrix spectra)
    {
        for (int i = 0; i < sensors.Count * sensors.Count * axis.Count; i++)
        {
            int line = i % axis.Count, row = i / axis.Count / sensors.Count, column = i / axis.Count % sensors.Count;
            double size = Math.Sqrt(spectra[line, row, row].Magnitude * spectra[line, column, column].Magnitude);
            Complex value = spectra[line, row, column];
            bool isFine = (value - Complex.Conjugate(spectra[line, column, row])).Magnitude <= Tolerance * size
                && (row != column || value.Real >= 0)
                && value.Magnitude <= (1 + Tolerance) * size;
            if (!isFine)
            {
                SayNotHermitian(reference, sensors[row], sensors[column], axis[line], value, spectra[line, column, row]);
                return false;
            }
        }

        return true;
    }

    private void SayNotHermitian(FileReference reference, Dof row, Dof column, double hz, Complex value, Complex mirrored) =>
        diagnostics.Error(
            EngineCodes.SpectraNotHermitian,
            row == column
                ? string.Create(CultureInfo.InvariantCulture, $"the auto spectrum of `{row}` is no real number that is not negative at {hz} Hz")
                : string.Create(CultureInfo.InvariantCulture, $"the cross spectra of `{row}` and `{column}` do not fit each other or their auto spectra at {hz} Hz"),
            reference.Span,
            "export auto and cross spectra from one processing run; G_ij must be conj(G_ji), and |G_ij|² at most G_ii·G_jj",
            string.Create(CultureInfo.InvariantCulture, $"found: {value.Real:G6}{value.Imaginary:+0.#####E+0;-0.#####E+0}j and {mirrored.Real:G6}{mirrored.Imaginary:+0.#####E+0;-0.#####E+0}j (as displacement)"));
}
