using System.Globalization;
using System.Text;
using Boltup.Files.Text;
using CsCheck;

namespace Boltup.Tests.Files.Text;

public class NumberParserTests
{
    private static readonly string[] Formats = ["R", "E5", "E12", "E16", "E0", "G7", "G15", "G17"];

    [Fact]
    public void TryParse_AnyDouble_EqualsLibraryBitForBit() =>
        Gen.Select(Gen.Double, Gen.Int[0, Formats.Length - 1]).Sample(
            (value, format) => AssertAsLibrary(value.ToString(Formats[format], CultureInfo.InvariantCulture)), iter: 20_000);

    [Fact]
    public void TryParse_DigitsAroundTheExactLimits_EqualsLibraryBitForBit() =>
        Gen.Select(Gen.ULong, Gen.Int[-30, 30], Gen.Int[0, 18]).Sample(
            (digits, exponent, point) => AssertAsLibrary(WithPoint(digits, point) + FormattableString.Invariant($"E{exponent}")), iter: 20_000);

    [Theory]
    [InlineData("9007199254740991")]
    [InlineData("9007199254740992")]
    [InlineData("9007199254740993")]
    [InlineData("-0")]
    [InlineData("1E22")]
    [InlineData("1E23")]
    [InlineData("1E-22")]
    [InlineData("1E-23")]
    [InlineData("0.000000000000000000000000000001")]
    [InlineData("123456789012345678901234567890")]
    [InlineData("4.9406564584124654E-324")]
    [InlineData("1.7976931348623157E+308")]
    [InlineData(".5")]
    [InlineData("5.")]
    [InlineData("+5e3")]
    public void TryParse_EdgeOfTheQuickPath_EqualsLibrary(string text) => AssertAsLibrary(text);

    [Theory]
    [InlineData("1.5D+02", 150, NumberForms.LetterD)]
    [InlineData("1.5d-1", 0.15, NumberForms.LetterD)]
    [InlineData("1.5-101", 1.5e-101, NumberForms.NoLetter)]
    [InlineData("-1.5+101", -1.5e101, NumberForms.NoLetter)]
    [InlineData("NaN", double.NaN, NumberForms.NotFinite)]
    [InlineData("-Infinity", double.NegativeInfinity, NumberForms.NotFinite)]
    [InlineData("1.#QNAN", double.NaN, NumberForms.NotFinite)]
    public void TryParse_OldForms_AreReadAndNamed(string text, double expected, object form)
    {
        NumberForms forms = NumberForms.Plain;
        Assert.True(NumberParser.TryParse(Encoding.ASCII.GetBytes(text), out double value, ref forms));
        Assert.Equal(expected, value);
        Assert.Equal((NumberForms)form, forms);
    }

    [Theory]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("-")]
    [InlineData(".")]
    [InlineData("E5")]
    [InlineData("1E")]
    [InlineData("1E+")]
    [InlineData("1.2.3")]
    [InlineData("1,5")]
    [InlineData("1 2")]
    [InlineData("0x10")]
    [InlineData("1D2D3")]
    [InlineData("1-2-3")]
    public void TryParse_NoNumber_IsRefused(string text) => Assert.False(NumberParser.TryParse(Encoding.ASCII.GetBytes(text), out _));

    [Fact]
    public void TryParse_LongNumber_IsNotCutOff() => AssertAsLibrary(new string('1', 200) + "." + new string('7', 200) + "E-150");

    private static string WithPoint(ulong digits, int point)
    {
        string text = digits.ToString(CultureInfo.InvariantCulture);
        return point >= text.Length ? text : text.Insert(point, ".");
    }

    private static void AssertAsLibrary(string text)
    {
        Assert.True(NumberParser.TryParse(Encoding.ASCII.GetBytes(text), out double value), text);
        double expected = double.Parse(text, CultureInfo.InvariantCulture);
        Assert.True(BitConverter.DoubleToInt64Bits(expected) == BitConverter.DoubleToInt64Bits(value), text);
    }
}
