namespace ScanSim.Display.Films;

/// <summary>The program that makes MP4 of frames; not ours, and not needed for anything else.</summary>
public static class Ffmpeg
{
    public const string HowToInstall = "Install it: apt, dnf, brew or winget install ffmpeg.";

    /// <summary>The first one on the PATH, or null.</summary>
    public static string? Find() => Find(Environment.GetEnvironmentVariable("PATH"));

    internal static string? Find(string? searchPath)
    {
        var name = OperatingSystem.IsWindows() ? "ffmpeg.exe" : "ffmpeg";
        return (searchPath ?? "").Split(Path.PathSeparator, StringSplitOptions.RemoveEmptyEntries)
            .Select(folder => Path.Combine(folder.Trim('"'), name))
            .FirstOrDefault(CanBeRun);
    }

    private static bool CanBeRun(string path) =>
        File.Exists(path)
        && (OperatingSystem.IsWindows()
            || (File.GetUnixFileMode(path) & (UnixFileMode.UserExecute | UnixFileMode.GroupExecute | UnixFileMode.OtherExecute)) != UnixFileMode.None);
}
