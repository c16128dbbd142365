namespace Boltup.Files.Text;

/// <summary>Ways of writing numbers that depart from the plain one; each is noted where it is met.</summary>
[Flags]
internal enum NumberForms
{
    Plain = 0,

    /// <summary>A D where an E belongs.</summary>
    LetterD = 1,

    /// <summary>An exponent without its letter, such as <c>1.5-101</c>.</summary>
    NoLetter = 2,

    /// <summary>NaN or an infinity.</summary>
    NotFinite = 4,

    /// <summary>A field that fills its columns, so that nothing separates it from the one before.</summary>
    Touching = 8,
}
