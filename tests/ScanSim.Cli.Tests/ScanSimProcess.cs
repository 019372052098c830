using System.Diagnostics;
using ScanSim.Testing;

namespace ScanSim.Cli.Tests;

/// <summary>Starts the program as a user does: a process of its own, with its exit code, stdout and stderr.</summary>
internal static class ScanSimProcess
{
    public static readonly string Harbour = Path.Combine(RepositoryRoot.Find(), "scenarios", "harbour.json");
    public static readonly string Airfield = Path.Combine(RepositoryRoot.Find(), "scenarios", "airfield.json");

    private static readonly string Program = Path.Combine(AppContext.BaseDirectory, "scansim.dll");

    public static Outcome Run(params string[] arguments)
    {
        using var process = Start(arguments);
        var output = process.StandardOutput.ReadToEndAsync();
        var error = process.StandardError.ReadToEndAsync();
        Assert.True(process.WaitForExit(TimeSpan.FromMinutes(5)), "scansim did not end within five minutes");
        return new Outcome(process.ExitCode, output.Result, error.Result);
    }

    public static Process Start(params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet") { UseShellExecute = false, RedirectStandardOutput = true, RedirectStandardError = true, WorkingDirectory = Path.GetTempPath() };
        start.ArgumentList.Add(Program);
        foreach (var argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        return Process.Start(start)!;
    }
}
