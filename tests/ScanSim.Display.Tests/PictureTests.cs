using System.Text;
using System.Xml.Linq;
using SkiaSharp;

namespace ScanSim.Display.Tests;

public sealed class PictureTests : IDisposable
{
    private static readonly Scene Eight = SceneMaking.Scene(8, 120);
    private static readonly PictureSize Size = new(1000, 700);
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void A_png_has_the_size_asked_for_and_shows_the_scene()
    {
        Save("a.png");
        using var read = SKBitmap.Decode(folder.In("a.png"));
        using var painted = PaintedPicture.Of(Eight, new ViewOptions(), 60, Size);
        Assert.Equal((1000, 700), (read.Width, read.Height));
        Assert.Equal(painted.Pixels.Pixels, read.Pixels);
    }

    [Fact]
    public void An_svg_is_well_formed_and_needs_no_fonts()
    {
        Save("a.svg");
        var root = XDocument.Load(folder.In("a.svg")).Root!;
        Assert.Equal("svg", root.Name.LocalName);
        Assert.Equal(("1000", "700"), (root.Attribute("width")!.Value, root.Attribute("height")!.Value));
        Assert.Equal("0 0 1000 700", root.Attribute("viewBox")!.Value);
        Assert.Equal(Eight.ScenarioName, root.Elements().First().Value);
        var names = root.Descendants().Select(e => e.Name.LocalName).ToHashSet(StringComparer.Ordinal);
        Assert.DoesNotContain("text", names);
        Assert.DoesNotContain("image", names);
        Assert.Contains("path", names);
    }

    [Fact]
    public void A_name_with_angle_brackets_leaves_the_svg_well_formed()
    {
        Picture.Save(Eight with { ScenarioName = "a <b> & \"c\"" }, new ViewOptions(), 60, Size, folder.In("a.svg"));
        Assert.Equal("a <b> & \"c\"", XDocument.Load(folder.In("a.svg")).Root!.Elements().First().Value);
    }

    [Fact]
    public void An_svg_draws_each_plot_as_a_circle_of_its_own()
    {
        var scenario = SceneMaking.Scenario(1, 10);
        var builder = new SceneBuilder(scenario);
        for (var i = 0; i < 7; i++)
        {
            builder.AddPlots([SceneMaking.PlotRow(scenario.Targets[0].Id, 0, 1, 5_000 + 4_000 * i, 100)]);
        }

        Picture.Save(builder.Build(), new ViewOptions(), 2, Size, folder.In("plots.svg"));
        Picture.Save(new SceneBuilder(scenario).Build(), new ViewOptions(), 2, Size, folder.In("none.svg"));
        Assert.Equal(7, Circles("plots.svg") - Circles("none.svg"));

        int Circles(string name) => XDocument.Load(folder.In(name)).Descendants().Count(e => e.Name.LocalName is "ellipse" or "circle");
    }

    [Fact]
    public void A_pdf_is_one_page_with_its_letters_embedded()
    {
        Save("a.pdf");
        var text = Encoding.Latin1.GetString(File.ReadAllBytes(folder.In("a.pdf")));
        Assert.StartsWith("%PDF-1.", text, StringComparison.Ordinal);
        Assert.EndsWith("%%EOF", text.TrimEnd(), StringComparison.Ordinal);
        Assert.Contains("/Count 1", text, StringComparison.Ordinal);
        Assert.Contains("/MediaBox [0 0 1000 700]", text, StringComparison.Ordinal);
        Assert.Contains("/FontFile2", text, StringComparison.Ordinal);
        Assert.Contains("D:20260512061000", text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("png")]
    [InlineData("svg")]
    [InlineData("pdf")]
    public void The_same_picture_has_the_same_bytes_twice(string ending)
    {
        Save("a." + ending);
        Save("b." + ending);
        Assert.Equal(File.ReadAllBytes(folder.In("a." + ending)), File.ReadAllBytes(folder.In("b." + ending)));
    }

    [Fact]
    public void A_picture_replaces_the_one_that_stood_there_and_leaves_nothing_else()
    {
        File.WriteAllText(folder.In("a.PNG"), "old");
        Save("a.PNG");
        Assert.Equal(["a.PNG"], folder.Files());
        Assert.Equal(0x89, File.ReadAllBytes(folder.In("a.PNG"))[0]);
    }

    [Theory]
    [InlineData("a.gif", "the ending '.gif'")]
    [InlineData("a", "no ending")]
    [InlineData("a.pngx", "the ending '.pngx'")]
    public void Another_ending_is_refused_with_those_that_go(string name, string found)
    {
        var fault = Assert.Throws<PictureException>(() => Save(name));
        Assert.Contains(found, fault.Message, StringComparison.Ordinal);
        Assert.Contains(".png, .svg or .pdf", fault.Message, StringComparison.Ordinal);
        Assert.Empty(folder.Files());
    }

    [Theory]
    [InlineData(-0.001)]
    [InlineData(120.001)]
    [InlineData(double.NaN)]
    public void A_time_outside_the_recording_is_refused_and_leaves_no_file(double timeS)
    {
        var fault = Assert.Throws<PictureException>(() => Picture.Save(Eight, new ViewOptions(), timeS, Size, folder.In("a.png")));
        Assert.Contains("between 0 and 120 s", fault.Message, StringComparison.Ordinal);
        Assert.Empty(folder.Files());
    }

    [Theory]
    [InlineData(799, 600, 1)]
    [InlineData(1280, 599, 1)]
    [InlineData(1280, 900, 2)]
    [InlineData(1280, 900, 0.5)]
    [InlineData(1280, 900, double.NaN)]
    [InlineData(20_000, 900, 1)]
    [InlineData(0, 0, 1)]
    public void A_size_that_cannot_be_laid_out_is_refused(int widthPx, int heightPx, double scale) =>
        Assert.Throws<PictureException>(() => Picture.Save(Eight, new ViewOptions(), 60, new PictureSize(widthPx, heightPx, scale), folder.In("a.png")));

    [Fact]
    public void A_view_that_cannot_be_drawn_is_refused()
    {
        foreach (var view in (ViewOptions[])[new() { RangeM = 0 }, new() { RangeM = double.NaN }, new() { CentreEastM = double.PositiveInfinity }, new() { AfterglowScans = 0 }, new() { TrailScans = -1 }])
        {
            Assert.Throws<PictureException>(() => Picture.Save(Eight, view, 60, Size, folder.In("a.png")));
        }
    }

    [Fact]
    public void A_folder_that_is_not_there_is_named()
    {
        var path = folder.In(Path.Combine("missing", "a.png"));
        var fault = Assert.Throws<PictureException>(() => Picture.Save(Eight, new ViewOptions(), 60, Size, path));
        Assert.Contains(path, fault.Message, StringComparison.Ordinal);
    }

    private void Save(string name) => Picture.Save(Eight, new ViewOptions(), 60, Size, folder.In(name));
}
