namespace ScanSim.Testing;

/// <summary>Finds the folder that holds ScanSim.sln, upwards from the test assembly.</summary>
public static class RepositoryRoot
{
    public static string Find() => TryFind() ?? throw new DirectoryNotFoundException("ScanSim.sln was not found above " + AppContext.BaseDirectory);

    public static string? TryFind()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "ScanSim.sln")))
            {
                return folder.FullName;
            }
        }

        return null;
    }
}
