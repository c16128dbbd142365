using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Reports.Pictures;
using Boltup.Reports.Results;

namespace Boltup.Reports.Identification;

/// <summary>Writes everything that an identification leaves behind.</summary>
public static class IdentificationWriter
{
    /// <summary>Writes data files and pictures, and replaces earlier results as a whole.</summary>
    /// <param name="more">Further files: what other layers know to write.</param>
    /// <returns>Names of the files in the folder, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static IReadOnlyList<string>? Write(
        IdentificationReport report, string folder, bool pictures, IReadOnlyList<(string Name, Action<Stream> Write)> more, DiagnosticBag diagnostics)
    {
        using OutputFolder? output = OutputFolder.Prepare(folder, diagnostics);
        if (output is null)
        {
            return null;
        }

        Parallel.Invoke(
            () => WriteForces(report, output),
            () => output.Write(IdentificationFiles.Validation, stream => IdentificationTables.WriteValidation(stream, report)),
            () => output.Write(IdentificationFiles.ValidationBands, stream => IdentificationTables.WriteValidationBands(stream, report)),
            () => output.Write(IdentificationFiles.Quality, stream => QualityTable.Write(stream, report)),
            () => WriteOthers(report, output, more),
            () => WritePictures(report, output, pictures));
        return output.Commit(diagnostics);
    }

    private static void WriteForces(IdentificationReport report, OutputFolder output)
    {
        foreach (IdentifiedOperation operation in report.Result.Operations)
        {
            output.Write(IdentificationFiles.Forces(operation.Name), stream => IdentificationTables.WriteForces(stream, report.Result, operation));
            if (operation.Scatter is { } scatter)
            {
                output.Write(IdentificationFiles.Scatter(operation.Name), stream => IdentificationTables.WriteSpectra(stream, scatter));
            }
        }
    }

    private static void WriteOthers(IdentificationReport report, OutputFolder output, IReadOnlyList<(string Name, Action<Stream> Write)> more)
    {
        output.Write(IdentificationFiles.Handover, stream => HandoverYaml.Write(stream, report));
        output.Write(IdentificationFiles.Summary, stream => IdentificationSummary.Write(stream, report));
        if (report.Evidence.Stiffness is { } stiffness)
        {
            output.Write(IdentificationFiles.Stiffness, stream => IdentificationTables.WriteStiffness(stream, stiffness));
        }

        foreach (RouteResult route in report.Evidence.Routes)
        {
            output.Write(IdentificationFiles.Route(route.Name, route.Operation), stream => IdentificationTables.WriteSpectra(stream, route.Forces.Forces));
        }

        foreach ((string name, Action<Stream> write) in more)
        {
            output.Write(name, write);
        }
    }

    private static void WritePictures(IdentificationReport report, OutputFolder output, bool pictures)
    {
        if (pictures)
        {
            IReadOnlyList<Picture> pages = PictureNames.MakeDistinct(new IdentificationPages(report).All());
            Parallel.ForEach(pages, picture => output.Write($"{picture.Name}.png", stream => stream.Write(PictureDrawer.DrawPng(picture))));
        }
    }
}
