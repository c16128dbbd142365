using System.Buffers.Binary;
using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class PictureDrawerTests
{
    [Fact]
    public void DrawPng_AnyPage_IsAPngOfItsSize()
    {
        Assert.All(new PicturePages(TinyResult.Plain, "provenance").All(), picture =>
        {
            byte[] png = PictureDrawer.DrawPng(picture);

            Assert.Equal([0x89, (byte)'P', (byte)'N', (byte)'G'], png[..4]);
            Assert.Equal(picture.Width, BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(16)));
            Assert.Equal(picture.Height, BinaryPrimitives.ReadInt32BigEndian(png.AsSpan(20)));
        });
    }

    [Fact]
    public void DrawPng_ManyThreads_GivesTheSameBytes()
    {
        Picture picture = new PicturePages(TinyResult.Plain, "provenance").All()[1];
        byte[] alone = PictureDrawer.DrawPng(picture);

        Assert.All(Enumerable.Range(0, 8).AsParallel().Select(_ => PictureDrawer.DrawPng(picture)).ToArray(), png => Assert.Equal(alone, png));
    }

    /// <summary>The words of the axes come from the shipped font too: no name asks the machine.</summary>
    [Theory]
    [InlineData("Inter")]
    [InlineData("Some Font That Nobody Has")]
    public void CreateTypeface_AnyName_IsTheShippedFont(string name)
    {
        _ = PictureFonts.Regular;

        Assert.Equal("Inter", ScottPlot.Fonts.GetTypeface(name, bold: false, italic: false).FamilyName);
    }

    /// <summary>Every sign that pages print, and the letters of European names.</summary>
    [Fact]
    public void ShippedFont_SignsOfPages_AreAllThere() =>
        Assert.All("äöüßéñøčłğŞΔΩλωµ²³°·−…±≤≥×√|%/()[]€“”’–—", sign =>
        {
            Assert.NotEqual(0, PictureFonts.Regular.GetGlyph(sign));
            Assert.NotEqual(0, PictureFonts.Strong.GetGlyph(sign));
        });
}
