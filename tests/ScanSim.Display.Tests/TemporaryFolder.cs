namespace ScanSim.Display.Tests;

/// <summary>A folder that goes with the test.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    private readonly DirectoryInfo folder = Directory.CreateTempSubdirectory("scansim-display-");

    public string In(string name) => Path.Combine(folder.FullName, name);

    public string[] Files() => [.. folder.GetFiles().Select(f => f.Name).Order(StringComparer.Ordinal)];

    public void Dispose() => folder.Delete(recursive: true);
}
