using System.Diagnostics;

namespace ScanSim.Cli.Tests;

/// <summary>What is wrong is said before any window opens; none of these needs a display.</summary>
public sealed class ViewCommandTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Help_ends_with_an_example() =>
        Assert.Matches(@"(?s)Example:\s+scansim view", ScanSimProcess.Run("view", "--help").AssertDone().Output);

    [Fact]
    public void A_folder_that_is_no_recording_is_refused()
    {
        ScanSimProcess.Run("view", folder.Of("nowhere")).AssertRefused("nowhere");
        ScanSimProcess.Run("view", folder.Path).AssertRefused(folder.Path);
        ScanSimProcess.Run("view").AssertRefused("FOLDER");
    }

    [Theory]
    [InlineData("--speed", "65")]
    [InlineData("--speed", "NaN")]
    [InlineData("--speed", "quick")]
    [InlineData("--scale", "0.5")]
    [InlineData("--scale", "NaN")]
    [InlineData("--size", "700x600")]
    [InlineData("--size", "1280")]
    [InlineData("--unit", "miles")]
    [InlineData("--at", "100")]
    [InlineData("--measure", "0 s")]
    public void An_option_out_of_range_is_refused_by_name_and_value(string option, string value) =>
        ScanSimProcess.Run("view", folder.Of("nowhere"), option, value).AssertRefused(option, value);

    [Fact]
    public void What_does_not_go_with_the_recording_is_refused()
    {
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "10 s").AssertDone();
        File.WriteAllText(folder.Of("coast.geojson"), "{ \"type\": \"Coast\" }");
        ScanSimProcess.Run("view", folder.Of("out"), folder.Of("second")).AssertRefused("second");
        ScanSimProcess.Run("view", folder.Of("out"), "--at", "11 s").AssertRefused("--at", "11 s", "10 s");
        ScanSimProcess.Run("view", folder.Of("out"), "--target", "nobody").AssertRefused("--target", "nobody", "ferry");
        ScanSimProcess.Run("view", folder.Of("out"), "--measure", "60 s").AssertRefused("--measure", "60 s", "9 s");
        ScanSimProcess.Run("view", folder.Of("out"), "--overlay", folder.Of("coast.geojson")).AssertRefused("coast.geojson", "Coast");
        ScanSimProcess.Run("view", folder.Of("out"), "--overlay", folder.Of("none.geojson")).AssertRefused("none.geojson");
    }

    /// <summary>On Linux; elsewhere there is always a display.</summary>
    [Fact]
    public async Task Without_a_display_one_line_says_so_and_what_needs_none()
    {
        Assert.SkipUnless(OperatingSystem.IsLinux(), "only Linux runs without a display");
        ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", folder.Of("out"), "--duration", "10 s").AssertDone();
        var start = new ProcessStartInfo("dotnet", [Path.Combine(AppContext.BaseDirectory, "scansim.dll"), "view", folder.Of("out")])
        {
            UseShellExecute = false,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        foreach (var variable in (string[])["DISPLAY", "WAYLAND_DISPLAY", "SDL_VIDEODRIVER"])
        {
            start.Environment.Remove(variable);
        }

        using var process = Process.Start(start)!;
        var error = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);
        var output = await process.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
        await process.WaitForExitAsync(TestContext.Current.CancellationToken);
        var outcome = new Outcome(process.ExitCode, output, await error);

        // Where SDL2 is missing as well, that is what is said.
        outcome.AssertRefused("scansim picture");
        Assert.Matches("^scansim: (There is no display|The window needs)[^\n]+\n$", outcome.Error);
    }
}
