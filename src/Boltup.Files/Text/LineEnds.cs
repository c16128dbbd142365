namespace Boltup.Files.Text;

/// <summary>Kinds of line end.</summary>
[Flags]
internal enum LineEnds
{
    None = 0,
    Lf = 1,
    CrLf = 2,
    Cr = 4,
}
