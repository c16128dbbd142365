using System.Globalization;
using Boltup.Config.Units;
using CsCheck;

namespace Boltup.Tests.Config.Units;

public class QuantityParserTests
{
    [Theory]
    [InlineData("120 N/mm", 120e3)]
    [InlineData("120N/mm", 120e3)]
    [InlineData(" 120  N / mm ", 120e3)]
    [InlineData("1.2e2 N/mm", 120e3)]
    [InlineData("+.5 kN/m", 500)]
    [InlineData("-3 MN/m", -3e6)]
    [InlineData("2 N/um", 2e6)]
    [InlineData("2 N/μm", 2e6)]
    public void Parse_Stiffness_GivesNewtonsPerMetre(string text, double expected) =>
        Assert.Equal(expected, QuantityParser.Parse(text, Dimension.Stiffness).Si);

    [Theory]
    [InlineData("12 N·s/m")]
    [InlineData("12 N*s/m")]
    [InlineData("12 N s/m")]
    [InlineData("12 N⋅s/m")]
    [InlineData("12 N · s / m")]
    [InlineData("12 Ns/m")]
    [InlineData("0.012 N·s/mm")]
    public void Parse_DampingSpellings_AreTheSame(string text) =>
        Assert.Equal(12, QuantityParser.Parse(text, Dimension.Damping).Si);

    [Theory]
    [InlineData("92 mm", 0.092)]
    [InlineData("61 mm", 0.061)]
    [InlineData("0.3 mm", 0.0003)]
    [InlineData("12.7 cm", 0.127)]
    public void Parse_Lengths_AreTheNearestDouble(string text, double expected) =>
        Assert.Equal(expected, QuantityParser.Parse(text, Dimension.Length).Si);

    [Theory]
    [InlineData("2 kg*m^2")]
    [InlineData("2 kg·m²")]
    [InlineData("2 kg m^2")]
    [InlineData("2000 g·m²")]
    public void Parse_InertiaSpellings_AreTheSame(string text) =>
        Assert.Equal(2, QuantityParser.Parse(text, Dimension.Inertia).Si);

    [Fact]
    public void Parse_MilliNewtonAndMetreNewton_AreNotConfused()
    {
        Assert.Equal(0.003, QuantityParser.Parse("3 mN", Dimension.Force).Si);
        Assert.Equal(QuantityFault.UnknownUnit, QuantityParser.Parse("3 m N", Dimension.Force).Fault);
        Assert.Equal(QuantityFault.WrongDimension, QuantityParser.Parse("3 Nm", Dimension.Force).Fault);
        Assert.Equal(QuantityFault.WrongDimension, QuantityParser.Parse("3 mPa", Dimension.Force).Fault);
        Assert.Equal(3e6, QuantityParser.Parse("3 MPa", Dimension.Pressure).Si);
    }

    [Theory]
    [InlineData("120", QuantityFault.NoUnit)]
    [InlineData("120 ", QuantityFault.NoUnit)]
    [InlineData("", QuantityFault.NotANumber)]
    [InlineData("N/mm", QuantityFault.NotANumber)]
    [InlineData("NaN N/mm", QuantityFault.NotANumber)]
    [InlineData("1e400 N/mm", QuantityFault.NotANumber)]
    [InlineData("- N/mm", QuantityFault.NotANumber)]
    [InlineData(". N/mm", QuantityFault.NotANumber)]
    [InlineData("1,5 N/mm", QuantityFault.DecimalComma)]
    [InlineData("1e N/mm", QuantityFault.UnknownUnit)]
    [InlineData("1 2 N/mm", QuantityFault.UnknownUnit)]
    [InlineData("１ N/mm", QuantityFault.NotANumber)]
    [InlineData("5 rpm", QuantityFault.WrongDimension)]
    public void Parse_WrongText_SaysWhy(string text, QuantityFault fault) =>
        Assert.Equal(fault, QuantityParser.Parse(text, Dimension.Stiffness).Fault);

    [Fact]
    public void Parse_AnyDoubleAsText_ComesBackUnchanged() =>
        Gen.Double.Where(double.IsFinite).Sample(value =>
            QuantityParser.Parse(value.ToString("R", CultureInfo.InvariantCulture) + " N/m", Dimension.Stiffness).Si == value);

    [Fact]
    public void Parse_AnyText_NeverThrows() =>
        Gen.String.Sample(text =>
        {
            _ = QuantityParser.Parse(text, Dimension.Stiffness);
            _ = UnitTable.Find(text);
        });
}
