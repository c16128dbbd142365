using Boltup.Config.Binding;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>The evenly spaced lines that an assembly asks for.</summary>
/// <param name="Count">Number of lines from the first to the last that does not exceed <paramref name="ToHz"/>.</param>
public sealed record FrequencyDocument(Marked<double> FromHz, Marked<double> ToHz, Marked<double> StepHz, int Count)
{
    public FrequencyAxis ToAxis() => FrequencyAxis.Even(FromHz.Value, StepHz.Value, Count);
}
