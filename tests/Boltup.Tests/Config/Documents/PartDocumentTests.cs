using Boltup.Config;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Config.Documents;

public class PartDocumentTests
{
    [Fact]
    public void LoadPart_Measured_HoldsPointsAndFiles()
    {
        using ConfigFolder folder = Samples.Folder();
        PartDocument part = folder.LoadPart("parts/compressor.part.yaml").Document!;

        Assert.Equal(new Vector3d(0.092, 0.061, 0), part.Points[0].At!.Value);
        Assert.Equal((101, new SourceSpan("parts/compressor.part.yaml", 4, 15, 3)), (part.Points[0].Node!.Value, part.Points[0].Node!.Span));
        Assert.Equal(new Rotation(new(0, 1, 0), new(-1, 0, 0), new(0, 0, 1)), part.Points[1].Axes!.Value);
        var model = Assert.IsType<FrfModelDocument>(part.Model);
        Assert.Null(model.Files[0].MotionQuantity);
        Assert.Equal(FrfQuantity.Accelerance, model.Files[1].MotionQuantity!.Value);
        Assert.Equal(Path.Combine(folder.Root, "parts", "compressor.uff"), model.Files[0].File.FullPath);
        Assert.True(part.FillsReciprocity!.Value);
        Assert.Equal(["m1", "m2"], part.KnownPoints!);
    }

    [Fact]
    public void LoadPart_Lumped_HoldsMassesAndLinks()
    {
        using ConfigFolder folder = Samples.Folder();
        PartDocument part = folder.LoadPart("parts/body.part.yaml").Document!;

        var model = Assert.IsType<LumpedModelDocument>(part.Model);
        Assert.Equal(Direction.X, model.Direction.Value);
        Assert.Equal([1.5, 0.7, 0.4], model.Masses.Select(mass => mass.MassKg.Value));
        Assert.Equal(("s1", "s2", 400e3, 0.02, 0.0),
            (model.Links[0].First.Value, model.Links[0].Second.Value, model.Links[0].StiffnessNPerM, model.Links[0].LossFactor, model.Links[0].DampingNsPerM));
        Assert.Equal(("s3", null, 20e3, 12.0),
            (model.Links[1].First.Value, model.Links[1].Second.Value, model.Links[1].StiffnessNPerM, model.Links[1].DampingNsPerM));
        Assert.Equal(["s1", "s2", "s3"], part.KnownPoints!);
    }

    [Fact]
    public void LoadPart_NoPoints_LeavesNamesToTheData()
    {
        using ConfigFolder folder = Samples.Folder().With("a.part.yaml", "boltup: part/1\nfrf: [ { file: parts/extra.csv } ]\n");
        Assert.Null(folder.LoadPart().Document!.KnownPoints);
    }

    [Theory]
    [InlineData("x: [0, 1, 0], y: [-1, 0, 0]")]
    [InlineData("y: [-1, 0, 0], z: [0, 0, 1]")]
    [InlineData("x: [0, 1, 0], z: [0, 0, 1]")]
    [InlineData("x: [0, 1, 0], y: [-1, 0, 0], z: [0, 0, 1]")]
    public void Axes_AnyTwo_AreCompletedRightHanded(string axes)
    {
        using ConfigFolder folder = new ConfigFolder().With("a.part.yaml",
            $"boltup: part/1\nlumped: {{ direction: x, masses: {{ s: 1 kg }} }}\npoints: {{ s: {{ axes: {{ {axes} }} }} }}\n");
        Rotation found = folder.LoadPart().Document!.Points[0].Axes!.Value;
        Assert.Equal(new Rotation(new(0, 1, 0), new(-1, 0, 0), new(0, 0, 1)), found);
    }

    [Fact]
    public void LoadPart_SeveralMistakes_ReportsThemAllAtOnce()
    {
        using ConfigFolder folder = new ConfigFolder().With("a.part.yaml",
            "boltup: part/1\ntitel: x\nlumped:\n  direction: q\n  masses: { a: 1, b: 2 kgg }\n  links: [ { stiffness: 3 kg } ]\n");
        Assert.Null(folder.LoadPart().Document);
        Assert.Equal(["CFG012", "CFG016", "CFG030", "CFG031", "CFG013", "CFG032"], folder.Diagnostics.Items.Select(item => item.Code.Code));
    }

    [Fact]
    public void KindOf_EitherKind_IsRecognized()
    {
        using ConfigFolder folder = Samples.Folder();
        LoadOptions options = new() { WorkingDirectory = folder.Root };
        Assert.Equal(DocumentKind.Assembly, ConfigLoader.KindOf("a.assembly.yaml", options, folder.Diagnostics));
        Assert.Equal(DocumentKind.Part, ConfigLoader.KindOf("parts/body.part.yaml", options, folder.Diagnostics));
        Assert.Empty(folder.Diagnostics.Items);
    }
}
