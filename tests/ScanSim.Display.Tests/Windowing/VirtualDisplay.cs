using System.Diagnostics;
using System.Runtime.InteropServices;
using System.Text;
using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Windowing;

/// <summary>An X server without a screen, started for the tests, with the tools that press its keys and photograph it.</summary>
public sealed class VirtualDisplay : IDisposable
{
    public const int WidthPx = 1600;
    public const int HeightPx = 1200;

    private readonly Process? server;

    public VirtualDisplay()
    {
        Missing = WhatIsMissing();
        if (Missing is not null)
        {
            return;
        }

        // The server itself finds a free number and writes it to the descriptor named: its standard output.
        var start = new ProcessStartInfo("Xvfb") { UseShellExecute = false, RedirectStandardOutput = true, RedirectStandardError = true };
        foreach (var argument in (string[])["-displayfd", "1", "-screen", "0", $"{WidthPx}x{HeightPx}x24", "-nolisten", "tcp", "-noreset"])
        {
            start.ArgumentList.Add(argument);
        }

        server = Process.Start(start)!;
        server.ErrorDataReceived += (_, _) => { };
        server.BeginErrorReadLine();
        Name = ":" + server.StandardOutput.ReadLine();

        // SDL reads the environment of the process, which .NET's variables do not reach on Unix.
        SetNativeVariable("DISPLAY", Name);
        SetNativeVariable("SDL_VIDEODRIVER", "x11");
        Environment.SetEnvironmentVariable("SDL_VIDEODRIVER", "x11");
    }

    public string Name { get; } = "";

    /// <summary>What the tests of the window lack here, or null.</summary>
    public string? Missing { get; }

    /// <summary>Skips where a part is missing; in continuous integration all must be there.</summary>
    public void Require()
    {
        if (Missing is not null)
        {
            Assert.False(Environment.GetEnvironmentVariable("CI") == "true", Missing);
            Assert.Skip(Missing);
        }
    }

    /// <summary>Real input by the X server's test extension; words as of xdotool. Never its --sync, which can wait for ever.</summary>
    public void Do(params string[] words)
    {
        var (exitCode, _) = Run("xdotool", words);
        Assert.True(exitCode == 0, $"xdotool {string.Join(' ', words)} failed");
    }

    /// <summary>The number of this process's window, or nothing.</summary>
    public string FindWindow() => Encoding.ASCII.GetString(Run("xdotool", "search", "--onlyvisible", "--pid", $"{Environment.ProcessId}").Output).Trim();

    public string TitleOf(string window) => Encoding.UTF8.GetString(Run("xdotool", "getwindowname", window).Output).Trim();

    /// <summary>What the screen shows.</summary>
    public SKBitmap Photograph() => SKBitmap.Decode(Run("import", "-window", "root", "png:-").Output);

    public void Dispose()
    {
        if (server is not null)
        {
            server.Kill();
            server.WaitForExit();
            server.Dispose();
        }
    }

    private (int ExitCode, byte[] Output) Run(string program, params string[] words)
    {
        var start = new ProcessStartInfo(program) { UseShellExecute = false, RedirectStandardOutput = true, Environment = { ["DISPLAY"] = Name, ["LC_ALL"] = "C.UTF-8" } };
        foreach (var word in words)
        {
            start.ArgumentList.Add(word);
        }

        using var process = Process.Start(start)!;
        using var output = new MemoryStream();
        if (!process.StandardOutput.BaseStream.CopyToAsync(output).Wait(TimeSpan.FromSeconds(20)) || !process.WaitForExit(TimeSpan.FromSeconds(20)))
        {
            process.Kill();
            Assert.Fail($"{program} {string.Join(' ', words)} did not end");
        }

        return (process.ExitCode, output.ToArray());
    }

    private static string? WhatIsMissing()
    {
        if (!OperatingSystem.IsLinux())
        {
            return "the window is driven under Xvfb, on Linux only";
        }

        var folders = (Environment.GetEnvironmentVariable("PATH") ?? "").Split(':');
        string[] missing =
        [
            .. ((string[])["Xvfb", "xdotool", "import"]).Where(t => !folders.Any(f => File.Exists(Path.Combine(f, t)))),
            .. NativeLibrary.TryLoad("libSDL2-2.0.so.0", out _) ? (string[])[] : ["SDL2"],
        ];
        return missing.Length == 0 ? null : $"not installed: {string.Join(", ", missing)} (Debian: xvfb, xdotool, imagemagick, libsdl2-2.0-0)";
    }

    private static void SetNativeVariable(string name, string value) =>
        Assert.Equal(0, SetNativeVariable(Encoding.UTF8.GetBytes(name + '\0'), Encoding.UTF8.GetBytes(value + '\0'), 1));

    [DllImport("libc", EntryPoint = "setenv")]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static extern int SetNativeVariable(byte[] name, byte[] value, int overwrite);
}
