using System.Diagnostics;

namespace ScanSim.Recordings.Tests;

/// <summary>A file system in memory of a given size, where the system lets us mount one.</summary>
internal sealed class SmallDisk : IDisposable
{
    private SmallDisk(string path) => Path = path;

    public string Path { get; }

    public static SmallDisk? TryMount(string path, string size)
    {
        Directory.CreateDirectory(path);
        return OperatingSystem.IsLinux() && Run("mount", "-t", "tmpfs", "-o", "size=" + size, "tmpfs", path) ? new SmallDisk(path) : null;
    }

    public void Dispose() => Run("umount", Path);

    private static bool Run(string command, params string[] arguments)
    {
        try
        {
            using var process = Process.Start(new ProcessStartInfo(command, arguments) { UseShellExecute = false, RedirectStandardError = true, RedirectStandardOutput = true });
            process!.WaitForExit();
            return process.ExitCode == 0;
        }
        catch (System.ComponentModel.Win32Exception)
        {
            return false;
        }
    }
}
