namespace Boltup.Files.Csv;

/// <summary>The tables that a CSV may be, by their first row.</summary>
internal sealed record CsvHeader(string Text, string Format, FunctionKind Kind, int NameColumns)
{
    public static readonly CsvHeader Frf = new("response,excitation,frequency_hz,real,imag", "CSV of FRFs", FunctionKind.Frf, 2);

    public static readonly CsvHeader Spectrum = new("dof,frequency_hz,real,imag", "CSV of spectra", FunctionKind.Spectrum, 1);

    /// <summary>Auto and cross spectra: the row dof times the conjugate of the column dof.</summary>
    public static readonly CsvHeader CrossSpectra = new(
        "row,column,frequency_hz,real,imag", "CSV of auto and cross spectra", FunctionKind.CrossSpectrum, 2);

    public static readonly CsvHeader Stiffness = new(
        "direction,frequency_hz,real,imag", "CSV of dynamic stiffness", FunctionKind.MountStiffness, 1);

    /// <summary>Several tables of one mount, told apart by what they were measured at, such as a temperature or preload.</summary>
    public static readonly CsvHeader StiffnessFamily = new(
        "at,direction,frequency_hz,real,imag", "CSV of dynamic stiffness", FunctionKind.MountStiffness, 2);

    /// <summary>Driving-point and transfer stiffness of a mount with mass effect.</summary>
    public static readonly CsvHeader TwoPort = new(
        "term,direction,frequency_hz,real,imag", "CSV of dynamic stiffness", FunctionKind.MountStiffness, 2);

    public static readonly CsvHeader TwoPortFamily = new(
        "at,term,direction,frequency_hz,real,imag", "CSV of dynamic stiffness", FunctionKind.MountStiffness, 3);

    public static IReadOnlyList<CsvHeader> All { get; } = [Frf, Spectrum, CrossSpectra, Stiffness, StiffnessFamily, TwoPort, TwoPortFamily];

    /// <summary>What each name column holds.</summary>
    public IReadOnlyList<CsvName> Names { get; } = [.. Text.Split(',').Take(NameColumns).Select(CsvName.Of)];

    /// <summary>All headers, for messages.</summary>
    public static string KnownText => string.Join("; ", All.Select(header => $"`{header.Text}`"));

    /// <summary>Number of columns.</summary>
    public int Columns => NameColumns + 3;

    /// <summary>The known header that shares most columns with a wrong one.</summary>
    public static CsvHeader Nearest(string text)
    {
        string[] found = text.ToLowerInvariant().Split(',', StringSplitOptions.TrimEntries);
        return All.MaxBy(header => header.Text.Split(',').Count(found.Contains))!;
    }
}
