using ScanSim.Recordings;

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
        var head = new RecordingHead
        {
            ScenarioName = scenario.Name,
            ScenarioDigest = "00",
            ScenarioText = "{}",
            ProgramVersion = "0.1.0",
            Seed = 7,
            StartUtc = scenario.Run.Start,
            DurationS = 40,
            Looks = LooksKept.Best,
            Format = format,
        };
        using (var writer = RecordingWriter.Create(folder.In("run"), head, force: false))
        {
            SceneMaking.Feed(writer, scenario);
            writer.Complete();
        }

        var gathered = SceneMaking.Scene(8, 60);
        var read = SceneReader.Load(Recording.Open(folder.In("run")), scenario);
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
}
