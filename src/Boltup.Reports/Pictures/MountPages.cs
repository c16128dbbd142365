using System.Numerics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Reports.Pictures;

/// <summary>The picture of a mount: magnitude of its dynamic stiffness and its loss factor.</summary>
public static class MountPages
{
    /// <summary>Largest loss factor that the picture makes room for: near a resonance of the mount it means nothing.</summary>
    private const double LargestLossFactor = 2;

    private const double SmallestLossFactor = 0.1;

    /// <summary>Largest ratio of stiffnesses that the picture makes room for.</summary>
    private const double LargestRatio = 1e4;

    /// <summary>Room above and below the lines.</summary>
    private const double Margin = 1.5;

    private const double NewtonPerMillimetre = 1e3;

    /// <summary>One page.</summary>
    /// <param name="caption">Where the picture comes from.</param>
    public static Picture Of(MountSpectrum mount, FrequencyAxis axis, string caption) => Draw(MergeEqualEnds(mount), axis, caption);

    private static Picture Draw(MountSpectrum mount, FrequencyAxis axis, string caption)
    {
        MountTerm[] translations = [.. mount.Terms.Where(term => term.Direction <= Direction.Z)];
        MountTerm[] rotations = [.. mount.Terms.Except(translations)];
        var panels = new List<Panel>();
        bool hasBoth = translations.Length > 0 && rotations.Length > 0;
        if (translations.Length > 0)
        {
            panels.Add(Stiffness(mount, translations, axis, "|k| in N/mm", NewtonPerMillimetre, (0, 0, 1, hasBoth ? 0.36 : 0.6)));
        }

        if (rotations.Length > 0)
        {
            panels.Add(Stiffness(mount, rotations, axis, "|k| in N·m/rad", 1, (0, hasBoth ? 0.36 : 0, 1, hasBoth ? 0.24 : 0.6)));
        }

        panels.Add(LossFactors(mount, axis));
        return new Picture(
            $"mount-{FileNames.FromName(mount.Name)}", $"Mount {mount.Name}", "Dynamic stiffness and loss factor", caption,
            PictureStyle.PageWidth, PictureStyle.PageHeight, panels)
        {
            Legend = [.. mount.Terms.Select((term, i) => new LegendEntry(NameOf(term), PictureStyle.LineAt(i)))],
        };
    }

    private static Panel Stiffness(
        MountSpectrum mount, MountTerm[] shown, FrequencyAxis axis, string label, double unit, (double, double, double, double) place)
    {
        double[] hz = axis.Hz.ToArray();
        double[][] lines = [.. shown.Select(term => term.Values.Select(k => Complex.Abs(k) / unit).ToArray())];
        double[] finite = [.. lines.SelectMany(line => line).Where(k => k > 0 && double.IsFinite(k))];
        double to = Margin * finite.DefaultIfEmpty(1).Max();
        double from = Math.Max(finite.DefaultIfEmpty(1).Min() / Margin, to / LargestRatio);
        Series[] series = [.. shown.Select((term, i) => new Series(NameOf(term), hz, [.. lines[i].Select(Logarithm)], ColourOf(mount, term)))];
        return new Panel("", PictureAxes.Frequency(axis, ""), LogarithmicAxis(label, from, to), series, place);
    }

    private static Panel LossFactors(MountSpectrum mount, FrequencyAxis axis)
    {
        double[] hz = axis.Hz.ToArray();
        Series[] series = [.. mount.Terms.Select(term => new Series(
            NameOf(term), hz, [.. term.Values.Select(LossFactorOf)], ColourOf(mount, term), Thin: true))];
        double[] finite = [.. series.SelectMany(line => line.Y).Where(double.IsFinite)];
        double to = Margin * Math.Clamp(finite.DefaultIfEmpty().Max(), SmallestLossFactor, LargestLossFactor);
        double from = Math.Clamp(Margin * finite.DefaultIfEmpty().Min(), -to, 0);
        var y = new PictureAxis("Loss factor", from, to, false, Ticks.Even(from, to, 5));
        return new Panel("", PictureAxes.Frequency(axis, "Frequency in Hz"), y, series, (0, 0.6, 1, 0.4));
    }

    /// <summary>The drawer has logarithmic abscissas only: an ordinate is drawn over its own logarithm.</summary>
    private static PictureAxis LogarithmicAxis(string label, double from, double to) => new(
        label, Math.Log10(from), Math.Log10(to), false, [.. Ticks.OfFrequency(from, to).Select(tick => tick with { At = Math.Log10(tick.At) })]);

    private static double Logarithm(double value) => value > 0 ? Math.Log10(value) : double.NaN;

    /// <summary>Where the real part passes through zero the loss factor has a pole: a gap is clearer than its two branches.</summary>
    private static double LossFactorOf(Complex k)
    {
        double lossFactor = k.Imaginary / k.Real;
        return Math.Abs(lossFactor) <= LargestLossFactor ? lossFactor : double.NaN;
    }

    /// <summary>A mount that is alike at both ends has one line for them.</summary>
    private static MountSpectrum MergeEqualEnds(MountSpectrum mount)
    {
        MountTerm? TwinOf(MountTerm term) => mount.Terms.FirstOrDefault(other =>
            other != term && (other.Name is "k11" or "k22") && other.Direction == term.Direction && other.Values.SequenceEqual(term.Values));
        return mount with
        {
            Terms = [.. mount.Terms
                .Where(term => term.Name != "k22" || TwinOf(term) is null)
                .Select(term => term.Name == "k11" && TwinOf(term) is not null ? term with { Name = "k11 = k22" } : term)],
        };
    }

    private static Rgb ColourOf(MountSpectrum mount, MountTerm term) => PictureStyle.LineAt(mount.Terms.TakeWhile(other => other != term).Count());

    private static string NameOf(MountTerm term) => term.Name.Length == 0 ? Dof.NameOf(term.Direction) : $"{Dof.NameOf(term.Direction)} {term.Name}";
}
