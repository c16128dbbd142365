using System.Globalization;
using Boltup.Cli.Terminal;
using Boltup.Engine.MountIdentification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.MountIdentification;

namespace Boltup.Cli.Commands;

/// <summary>What the identification of mounts prints: the stiffness, how far it can be trusted, and what was written.</summary>
internal static class MountText
{
    private const double NewtonPerMillimetre = 1e3;

    public static void Print(Screen screen, MountReport report, string folder, IReadOnlyList<string> files)
    {
        screen.Out.WriteLine(screen.Ink.Strong(report.Title));
        screen.Out.WriteLine($"{report.Axis}; medians over the lines");
        screen.Out.WriteLine();
        var table = new TextTable(
            ("mount", false), ("direction", false), ("stiffness", true), ("loss factor", true),
            ("not reciprocal", true), ("other directions", true), ("other mounts", true), ("from this direction alone", true));
        foreach (IdentifiedMount mount in report.Mounts)
        {
            foreach ((MountTerm term, MountEvidence evidence) in mount.Stiffness.Terms.Zip(mount.Evidence))
            {
                AddRow(table, mount, MountMedian.Of(term), evidence);
            }
        }

        table.Write(screen.Out);
        screen.Out.WriteLine();
        screen.Out.WriteLine("Omitted dofs bias the result: the last column says how far off it would be had only the dofs of that direction been measured.");
        screen.Out.WriteLine($"wrote {files.Count} files to {folder}: {string.Join(", ", files.Where(file => !file.EndsWith(".png", StringComparison.Ordinal)))}");
        screen.Out.WriteLine($"next: in an assembly, mounts: {{ identified: {{ table: {Path.Combine(folder, files.First(file => file.EndsWith(".csv", StringComparison.Ordinal)))} }} }}");
    }

    private static void AddRow(TextTable table, IdentifiedMount mount, MountMedian median, MountEvidence evidence) => table.Add(
        mount.Ends.ToString(),
        Dof.NameOf(evidence.Direction),
        evidence.Direction >= Direction.RX ? Number(median.Magnitude, "N·m/rad") : Number(median.Magnitude / NewtonPerMillimetre, "N/mm"),
        Number(median.LossFactor, ""),
        Share(evidence.NotReciprocal),
        Share(evidence.OtherDirections),
        Share(evidence.OtherMounts),
        Share(evidence.OwnEndsAlone));

    private static string Number(double value, string unit) => string.Create(CultureInfo.InvariantCulture, $"{value:G4} {unit}").TrimEnd();

    private static string Share(double ratio) => double.IsNaN(ratio) ? "" : string.Create(CultureInfo.InvariantCulture, $"{100 * ratio:G2} %");
}
