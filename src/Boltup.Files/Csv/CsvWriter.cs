using System.Globalization;
using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Files.Csv;

/// <summary>Writes the tables that <see cref="CsvReader"/> reads; numbers in the shortest form that reads back to the same double.</summary>
public static class CsvWriter
{
    /// <summary>Writes FRFs: the header, then curve after curve.</summary>
    public static void WriteFrfs(TextWriter output, FrequencyAxis axis, IEnumerable<(Dof Response, Dof Excitation, Complex[] Values)> curves)
    {
        output.Write($"{CsvHeader.Frf.Text}\n");
        foreach ((Dof response, Dof excitation, Complex[] values) in curves)
        {
            WriteCurve(output, $"{Quote(response)},{Quote(excitation)}", axis, values);
        }
    }

    /// <summary>Writes spectra at dofs, such as forces.</summary>
    public static void WriteSpectra(TextWriter output, FrequencyAxis axis, IEnumerable<(Dof Dof, Complex[] Values)> curves)
    {
        output.Write($"{CsvHeader.Spectrum.Text}\n");
        foreach ((Dof dof, Complex[] values) in curves)
        {
            WriteCurve(output, Quote(dof), axis, values);
        }
    }

    private static void WriteCurve(TextWriter output, string name, FrequencyAxis axis, Complex[] values)
    {
        for (int line = 0; line < axis.Count; line++)
        {
            output.Write(string.Create(CultureInfo.InvariantCulture, $"{name},{axis[line]:R},{values[line].Real:R},{values[line].Imaginary:R}\n"));
        }
    }

    private static string Quote(Dof dof)
    {
        string text = dof.ToString();
        return text.AsSpan().ContainsAny(',', '"') ? $"\"{text.Replace("\"", "\"\"", StringComparison.Ordinal)}\"" : text;
    }
}
