using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Files.UniversalFile;

/// <summary>Writes force spectra as a Universal File.</summary>
public static class ForceFile
{
    /// <param name="nodeOf">Node number of a point name.</param>
    /// <param name="program">Which program writes, as the header says.</param>
    public static void Write(Stream output, SpectrumSet forces, Amplitude amplitude, string title, string program, Func<string, int> nodeOf)
    {
        var writer = new UniversalFileWriter(output);
        writer.WriteHeader(title, program);
        writer.WriteUnits();
        for (int i = 0; i < forces.Dofs.Count; i++)
        {
            var curve = new Curve
            {
                Index = i,
                Kind = FunctionKind.Spectrum,
                Response = forces.Dofs[i] with { Point = FormattableString.Invariant($"{nodeOf(forces.Dofs[i].Point)}") },
                ResponseQuantity = Quantity.Force,
                Axis = forces.Axis,
                Amplitude = amplitude,
                Title = $"{title}: blocked force at {forces.Dofs[i]}, {(amplitude == Amplitude.Peak ? "peak" : "rms")}",
                Span = new SourceSpan(""),
            };
            writer.WriteFunction(curve, forces.Values[i], new UniversalFileStorage());
        }
    }
}
