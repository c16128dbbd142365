using System.Globalization;
using System.Text;
using Boltup.Engine.Geometry;
using Boltup.Engine.Identification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Results;

namespace Boltup.Reports.Identification;

/// <summary>
/// Writes <c>source.forces.yaml</c>, a document of the kind <c>forces/1</c>: what goes from the supplier of a source to those who build it
/// in. The text is written as it should be read in a review; reading it back is tested.
/// </summary>
internal static class HandoverYaml
{
    public static void Write(Stream output, IdentificationReport report)
    {
        var yaml = new StringBuilder();
        IdentificationResult result = report.Result;
        Line(yaml, "boltup: forces/1");
        Line(yaml, $"title: {Quoted(result.Title)}");
        Line(yaml, $"obtained_by: {Quoted($"{report.Method}, ISO 20270; boltup {report.ProgramVersion}")}");
        Line(yaml, "sign: 'force that the running source exerts on an immovable foundation, time factor e^{+jωt}, N and N·m'");
        if (report.Source.MountsBelongToSource is { } inSource)
        {
            Line(yaml, $"mounts_belong_to: {(inSource ? "source" : "receiver")}");
        }

        WritePoints(yaml, report.Source);
        Line(yaml, $"directions: [{string.Join(", ", result.Interface.Select(dof => Dof.NameOf(dof.Direction)).Distinct())}]");
        Line(yaml, $"holds: {{ from: {Number(report.Holds.FromHz)} Hz, to: {Number(report.Holds.ToHz)} Hz, because: {Quoted(report.Holds.Because)} }}");
        Line(yaml, "operations:");
        foreach (IdentifiedOperation operation in result.Operations)
        {
            WriteOperation(yaml, report, operation);
        }

        Line(yaml, "inputs:");
        foreach (InputFingerprint input in report.Inputs)
        {
            Line(yaml, $"  - {{ file: {Quoted(input.File)}, sha256: '{input.Sha256}' }}");
        }

        output.Write(Encoding.UTF8.GetBytes(yaml.ToString()));
    }

    private static void WritePoints(StringBuilder yaml, SourceDescription source)
    {
        Line(yaml, "points:");
        foreach ((string name, int? node, Vector3d? at, Rotation? axes) in source.Points)
        {
            string[] keys =
            [
                .. node is { } number ? [string.Create(CultureInfo.InvariantCulture, $"node: {number}")] : Array.Empty<string>(),
                .. at is { } place ? [$"at: [{Millimetres(place.X)}, {Millimetres(place.Y)}, {Millimetres(place.Z)}]"] : Array.Empty<string>(),
                .. axes is { IsNone: false } turned ? [$"axes: {{ x: {Components(turned.X)}, y: {Components(turned.Y)} }}"] : Array.Empty<string>(),
            ];
            Line(yaml, $"  {Quoted(name)}: {{ {string.Join(", ", keys)} }}");
        }
    }

    private static void WriteOperation(StringBuilder yaml, IdentificationReport report, IdentifiedOperation operation)
    {
        Line(yaml, $"  {Quoted(operation.Name)}:");
        Line(yaml, $"    file: {Quoted(IdentificationFiles.Forces(operation.Name))}");
        Line(yaml, $"    phase: {(operation.Phase == PhaseReference.Common ? "common" : "free")}");
        Line(yaml, $"    amplitude: {(operation.Amplitude == Amplitude.Peak ? "peak" : "rms")}");
        if (operation.Scatter is not null)
        {
            Line(yaml, $"    scatter: {Quoted(IdentificationFiles.Scatter(operation.Name))}");
        }

        Line(yaml, $"    validation: {Quoted(ValidationText.Of(report.Evidence, operation.Name))}");
    }

    private static void Line(StringBuilder yaml, string text) => yaml.Append(text).Append('\n');

    /// <summary>In single quotes, where only a quote needs doubling (YAML 1.2, 7.3.2).</summary>
    private static string Quoted(string text) => $"'{text.Replace("'", "''", StringComparison.Ordinal)}'";

    private static string Number(double value) => value.ToString("R", CultureInfo.InvariantCulture);

    /// <summary>Rounded to a nanometre, so that 0.0868 m reads 86.8 mm.</summary>
    private static string Millimetres(double metres) => $"{Number(Math.Round(1e3 * metres, 6) + 0.0)} mm";

    private static string Components(Vector3d axis) => $"[{Number(axis.X)}, {Number(axis.Y)}, {Number(axis.Z)}]";
}
