using System.Diagnostics;

namespace ScanSim.Cli.Tests;

/// <summary>Starts the program with other environment variables than the test's own.</summary>
internal static class ScanSimWithPath
{
    /// <summary>Runs it with this PATH and without a screen.</summary>
    public static Outcome Run(string path, params string[] arguments) => Run(StartInfo(path, arguments));

    public static ProcessStartInfo StartInfo(string path, params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet", [Path.Combine(AppContext.BaseDirectory, "scansim.dll"), .. arguments])
        {
            UseShellExecute = false,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            WorkingDirectory = Path.GetTempPath(),
        };
        start.Environment["PATH"] = path;
        start.Environment.Remove("DISPLAY");
        start.Environment.Remove("WAYLAND_DISPLAY");
        return start;
    }

    public static Outcome Run(ProcessStartInfo start)
    {
        using var process = Process.Start(start)!;
        var output = process.StandardOutput.ReadToEndAsync();
        var error = process.StandardError.ReadToEndAsync();
        Assert.True(process.WaitForExit(TimeSpan.FromMinutes(5)), "scansim did not end within five minutes");
        return new Outcome(process.ExitCode, output.Result, error.Result);
    }
}
