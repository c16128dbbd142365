using System.Globalization;
using System.Text;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports.Results;

public class ResultTablesTests
{
    private const string Responses = """
        operation,response,frequency_hz,real,imag,unit
        idle,"ear, left",20,3,4,Pa
        idle,"ear, left",50.5,0,0,Pa
        idle,"ear, left",1000,-0.1,1E-07,Pa
        idle,seat,20,1,0,m/s²
        idle,seat,50.5,0,1,m/s²
        idle,seat,1000,0.1,0.2,m/s²

        """;

    private const string Forces = """
        operation,joint,direction,frequency_hz,real,imag,unit
        idle,front,z,20,1,-2,N
        idle,front,z,50.5,0.5,0,N
        idle,front,z,1000,0.3333333333333333,0,N

        """;

    [Theory]
    [InlineData("")]
    [InlineData("de-DE")]
    public void WriteResponses_TinyResult_GivesExactlyTheseBytes(string culture) =>
        Assert.Equal(Responses.ReplaceLineEndings("\n"), Text(culture, ResultTables.WriteResponses, TinyResult.Plain));

    [Theory]
    [InlineData("")]
    [InlineData("de-DE")]
    public void WriteJointForces_TinyResult_GivesExactlyTheseBytes(string culture) =>
        Assert.Equal(Forces.ReplaceLineEndings("\n"), Text(culture, ResultTables.WriteJointForces, TinyResult.Plain));

    [Fact]
    public void WriteResponses_AnyNumber_ReadsBackToTheSameBits() =>
        CsCheck.Check.Sample(CsCheck.Gen.Double, value =>
        {
            ResponseSpectrum spectrum = TinyResult.Seat with { Values = [value, 0, 0] };
            string row = Text("", ResultTables.WriteResponses, TinyResult.Of(TinyResult.Operation(responses: [spectrum]))).Split('\n')[1];
            double read = double.Parse(row.Split(',')[3], CultureInfo.InvariantCulture);
            return BitConverter.DoubleToInt64Bits(read) == BitConverter.DoubleToInt64Bits(value) || (double.IsNaN(read) && double.IsNaN(value));
        });

    [Fact]
    public void WriteResponses_MoreThanOneBuffer_KeepsEveryRow()
    {
        ResponseSpectrum[] many = [.. Enumerable.Range(0, 2000).Select(i => TinyResult.Seat with { Name = $"response \"{i}\" {new string('x', i % 97)}" })];
        string text = Text("", ResultTables.WriteResponses, TinyResult.Of(TinyResult.Operation(responses: many)));
        string[] rows = text.Split('\n');

        Assert.Equal(1 + 3 * many.Length + 1, rows.Length);
        Assert.StartsWith("idle,\"response \"\"1999\"\" ", rows[^2], StringComparison.Ordinal);
        Assert.All(rows[1..^1], row => Assert.EndsWith(",m/s²", row, StringComparison.Ordinal));
    }

    private static string Text(string culture, Action<Stream, PredictionResult> write, PredictionResult result)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
            using var bytes = new MemoryStream();
            write(bytes, result);
            return Encoding.UTF8.GetString(bytes.ToArray());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
