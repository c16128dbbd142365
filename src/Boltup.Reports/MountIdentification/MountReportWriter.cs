using System.Text;
using System.Text.Json;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.MountIdentification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Diagnostics;
using Boltup.Reports.Pictures;
using Boltup.Reports.Results;

namespace Boltup.Reports.MountIdentification;

/// <summary>Writes identified mounts: for each a table that an assembly takes as it is, and a picture; and a summary of the evidence.</summary>
public static class MountReportWriter
{
    public const string SummaryFile = "summary.json";

    /// <summary>Name and version of the shape of the summary.</summary>
    public const string Format = "mount/1";

    /// <summary>Writes everything, and replaces earlier results as a whole.</summary>
    /// <returns>Names of the files in the folder, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static IReadOnlyList<string>? Write(MountReport report, string folder, bool pictures, DiagnosticBag diagnostics)
    {
        using OutputFolder? output = OutputFolder.Prepare(folder, diagnostics);
        if (output is null)
        {
            return null;
        }

        string caption = $"{report.Title} · inputs {InputFingerprint.Abbreviate(report.Inputs)} · boltup {report.ProgramVersion}";
        IReadOnlyList<Picture> pages = PictureNames.MakeDistinct([.. report.Mounts.Select(mount => MountPages.Of(mount.Stiffness, report.Axis, caption))]);
        foreach ((Picture page, IdentifiedMount mount) in pages.Zip(report.Mounts))
        {
            output.Write($"{page.Name}.csv", stream => WriteTable(stream, report.Axis, mount.Stiffness));
            if (pictures)
            {
                output.Write($"{page.Name}.png", stream => stream.Write(PictureDrawer.DrawPng(page)));
            }
        }

        output.Write(SummaryFile, stream => WriteSummary(stream, report));
        return output.Commit(diagnostics);
    }

    private static void WriteTable(Stream output, FrequencyAxis axis, MountSpectrum mount)
    {
        var csv = new CsvBytes(output);
        csv.Text("direction,frequency_hz,real,imag\n"u8);
        foreach (MountTerm term in mount.Terms)
        {
            byte[] direction = Encoding.UTF8.GetBytes(Dof.NameOf(term.Direction));
            for (int line = 0; line < axis.Count; line++)
            {
                csv.Text(direction).Comma().Number(axis[line]).Comma().Number(term.Values[line].Real).Comma().Number(term.Values[line].Imaginary).EndRow();
            }
        }

        csv.Flush();
    }

    private static void WriteSummary(Stream output, MountReport report)
    {
        using var json = new Utf8JsonWriter(output, JsonStyle.Options);
        json.WriteStartObject();
        json.WriteString("boltup", Format);
        json.WriteString("title", report.Title);
        json.WriteString("program_version", report.ProgramVersion);
        json.WriteStartArray("mounts");
        foreach (IdentifiedMount mount in report.Mounts)
        {
            WriteMount(json, mount);
        }

        json.WriteEndArray();
        DiagnosticJson.WriteList(json, report.Diagnostics);
        SharedJson.WriteInputs(json, report.Inputs);
        json.WriteEndObject();
    }

    private static void WriteMount(Utf8JsonWriter json, IdentifiedMount mount)
    {
        json.WriteStartObject();
        json.WriteString("first", mount.Ends.First);
        json.WriteString("second", mount.Ends.Second);
        json.WriteStartArray("directions");
        foreach ((MountTerm term, MountEvidence evidence) in mount.Stiffness.Terms.Zip(mount.Evidence))
        {
            WriteDirection(json, MountMedian.Of(term), evidence);
        }

        json.WriteEndArray();
        json.WriteEndObject();
    }

    private static void WriteDirection(Utf8JsonWriter json, MountMedian median, MountEvidence evidence)
    {
        json.WriteStartObject();
        json.WriteString("direction", Dof.NameOf(evidence.Direction));
        json.WriteFinite("median_stiffness", median.Magnitude);
        json.WriteString("unit", evidence.Direction >= Direction.RX ? "N·m/rad" : "N/m");
        json.WriteFinite("median_loss_factor", median.LossFactor);
        json.WriteFinite("not_reciprocal", evidence.NotReciprocal);
        json.WriteFinite("other_directions", evidence.OtherDirections);
        json.WriteFinite("other_mounts", evidence.OtherMounts);
        json.WriteFinite("own_ends_alone", evidence.OwnEndsAlone);
        json.WriteEndObject();
    }
}
