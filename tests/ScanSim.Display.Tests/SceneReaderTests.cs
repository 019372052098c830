using ScanSim.Recordings;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Display.Tests;

public sealed class SceneReaderTests
{
    [Theory]
    [InlineData(TableFormat.Parquet)]
    [InlineData(TableFormat.Csv)]
    public void A_scene_read_from_a_recording_equals_the_one_gathered_from_its_rows(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        var scenario = SceneMaking.Scenario(8, 60);
        Write(folder.In("run"), scenario, "{}", 40, format);
        var gathered = SceneMaking.Scene(8, 60);
        var read = SceneReader.Load(Recording.Open(folder.In("run")), scenario, double.NegativeInfinity, double.PositiveInfinity);
        Assert.Equal(40, read.DurationS);
        Assert.Equal(gathered.Scans, read.Scans);
        Assert.Equal(gathered.Plots, read.Plots);
        Assert.Equal(gathered.Targets.Length, read.Targets.Length);
        foreach (var (expected, actual) in gathered.Targets.Zip(read.Targets))
        {
            Assert.Equal(expected.Looks, actual.Looks);
            Assert.Equal(expected.Truth, actual.Truth);
            Assert.Equal(expected.BlipScanRatio, actual.BlipScanRatio);
        }
    }

    [Fact]
    public void A_recording_brings_its_scenario_along_and_plots_outside_the_time_asked_for_are_left_out()
    {
        using var folder = new TemporaryFolder();
        var path = Path.Combine(RepositoryRoot.Find(), "scenarios", "harbour.json");
        var scenario = ScenarioFile.Load(path);
        Write(folder.In("run"), scenario, File.ReadAllText(path), 120, TableFormat.Parquet);
        var recording = Recording.Open(folder.In("run"));
        var whole = SceneReader.Load(recording);
        var part = SceneReader.Load(recording, 50, 60);
        Assert.Equal(scenario.Name, whole.ScenarioName);
        Assert.Equal(string.Join(' ', scenario.Targets.Select(t => t.Id)), string.Join(' ', whole.Targets.Select(t => t.Id)));
        Assert.Equal(whole.Plots.Where(p => p.TimeS is >= 50 and <= 60), part.Plots);
        Assert.NotEmpty(part.Plots);
        Assert.Equal(whole.Targets.Select(t => t.ScansWithPlot), part.Targets.Select(t => t.ScansWithPlot));
        Picture.Save(part, new ViewOptions { AfterglowScans = 3 }, 60, PictureSize.Default, folder.In("picture.png"));
    }

    [Fact]
    public void A_scenario_that_this_version_cannot_read_is_an_error()
    {
        using var folder = new TemporaryFolder();
        Write(folder.In("run"), SceneMaking.Scenario(1, 10), "{}", 10, TableFormat.Csv);
        Assert.Throws<ScenarioException>(() => SceneReader.Load(Recording.Open(folder.In("run"))));
    }

    private static void Write(string path, Scenario scenario, string scenarioText, double durationS, TableFormat format)
    {
        var head = new RecordingHead
        {
            ScenarioName = scenario.Name,
            ScenarioDigest = "00",
            ScenarioText = scenarioText,
            ProgramVersion = "0.1.0",
            Seed = 7,
            StartUtc = scenario.Run.Start,
            DurationS = durationS,
            Looks = LooksKept.Best,
            Format = format,
        };
        using var writer = RecordingWriter.Create(path, head, force: false);
        SceneMaking.Feed(writer, scenario);
        writer.Complete();
    }
}
