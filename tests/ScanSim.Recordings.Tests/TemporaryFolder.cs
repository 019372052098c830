namespace ScanSim.Recordings.Tests;

/// <summary>A folder of its own for a test, deleted after it.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("scansim-recordings-").FullName;

    /// <summary>A path in it that does not exist yet.</summary>
    public string Recording => In("recording");

    public string In(string name) => System.IO.Path.Combine(Path, name);

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
