using System.Numerics;
using Boltup.Engine.Spectra;
using Boltup.Files;
using Boltup.Tests.Support;

namespace Boltup.Tests.Files;

/// <summary>Files made by an independent FE code (invented data): the same FRFs in three formats.</summary>
public class ReferenceSamplesTests
{
    /// <summary>ASCII and CSV hold 13 digits.</summary>
    private const double Digits = 1e-12;

    [Theory]
    [InlineData("sample_compressor_ascii.unv", "sample_compressor.csv", Quantity.Acceleration)]
    [InlineData("sample_compressor.unv", "sample_compressor.csv", Quantity.Acceleration)]
    [InlineData("sample_ears_ascii.unv", "sample_ears.csv", Quantity.Pressure)]
    public void Read_SameFrfsInTwoFormats_Agree(string first, string second, Quantity response)
    {
        ReadFile universal = ReadFile.At(Repository.Data("files", first));
        ReadFile table = ReadFile.At(Repository.Data("files", second));
        Assert.Empty(universal.Diagnostics);
        Assert.Empty(table.Diagnostics);
        Assert.Equal(table.Curves.Count, universal.Curves.Count);
        for (int i = 0; i < table.Curves.Count; i++)
        {
            Assert.Equal(table.Curves[i].Response, universal.Curves[i].Response);
            Assert.Equal(table.Curves[i].Excitation, universal.Curves[i].Excitation);
            Assert.Equal(response, universal.Curves[i].ResponseQuantity);
            Assert.Equal(FunctionKind.Frf, universal.Curves[i].Kind);
            Assert.Equal(table.Curves[i].Axis.Hz, universal.Curves[i].Axis.Hz);
            Near.Equal(table[i], universal[i], Digits);
        }
    }

    [Fact]
    public void Read_FirstValue_IsWhatTheTextSays() =>
        Assert.Equal(
            new Complex(3.527519601263E-01, 1.454521434212E-05), ReadFile.At(Repository.Data("files", "sample_compressor_ascii.unv"))[0][0]);
}
