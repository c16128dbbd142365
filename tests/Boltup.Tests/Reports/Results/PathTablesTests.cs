using System.Globalization;
using System.Numerics;
using System.Text;
using System.Text.Json;
using Boltup.Engine.Paths;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports.Results;

public class PathTablesTests
{
    [Fact]
    public void WriteContributions_OverallRows_HaveTheLevelsOfTheRanking()
    {
        string[][] rows = [.. Rows(PathTables.WriteContributions).Where(row => row[2] == "joints" && row[5] == "overall")];
        Assert.Equal(TinyPaths.ByJoint.Paths.Count, rows.Length);
        for (int i = 0; i < rows.Length; i++)
        {
            RankedPath path = TinyPaths.ByJoint.Paths[i];
            Assert.Equal(["run", "response", "joints", "joint", path.Path.Name, "overall"], rows[i][..6]);
            Assert.Equal(10 * Math.Log10(path.Power / 1e-12), Number(rows[i][6]), 1e-9);
            Assert.Equal(("1 µm/s²", path.Share, path.HalvedChange), (rows[i][7], Number(rows[i][8]), Number(rows[i][9])));
        }
    }

    [Fact]
    public void WriteContributions_Bands_AreNamedByTheirNominalFrequencies()
    {
        string[] bands = [.. Rows(PathTables.WriteContributions).Where(row => row[2] == "joints").Select(row => row[5]).Distinct()];
        Assert.Equal(["overall", "8", "10", "12.5", "16", "20", "25", "31.5"], bands[..8]);
    }

    [Fact]
    public void WriteLines_ContributionsOfOneLine_SumToTheResponse()
    {
        foreach (string view in new[] { "forces", "joints" })
        {
            string hz = TinyPaths.Axis[4].ToString(CultureInfo.InvariantCulture);
            Complex sum = Rows(PathTables.WriteLines)
                .Where(row => row[2] == view && row[5] == hz)
                .Aggregate(Complex.Zero, (total, row) => total + new Complex(Number(row[6]), Number(row[7])));
            Assert.Equal(0, Complex.Abs(sum / TinyPaths.Operation.Responses[0].Values[4] - 1), 1e-12);
        }
    }

    [Fact]
    public void WriteContributions_SilentPath_LeavesItsLevelEmpty()
    {
        PathRanking silent = TinyPaths.ByJoint with { Paths = [new RankedPath(new TransferPath(PathKind.Joint, "quiet, z"), 0, double.NaN, double.NaN)] };
        OperationResult operation = TinyPaths.Operation with { RankedPaths = [new ResponsePaths("response", PathView.Joints, silent, [])] };
        Assert.Equal(
            "run,response,joints,joint,\"quiet, z\",overall,,1 µm/s²,,",
            Text(PathTables.WriteContributions, TinyResult.Of(operation)).Split('\n')[1]);
    }

    [Fact]
    public void Summary_Paths_NamesTheStrongestOfEachView()
    {
        using var bytes = new MemoryStream();
        SummaryJson.Write(bytes, TinyPaths.Predicted, [], "1.2.3");
        using JsonDocument json = JsonDocument.Parse(bytes.ToArray());
        JsonElement[] paths = [.. json.RootElement.GetProperty("paths").EnumerateArray()];
        Assert.Equal(["forces", "joints"], paths.Select(item => item.GetProperty("view").GetString()));
        JsonElement first = paths[1].GetProperty("strongest")[0];
        Assert.Equal(TinyPaths.ByJoint.Paths[0].Path.Name, first.GetProperty("path").GetString());
        Assert.Equal(TinyPaths.ByJoint.Paths[0].Share, first.GetProperty("share").GetDouble());
    }

    private static string[][] Rows(Action<Stream, PredictionResult> write) =>
        [.. Text(write, TinyPaths.Predicted).Split('\n', StringSplitOptions.RemoveEmptyEntries).Skip(1).Select(row => row.Split(','))];

    private static string Text(Action<Stream, PredictionResult> write, PredictionResult result)
    {
        using var bytes = new MemoryStream();
        write(bytes, result);
        return Encoding.UTF8.GetString(bytes.ToArray());
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
