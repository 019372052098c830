using System.ComponentModel;
using System.Diagnostics;
using System.Globalization;
using System.Runtime.InteropServices;
using ScanSim.Display.Films;
using SkiaSharp;

namespace ScanSim.Cli;

/// <summary>Looks for the parts of the system that commands need, by using each as the command would.</summary>
internal static class SystemParts
{
    private const int NeededRuntimeMajor = 10;

    /// <summary>A program that has not said its version by then hangs.</summary>
    private static readonly TimeSpan VersionTimeLimit = TimeSpan.FromSeconds(10);

    private static readonly string[] SdlLibraries =
        OperatingSystem.IsWindows() ? ["SDL2.dll"]
        : OperatingSystem.IsMacOS() ? ["libSDL2-2.0.0.dylib", "/opt/homebrew/lib/libSDL2-2.0.0.dylib", "/usr/local/lib/libSDL2-2.0.0.dylib"]
        : ["libSDL2-2.0.so.0"];

    private static readonly string[] ScreenVariables = ["WAYLAND_DISPLAY", "DISPLAY"];

    public static SystemPart Runtime() => new(
        ".NET runtime", "all", Environment.Version.Major >= NeededRuntimeMajor,
        $"{Environment.Version} on {RuntimeInformation.RuntimeIdentifier}", $"Install the .NET {NeededRuntimeMajor} runtime or SDK.");

    public static SystemPart Cores()
    {
        var cores = Environment.ProcessorCount;
        return new SystemPart("processors", "all", cores > 0, cores == 1 ? "1: runs and films take their time" : cores.ToString(CultureInfo.InvariantCulture), "");
    }

    public static SystemPart TemporaryFolder()
    {
        var folder = Path.GetTempPath();
        try
        {
            var probe = Path.Combine(folder, Path.GetRandomFileName());
            File.WriteAllBytes(probe, [0]);
            File.Delete(probe);
            return There(folder);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            return There(folder) with { IsThere = false, Found = fault.Message };
        }

        static SystemPart There(string folder) =>
            new("temporary folder", "dotnet run, tests", true, folder, $"Make it writable, or let {(OperatingSystem.IsWindows() ? "TMP" : "TMPDIR")} name a folder that is.");
    }

    public static SystemPart Skia()
    {
        var part = new SystemPart("Skia drawing library", "picture, film, view", true, "", "Publish or install the program for this system's processor; the library comes with it.");
        try
        {
            using var bitmap = new SKBitmap(1, 1);
            using var canvas = new SKCanvas(bitmap);
            canvas.Clear(SKColors.White);
            var draws = bitmap.GetPixel(0, 0) == SKColors.White;
            return part with { IsThere = draws, Found = draws ? SkiaSharpVersion.Native.ToString() : "loads, but does not draw" };
        }
        catch (Exception fault) when (fault is DllNotFoundException or TypeInitializationException or BadImageFormatException or EntryPointNotFoundException or InvalidOperationException)
        {
            return part with { IsThere = false, Found = FirstLine((fault.InnerException ?? fault).Message) };
        }
    }

    public static SystemPart Ffmpeg(string? program)
    {
        var part = new SystemPart("ffmpeg with H.264", "film -o FILE.mp4", false, "not on the PATH", Display.Films.Ffmpeg.HowToInstall);
        if (program is null)
        {
            return part;
        }

        var version = Said(program, "-hide_banner", "-version");
        return version is null ? part with { Found = $"{program}: does not run" }
            : Said(program, "-hide_banner", "-encoders")?.Contains("libx264", StringComparison.Ordinal) != true
                ? part with { Found = $"{program}: without libx264", WhatToDo = "Install a build of ffmpeg that has the encoder libx264." }
                : part with { IsThere = true, Found = string.Join(' ', FirstLine(version).Split(' ').Take(3).Skip(2).Prepend(program)) };
    }

    public static SystemPart Sdl()
    {
        var part = new SystemPart("SDL 2 library", "view", false, $"{SdlLibraries[0]} does not load", OperatingSystem.IsWindows() ? "Put SDL2.dll beside the program." : "Install it: apt install libsdl2-2.0-0, dnf install SDL2 or brew install sdl2.");
        foreach (var name in SdlLibraries)
        {
            if (NativeLibrary.TryLoad(name, out var library))
            {
                NativeLibrary.Free(library);
                return part with { IsThere = true, Found = name };
            }
        }

        return part;
    }

    public static SystemPart Screen()
    {
        var part = new SystemPart("screen", "view", true, "", "Run it in a desktop session, or log in with ssh -X.");
        if (!OperatingSystem.IsLinux())
        {
            return part with { Found = "the system's" };
        }

        var named = ScreenVariables
            .Select(name => (Name: name, Value: Environment.GetEnvironmentVariable(name)))
            .FirstOrDefault(v => !string.IsNullOrEmpty(v.Value));
        return named.Name is null
            ? part with { IsThere = false, Found = "neither WAYLAND_DISPLAY nor DISPLAY is set" }
            : part with { Found = $"{named.Name}={named.Value}" };
    }

    /// <summary>What a program writes to stdout, or null when it does not run, fails or hangs.</summary>
    private static string? Said(string program, params string[] arguments)
    {
        try
        {
            using var process = Process.Start(new ProcessStartInfo(program, arguments) { UseShellExecute = false, RedirectStandardOutput = true, RedirectStandardError = true, RedirectStandardInput = true })!;
            var output = process.StandardOutput.ReadToEndAsync();
            process.ErrorDataReceived += static (_, _) => { };
            process.BeginErrorReadLine();
            if (process.WaitForExit(VersionTimeLimit))
            {
                return process.ExitCode == 0 ? output.GetAwaiter().GetResult() : null;
            }

            process.Kill(entireProcessTree: true);
            return null;
        }
        catch (Win32Exception)
        {
            return null;
        }
    }

    private static string FirstLine(string text) => text.Split('\n')[0].TrimEnd();
}
