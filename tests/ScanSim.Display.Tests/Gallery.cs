using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Display.Tests;

/// <summary>Pictures to look at: written to the folder that SCANSIM_GALLERY names.</summary>
public sealed class Gallery
{
    [Fact]
    public void Pictures_to_look_at_are_written_where_asked()
    {
        var folder = Environment.GetEnvironmentVariable("SCANSIM_GALLERY");
        Assert.SkipWhen(string.IsNullOrEmpty(folder), "SCANSIM_GALLERY names no folder");
        Directory.CreateDirectory(folder);
        foreach (var targets in (int[])[1, 8, 50, 200])
        {
            var scene = SceneMaking.Scene(targets);
            foreach (var theme in Enum.GetValues<Theme>())
            {
                foreach (var size in (PictureSize[])[PictureSize.Default, new(1920, 1080), new(800, 600)])
                {
                    Save(scene, new ViewOptions { Theme = theme }, 203, size, $"{targets}-{theme}-{size.WidthPx}.png");
                }
            }
        }

        var eight = SceneMaking.Scene(8, blanked: [new(4.2, 4.8)]);
        Save(eight, new ViewOptions { Unit = RangeUnit.NauticalMile }, 203, PictureSize.Default, "8.svg");
        Save(eight, new ViewOptions { Unit = RangeUnit.NauticalMile, Theme = Theme.Paper }, 203, PictureSize.Default, "8.pdf");
        Save(eight, new ViewOptions { CentreEastM = 12_000, CentreNorthM = -9_000, RangeM = 9_000 }, 203, PictureSize.Default, "8-zoom.png");
        var hours = SceneMaking.Scene(8, 4 * 3600);
        Save(hours, new ViewOptions(), 5000, PictureSize.Default, "hours-Dark.png");
        Save(hours, new ViewOptions { Theme = Theme.Paper }, 5000, PictureSize.Default, "hours-Paper.png");
        Save(hours, new ViewOptions { Theme = Theme.Paper }, 5000, PictureSize.Default, "hours.svg");
        Save(SceneMaking.Scene(200), new ViewOptions(), 203, new(3840, 2160), "200-4k.png");
        Save(SceneMaking.Scene(50), new ViewOptions { Theme = Theme.Paper }, 203, new(3840, 2160, 2), "50-4k-scale2.png");

        foreach (var path in Directory.GetFiles(Path.Combine(RepositoryRoot.Find(), "scenarios"), "*.json"))
        {
            var scene = SceneMaking.Gather(ScenarioFile.Load(path)).Build();
            Save(scene, new ViewOptions { Unit = RangeUnit.NauticalMile }, 0.4 * scene.DurationS, PictureSize.Default, Path.GetFileNameWithoutExtension(path) + ".png");
        }

        void Save(Scene scene, ViewOptions view, double timeS, PictureSize size, string name) =>
            Picture.Save(scene, view, timeS, size, Path.Combine(folder, name));
    }
}
