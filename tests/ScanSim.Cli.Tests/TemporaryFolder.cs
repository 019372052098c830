namespace ScanSim.Cli.Tests;

/// <summary>A folder of a test's own, removed afterwards.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("scansim-test-").FullName;

    public string Of(string name) => System.IO.Path.Combine(Path, name);

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
