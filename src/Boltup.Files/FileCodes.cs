using Boltup.Engine.Diagnostics;

namespace Boltup.Files;

/// <summary>Diagnostics of the readers: what is wrong with a data file, and which liberties were taken to read it.</summary>
public static class FileCodes
{
    public static readonly DiagnosticCode CannotRead = new(
        "DAT001",
        "a data file cannot be read",
        "The operating system refuses to open or read the file.",
        "a file without read permission",
        "Check path and permissions.");

    public static readonly DiagnosticCode UnknownFormat = new(
        "DAT002",
        "a data file is in no known format",
        "Neither a Universal File nor one of the CSV tables of Boltup begins like this file.",
        "a spreadsheet saved in its own format",
        "Export as Universal File 58 or 58b, or as CSV with one of the headers that the message names.");

    public static readonly DiagnosticCode BadHeader = new(
        "DAT003",
        "a record header cannot be understood",
        "A line of the header of a dataset does not have the fields that the format prescribes, so nothing of the record can be trusted.",
        "a dataset 58 whose seventh line has letters in place of the number of values",
        "Export the file again; the other records of the file were read.");

    public static readonly DiagnosticCode Truncated = new(
        "DAT004",
        "a record is truncated",
        "The file ends, or the next dataset begins, before the record is complete. The record was left out; complete ones were read.",
        "a file whose copy was interrupted",
        "Copy or export the file again.");

    public static readonly DiagnosticCode BadNumber = new(
        "DAT005",
        "a number cannot be read",
        "The text at this place is no number.",
        "m1.x,20,1.2.3,0",
        "Correct the file. Numbers have a decimal point, and no thousands separators or units.");

    public static readonly DiagnosticCode UnsupportedFloats = new(
        "DAT006",
        "a binary record uses floats that are not supported",
        "The record says that its numbers are in VMS or IBM format, which was used before IEEE 754.",
        "dataset 58b with the float format 1 or 3",
        "Export with IEEE floats (format 2), or as ASCII.");

    public static readonly DiagnosticCode BadAxis = new(
        "DAT007",
        "the frequencies of a record are no axis",
        "Frequencies must be finite, not negative, and strictly increasing.",
        "two rows of one curve at 20 Hz",
        "Correct the frequencies.");

    public static readonly DiagnosticCode BadCsvHeader = new(
        "DAT008",
        "a CSV header is not known",
        "The columns decide what a table is: FRFs, spectra at dofs, or dynamic stiffness.",
        "response,excitation,frequency,real,imag",
        "Use one of the headers that the message names, exactly.");

    public static readonly DiagnosticCode BadCsvRow = new(
        "DAT009",
        "a CSV row does not fit its header",
        "A row has another number of fields than the header, or a field that is no dof or direction.",
        "m1.x,20,0.5",
        "Correct the row.");

    public static readonly DiagnosticCode NothingThere = new(
        "DAT010",
        "a data file holds no function over frequency",
        "The file could be read, but there is nothing in it that can be used.",
        "a Universal File with geometry only",
        "Name another file.");

    public static readonly DiagnosticCode SkippedDataset = new(
        "DAT011",
        "datasets were skipped",
        "Datasets of this number play no role here.",
        "dataset 2412 (elements)",
        "Nothing to do.");

    public static readonly DiagnosticCode SkippedFunction = new(
        "DAT012",
        "functions were skipped",
        "The function is not over frequency, so it cannot be used here.",
        "a time history (abscissa type 17)",
        "Nothing to do.");

    public static readonly DiagnosticCode Liberty = new(
        "DAT013",
        "the file departs from the format, and was read all the same",
        "The note names the rule that the file breaks and how it was understood.",
        "a 58b record whose byte count is wrong",
        "Check that the way it was understood is what is meant.");

    public static readonly DiagnosticCode SignTurned = new(
        "DAT014",
        "a negative direction was turned",
        "The file gives the function along a negative axis (direction −1, −2 …). It was read along the positive axis with its sign changed.",
        "response direction −3",
        "Nothing to do.");

    public static readonly DiagnosticCode UnitConverted = new(
        "DAT015",
        "values were converted to SI units",
        "The file states other units, in dataset 164 or by the label g of an acceleration.",
        "accelerations in g without dataset 164",
        "Nothing to do.");
}
