namespace Boltup.Files.UniversalFile;

/// <summary>A departure from the format that is read all the same.</summary>
/// <param name="Rule">The rule that the file breaks, and how it was understood.</param>
internal sealed record Liberty(string Rule)
{
    public static readonly Liberty NarrowAbscissa = new("line 7 has its first abscissa and step in narrower columns than 13: read where they stand");

    public static readonly Liberty NoFinalDelimiter = new("the last dataset is not closed by `    -1`: its values are complete and were read");

    public static readonly Liberty TooFewValues = new("a record declares more values than it holds: those that are there were read");

    public static readonly Liberty TooManyValues = new("a record holds more values than it declares: the surplus was left out");

    public static readonly Liberty PaddedRow = new("the last row of a record is padded: the padding was left out");

    public static readonly Liberty WrongByteCount = new("a 58b record declares a wrong byte count: its end was found by the number of values");

    public static readonly Liberty SearchedEnd = new("a 58b record declares a wrong byte count and a wrong number of values: its end was found by searching for `    -1`");

    public static readonly Liberty LineEndBeforeDelimiter = new("line ends stand between the data of a 58b record and its `    -1`: passed over");

    public static readonly Liberty DofFromName = new("a function has no node or direction, and a name that reads as point.direction: the name was taken");

    public static readonly Liberty PressureWithDirection = new("a sound pressure has a direction: read as scalar");

    public static readonly Liberty NoAbscissaType = new("a function does not say that its abscissa is frequency: taken as frequency, as its type implies");

    public static readonly Liberty ComplexRatio = new("coherence or an auto-spectrum is stored complex: its imaginary part is dropped");

    public static readonly Liberty RealFrf = new("an FRF or spectrum is stored real: its imaginary part is zero");

    public static readonly Liberty LetterD = new("exponents are written with a D: read as E");

    public static readonly Liberty NoExponentLetter = new("exponents of three digits have no letter, such as `1.5-101`: read as `1.5E-101`");

    public static readonly Liberty TouchingNumbers = new("numbers stand next to each other without a blank: read by their columns");

    public static readonly Liberty Utf8Header = new("a header line holds characters beyond ASCII: read as UTF-8");

    public static readonly Liberty Latin1Header = new("a header line holds characters beyond ASCII that are not UTF-8: read as Latin-1");

    public static readonly Liberty MixedLineEnds = new("lines end in different ways: LF, CR LF and CR were all taken");

    public static readonly Liberty BlankIdentification = new("the identification lines of a function are blank: it has no title");

    public static readonly Liberty ReactionForce = new("a force is called a reaction force (data type 9): read as a force, its sign as it is");

    public static readonly Liberty NotANumber = new("a record holds values that are no finite numbers: they were kept as they are");
}
