namespace Boltup.Files.UniversalFile;

/// <summary>Where and how the values of a record are stored.</summary>
/// <param name="Offset">Byte offset of the first value.</param>
/// <param name="FirstLine">Line number of the first row of ASCII data; 0 where binary data before it make lines meaningless.</param>
/// <param name="Points">Number of points that are really there.</param>
internal sealed record DataLayout(long Offset, int FirstLine, int Points, bool IsBinary, bool IsBigEndian, bool HasAbscissa, int Parts, bool IsDouble)
{
    private static readonly int[] SingleRow = [13, 13, 13, 13, 13, 13];
    private static readonly int[] DoubleRow = [20, 20, 20, 20];
    private static readonly int[] UnevenRealRow = [13, 20, 13, 20];
    private static readonly int[] UnevenComplexRow = [13, 20, 20];

    /// <summary>Whether the abscissa of binary doubles is stored in single precision.</summary>
    public bool HasSingleAbscissa { get; init; }

    /// <summary>Numbers per point, abscissa included.</summary>
    public int NumbersPerPoint => Parts + (HasAbscissa ? 1 : 0);

    public int BytesPerPoint => Parts * ValueBytes + (HasAbscissa ? AbscissaBytes : 0);

    public int ValueBytes => IsDouble ? 8 : 4;

    public int AbscissaBytes => IsDouble && !HasSingleAbscissa ? 8 : 4;

    /// <summary>Widths of the fields in a row of ASCII data.</summary>
    public int[] RowWidths => (IsDouble, HasAbscissa, Parts) switch
    {
        (false, _, _) => SingleRow,
        (true, false, _) => DoubleRow,
        (true, true, 1) => UnevenRealRow,
        (true, true, _) => UnevenComplexRow,
    };
}
