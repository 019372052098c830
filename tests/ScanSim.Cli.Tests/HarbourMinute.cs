namespace ScanSim.Cli.Tests;

/// <summary>A recording of the harbour's first minute, made once for all tests of a class.</summary>
public sealed class HarbourMinute : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public HarbourMinute() => ScanSimProcess.Run("run", ScanSimProcess.Harbour, "-o", Path, "--duration", "1 min").AssertDone();

    public string Path => folder.Of("out");

    public void Dispose() => folder.Dispose();
}
