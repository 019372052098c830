namespace ScanSim.Display.Windowing;

/// <summary>SDL's video part while it runs: started with our settings, or a <see cref="WindowException"/> that says what is missing.</summary>
internal sealed class SdlVideo : IDisposable
{
    private const string NoDisplayNeeded = "'scansim picture' needs no window";

    private const string NoDisplay = $"There is no display to open a window on (DISPLAY or WAYLAND_DISPLAY is not set or does not answer); {NoDisplayNeeded}.";

    private SdlVideo(SdlVersion version, string driver)
    {
        Version = version;
        Driver = driver;
    }

    public SdlVersion Version { get; }

    public string Driver { get; }

    /// <summary>Counted by SDL: each start needs its end.</summary>
    /// <param name="chosenDriver">What the user set in SDL_VIDEODRIVER, or null.</param>
    public static SdlVideo Start(string? chosenDriver)
    {
        try
        {
            Sdl.GetVersion(out var version);
            if (OperatingSystem.IsLinux() && string.IsNullOrEmpty(chosenDriver) && !IsNamed("DISPLAY") && !IsNamed("WAYLAND_DISPLAY"))
            {
                // Without asking SDL: the libraries of the systems it tries write to stderr.
                throw new WindowException(NoDisplay);
            }

            CharacterLocale.UseUtf8();
            SetHints();
            if (Sdl.InitSubSystem(Sdl.InitVideo) != 0)
            {
                throw new WindowException($"There is no display to open a window on (SDL: {Sdl.Error}); {NoDisplayNeeded}.");
            }

            var video = new SdlVideo(version, Sdl.VideoDriver);
            video.RefuseInvisible(chosenDriver);
            return video;
        }
        catch (Exception fault) when (fault is DllNotFoundException or BadImageFormatException)
        {
            throw new WindowException($"The window needs the library SDL2, which is not installed: {Remedy()}; {NoDisplayNeeded}.", fault);
        }
        catch (EntryPointNotFoundException fault)
        {
            throw new WindowException($"The window needs SDL 2.0.10 or later, the installed one is older: {Remedy()}; {NoDisplayNeeded}.", fault);
        }
    }

    public void Dispose() => Sdl.QuitSubSystem(Sdl.InitVideo);

    private static bool IsNamed(string variable) => !string.IsNullOrEmpty(Environment.GetEnvironmentVariable(variable));

    private static void SetHints()
    {
        // Window surfaces straight from the system, not by way of OpenGL: Skia draws on the processor anyway.
        Sdl.SetHint("SDL_FRAMEBUFFER_ACCELERATION", "0");

        // Ctrl-C is the program's to handle.
        Sdl.SetHint("SDL_NO_SIGNAL_HANDLERS", "1");

        // A window is no full-screen game: the screen saver and the compositor stay as they are.
        Sdl.SetHint("SDL_VIDEO_ALLOW_SCREENSAVER", "1");
        Sdl.SetHint("SDL_VIDEO_X11_NET_WM_BYPASS_COMPOSITOR", "0");

        // Real pixels on Windows instead of a blurred enlargement (SDL 2.24 and later).
        Sdl.SetHint("SDL_WINDOWS_DPI_AWARENESS", "permonitorv2");

        // The click that brings the window to the front also counts.
        Sdl.SetHint("SDL_MOUSE_FOCUS_CLICKTHROUGH", "1");
    }

    private static string Remedy() =>
        OperatingSystem.IsWindows() ? "put SDL2.dll beside the program"
        : OperatingSystem.IsMacOS() ? "put libSDL2-2.0.0.dylib beside the program or install SDL2"
        : "install the package libsdl2-2.0-0 (Debian, Ubuntu; elsewhere SDL2)";

    /// <summary>Without a display SDL quietly draws into nothing. Whoever names such a driver in SDL_VIDEODRIVER gets it.</summary>
    private void RefuseInvisible(string? chosenDriver)
    {
        if (Driver is "offscreen" or "dummy" or "evdev" && !string.Equals(Driver, chosenDriver, StringComparison.OrdinalIgnoreCase))
        {
            Dispose();
            throw new WindowException(NoDisplay);
        }
    }
}
