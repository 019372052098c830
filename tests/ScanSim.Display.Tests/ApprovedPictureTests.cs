using ScanSim.Scenarios;
using ScanSim.Testing;
using SkiaSharp;

namespace ScanSim.Display.Tests;

/// <summary>
/// Pictures that someone has looked at. After a wanted change: run with SCANSIM_APPROVE=1, look at tests/ScanSim.Display.Tests/approved, commit.
/// </summary>
public sealed class ApprovedPictureTests
{
    /// <summary>Rasterisers of other processors round edges differently: a few levels, in a few pixels.</summary>
    private const int LevelsAllowed = 24;
    private const double ShareAllowed = 0.001;

    public static TheoryData<string> Names => ["eight-dark", "fifty-paper", "hours-dark", "sector-zoomed-paper"];

    [Theory]
    [MemberData(nameof(Names))]
    public void The_picture_looks_as_approved(string name)
    {
        using var picture = Make(name);
        var approvedPath = Path.Combine(RepositoryRoot.Find(), "tests", "ScanSim.Display.Tests", "approved", name + ".png");
        if (Environment.GetEnvironmentVariable("SCANSIM_APPROVE") == "1")
        {
            Directory.CreateDirectory(Path.GetDirectoryName(approvedPath)!);
            Write(picture.Pixels, approvedPath);
        }

        using var approved = SKBitmap.Decode(approvedPath);
        Assert.NotNull(approved);
        Assert.Equal((approved.Width, approved.Height), (picture.Pixels.Width, picture.Pixels.Height));
        var differing = approved.Pixels.Zip(picture.Pixels.Pixels).Count(p => Differ(p.First, p.Second));
        if (differing > ShareAllowed * approved.Width * approved.Height)
        {
            var foundPath = Path.Combine(Path.GetTempPath(), "scansim-" + name + ".png");
            Write(picture.Pixels, foundPath);
            Assert.Fail($"{differing} pixels differ from {approvedPath}; what was painted is in {foundPath}");
        }
    }

    [Fact]
    public void The_comparison_notices_one_label_that_is_gone()
    {
        var scene = SceneMaking.Scene(8);
        using var whole = PaintedPicture.Of(scene, new ViewOptions(), 203, new PictureSize(1000, 700));
        using var without = PaintedPicture.Of(scene with { SiteName = "" }, new ViewOptions(), 203, new PictureSize(1000, 700));
        var differing = whole.Pixels.Pixels.Zip(without.Pixels.Pixels).Count(p => Differ(p.First, p.Second));
        Assert.InRange(differing, ShareAllowed * 1000 * 700 / 2, 1000 * 700);
    }

    private static PaintedPicture Make(string name) => name switch
    {
        "eight-dark" => PaintedPicture.Of(SceneMaking.Scene(8), new ViewOptions(), 203, PictureSize.Default),
        "fifty-paper" => PaintedPicture.Of(SceneMaking.Scene(50), new ViewOptions { Theme = Theme.Paper }, 203, new PictureSize(1000, 700)),
        "hours-dark" => PaintedPicture.Of(SceneMaking.Scene(5, 2 * 3600), new ViewOptions(), 5000, new PictureSize(800, 600)),
        "sector-zoomed-paper" => PaintedPicture.Of(
            SceneMaking.Scene(8, scan: new Scan.Sector { Limits = new AzimuthSector(1, 4), RateRadPerS = 1.2, TurnaroundS = 0.5 }),
            new ViewOptions { Theme = Theme.Paper, Unit = RangeUnit.NauticalMile, CentreEastM = 9_000, CentreNorthM = -6_000, RangeM = 12_000 },
            200,
            new PictureSize(800, 600)),
        _ => throw new ArgumentOutOfRangeException(nameof(name), name, null),
    };

    private static void Write(SKBitmap pixels, string path)
    {
        using var stream = File.Create(path);
        pixels.Encode(stream, SKEncodedImageFormat.Png, 100);
    }

    private static bool Differ(SKColor a, SKColor b) =>
        Math.Abs(a.Red - b.Red) > LevelsAllowed || Math.Abs(a.Green - b.Green) > LevelsAllowed || Math.Abs(a.Blue - b.Blue) > LevelsAllowed;
}
