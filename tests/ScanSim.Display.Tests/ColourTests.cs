using ScanSim.Display.Painting;
using ScanSim.Testing;
using SkiaSharp;

namespace ScanSim.Display.Tests;

public sealed class ColourTests
{
    /// <summary>
    /// A just noticeable difference is about 2.3 (M. Mahy, L. Van Eycken, A. Oosterlinck, Evaluation of uniform color spaces developed
    /// after the adoption of CIELAB and CIELUV, Color Research and Application 19, 1994); small marks need several times that.
    /// </summary>
    private const double LeastDistance = 15;

    private static readonly string[] Kinds = ["none", "protanopia", "deuteranopia", "tritanopia"];

    public static TheoryData<Theme, string> ThemesAndKinds()
    {
        var cases = new TheoryData<Theme, string>();
        foreach (var theme in Enum.GetValues<Theme>())
        {
            foreach (var kind in Kinds)
            {
                cases.Add(theme, kind);
            }
        }

        return cases;
    }

    [Theory]
    [MemberData(nameof(ThemesAndKinds))]
    public void Outcomes_are_told_apart_by_colour_with_any_kind_of_dichromacy(Theme theme, string kind)
    {
        var colours = Colours.Of(theme);
        AllApart(kind, [.. Enum.GetValues<LookOutcome>().Select(o => (o.ToString(), colours.Outcomes[(int)o])), ("ground", colours.Ground)]);
    }

    [Theory]
    [MemberData(nameof(ThemesAndKinds))]
    public void Plots_false_plots_truth_and_ground_are_told_apart_by_colour_with_any_kind_of_dichromacy(Theme theme, string kind)
    {
        var colours = Colours.Of(theme);
        AllApart(kind, [("plot", colours.Plot), ("false plot", colours.FalsePlot), ("truth", colours.Truth), ("ground", colours.Ground)]);
    }

    [Fact]
    public void Coloured_states_have_the_published_colours()
    {
        var table = ReferenceTable.Load("palette-okabe-ito-2008.csv");
        var published = table.Rows
            .Select(r => new SKColor((byte)table.Whole(r, "red"), (byte)table.Whole(r, "green"), (byte)table.Whole(r, "blue")))
            .ToHashSet();
        Assert.Equal(8, published.Count);
        foreach (var colours in (Colours[])[Colours.Dark, Colours.Paper])
        {
            Assert.Contains(colours.Plot, published);
            Assert.Contains(colours.FalsePlot, published);
            Assert.All(Enum.GetValues<LookOutcome>().Where(o => o != LookOutcome.NoLook), o => Assert.Contains(colours.Outcomes[(int)o], published));
        }
    }

    /// <summary>Contrast ratio and its least value for text: W3C, Web Content Accessibility Guidelines 2.1, success criterion 1.4.3 (AA).</summary>
    [Theory]
    [InlineData(Theme.Dark)]
    [InlineData(Theme.Paper)]
    public void Text_stands_out_from_its_ground_by_a_contrast_of_4_5(Theme theme)
    {
        var colours = Colours.Of(theme);
        foreach (var ground in (SKColor[])[colours.Ground, colours.Panel])
        {
            foreach (var ink in (SKColor[])[colours.Ink, colours.Quiet, colours.GridText])
            {
                var (a, b) = (Luminance(ink), Luminance(ground));
                Assert.True((Math.Max(a, b) + 0.05) / (Math.Min(a, b) + 0.05) >= 4.5, $"{ink} on {ground}");
            }
        }
    }

    private static void AllApart(string kind, IReadOnlyList<(string Name, SKColor Colour)> named)
    {
        var matrix = Matrix(kind);
        for (var i = 0; i < named.Count; i++)
        {
            for (var j = i + 1; j < named.Count; j++)
            {
                var distance = Distance(Lab(Seen(matrix, named[i].Colour)), Lab(Seen(matrix, named[j].Colour)));
                Assert.True(distance >= LeastDistance, $"{named[i].Name} and {named[j].Name}: {distance:0.0}, {kind}");
            }
        }
    }

    private static double[][]? Matrix(string kind)
    {
        var table = ReferenceTable.Load("dichromacy-machado-2009.csv");
        var rows = table.Rows.Where(r => table.Text(r, "kind") == kind)
            .Select(r => (double[])[table.Number(r, "r"), table.Number(r, "g"), table.Number(r, "b")]).ToArray();
        Assert.Equal(kind == "none" ? 0 : 3, rows.Length);
        return rows.Length == 0 ? null : rows;
    }

    private static double[] Seen(double[][]? matrix, SKColor colour)
    {
        double[] rgb = [Linear(colour.Red), Linear(colour.Green), Linear(colour.Blue)];
        return matrix is null ? rgb : [.. matrix.Select(row => Math.Clamp(row[0] * rgb[0] + row[1] * rgb[1] + row[2] * rgb[2], 0, 1))];
    }

    /// <summary>sRGB (IEC 61966-2-1) to linear.</summary>
    private static double Linear(byte component)
    {
        var c = component / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.Pow((c + 0.055) / 1.055, 2.4);
    }

    private static double Luminance(SKColor c) => 0.2126 * Linear(c.Red) + 0.7152 * Linear(c.Green) + 0.0722 * Linear(c.Blue);

    /// <summary>CIELAB 1976 of linear sRGB, white D65.</summary>
    private static (double L, double A, double B) Lab(double[] rgb)
    {
        var x = F((0.4124 * rgb[0] + 0.3576 * rgb[1] + 0.1805 * rgb[2]) / 0.9505);
        var y = F(0.2126 * rgb[0] + 0.7152 * rgb[1] + 0.0722 * rgb[2]);
        var z = F((0.0193 * rgb[0] + 0.1192 * rgb[1] + 0.9505 * rgb[2]) / 1.0890);
        return (116 * y - 16, 500 * (x - y), 200 * (y - z));

        static double F(double t) => t > 216.0 / 24389 ? Math.Cbrt(t) : (24389.0 / 27 * t + 16) / 116;
    }

    private static double Distance((double L, double A, double B) p, (double L, double A, double B) q) =>
        Math.Sqrt((p.L - q.L) * (p.L - q.L) + (p.A - q.A) * (p.A - q.A) + (p.B - q.B) * (p.B - q.B));
}
