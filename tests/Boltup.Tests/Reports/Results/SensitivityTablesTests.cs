using System.Globalization;
using System.Text;
using Boltup.Engine.Sensitivity;
using Boltup.Reports.Results;

namespace Boltup.Tests.Reports.Results;

public class SensitivityTablesTests
{
    [Fact]
    public void Write_EveryParameter_HasARowThatReadsBack()
    {
        using var bytes = new MemoryStream();
        SensitivityTables.Write(bytes, TinyPaths.Predicted);
        string[] lines = Encoding.UTF8.GetString(bytes.ToArray()).Split('\n', StringSplitOptions.RemoveEmptyEntries);
        IReadOnlyList<LevelSensitivity> levels = TinyPaths.Operation.Sensitivities[0].Levels;
        Assert.Equal("operation,response,kind,name,direction,db,per", lines[0]);
        Assert.Equal(1 + levels.Count, lines.Length);
        Assert.StartsWith("run,response,mount_stiffness,left mount,x,", lines[1], StringComparison.Ordinal);
        for (int i = 0; i < levels.Count; i++)
        {
            Assert.Equal(levels[i].Decibels, double.Parse(lines[i + 1].Split(',')[5], CultureInfo.InvariantCulture));
        }

        Assert.Equal(["%", "%", "%", "%", "dB", "dB", "dB", "dB", "dB"], lines[1..].Select(line => line.Split(',')[6]));
    }
}
