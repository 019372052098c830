using SkiaSharp;

namespace ScanSim.Display.Windowing;

/// <summary>A window of SDL into which Skia paints. All calls from the thread that opened it (on macOS the process's first).</summary>
public sealed class SdlWindow : IDisposable
{
    private readonly SdlVideo video;
    private readonly EventTranslation translation;
    private readonly float? scaleAskedFor;
    private nint window;
    private IWindowPixels pixels = new NoPixels();
    private string title;
    private float wantedScale = 1;
    private (int Width, int Height) leastSize;

    private SdlWindow(SdlVideo video, string title, float? scale)
    {
        this.video = video;
        this.title = title;
        scaleAskedFor = scale;
        translation = new EventTranslation(video.Version.HasPreciseWheel, OperatingSystem.IsMacOS());
    }

    /// <summary>The system that shows the window, in SDL's word: "x11", "wayland", "windows", "cocoa".</summary>
    public string Driver => video.Driver;

    /// <summary>True when drawing goes straight into the window's surface, false on the slower way over a texture.</summary>
    public bool DrawsOnSurface => pixels is SurfacePixels;

    /// <summary>Pixels per layout unit.</summary>
    public float Scale { get; private set; } = 1;

    /// <summary>False while it is hidden or an icon: painting would be in vain.</summary>
    public bool IsVisible { get; private set; } = true;

    /// <summary>The system has lost or enlarged what was painted.</summary>
    public bool NeedsPaint { get; private set; } = true;

    public string Title
    {
        get => title;
        set
        {
            if (value != title)
            {
                title = value;
                Sdl.SetWindowTitle(window, value);
            }
        }
    }

    /// <summary>Opens it in the middle of the screen and shows it.</summary>
    /// <param name="title">In the window's frame.</param>
    /// <param name="width">In layout units; less on a smaller screen.</param>
    /// <param name="height">In layout units; less on a smaller screen.</param>
    /// <param name="scale">Pixels per layout unit, or null for what the screen asks for.</param>
    /// <exception cref="WindowException">SDL2 or a display is missing.</exception>
    public static SdlWindow Open(string title, int width, int height, float? scale = null) => Open(title, width, height, scale, tryTexture: false);

    internal static SdlWindow Open(string title, int width, int height, float? scale, bool tryTexture)
    {
        var opened = new SdlWindow(SdlVideo.Start(Environment.GetEnvironmentVariable("SDL_VIDEODRIVER")), title, scale);
        try
        {
            opened.Create(width, height, tryTexture);
            return opened;
        }
        catch
        {
            opened.Dispose();
            throw;
        }
    }

    /// <summary>The next event that has come, if any.</summary>
    public bool Next(out WindowEvent e)
    {
        while (Sdl.PollEvent(out var sdl) != 0)
        {
            if (Take(sdl, out e))
            {
                return true;
            }
        }

        e = default;
        return false;
    }

    /// <summary>Sleeps until something happens to the window, at most for the time given; false when that was no event of ours.</summary>
    public bool Wait(int milliseconds, out WindowEvent e)
    {
        e = default;
        return Sdl.WaitEventTimeout(out var sdl, milliseconds) != 0 && Take(sdl, out e);
    }

    /// <summary>The window's size as an event, with which a screen begins.</summary>
    public WindowEvent Resized()
    {
        var size = pixels.Size;
        return new WindowEvent
        {
            Kind = WindowEventKind.Resized,
            X = Math.Max(WindowScale.LeastWidth, size.Width / Scale),
            Y = Math.Max(WindowScale.LeastHeight, size.Height / Scale),
            Scale = Scale,
        };
    }

    /// <summary>One frame: <paramref name="draw"/> gets the canvas in pixels, width and height in layout units, and the scale.</summary>
    public void Paint(Action<SKCanvas, float, float, float> draw)
    {
        var size = Resized();
        if (pixels.Size.IsEmpty)
        {
            return;
        }

        if (!pixels.Paint(canvas => draw(canvas, size.X, size.Y, size.Scale)))
        {
            ChangeToTexture();
            if (!pixels.Paint(canvas => draw(canvas, size.X, size.Y, size.Scale)))
            {
                throw new WindowException($"The window cannot be painted (SDL: {Sdl.Error}); 'scansim picture' needs no window.");
            }
        }

        NeedsPaint = false;
    }

    public void Dispose()
    {
        Close();
        video.Dispose();
    }

    private void Close()
    {
        pixels.Dispose();
        pixels = new NoPixels();
        if (window != 0)
        {
            Sdl.DestroyWindow(window);
            window = 0;
            leastSize = default;
        }
    }

    private void Create(int width, int height, bool tryTexture)
    {
        if (!tryTexture)
        {
            CreateWindow(width, height);
            var surface = new SurfacePixels(window);
            pixels = surface;
            if (!surface.Works)
            {
                Close();
            }
        }

        if (window == 0)
        {
            // A window that has had a surface takes no renderer: a new one.
            CreateWindow(width, height);
            var texture = new TexturePixels(window);
            pixels = texture;
            if (!texture.Works)
            {
                throw new WindowException($"The window cannot be painted (SDL: {Sdl.Error}); 'scansim picture' needs no window.");
            }
        }

        Sdl.StartTextInput();
        SetSizes();
        Resize(width, height);
    }

    private void CreateWindow(int width, int height)
    {
        window = Sdl.CreateWindow(title, Sdl.PositionCentred, Sdl.PositionCentred, width, height, Sdl.WindowShown | Sdl.WindowResizable | Sdl.WindowAllowHighDpi);
        if (window == 0)
        {
            throw new WindowException($"The window cannot be opened (SDL: {Sdl.Error}); 'scansim picture' needs no window.");
        }
    }

    /// <summary>Surfaces can fail late, such as over a forwarded connection.</summary>
    private void ChangeToTexture()
    {
        if (DrawsOnSurface)
        {
            var size = Resized();
            Close();
            Create((int)size.X, (int)size.Y, tryTexture: true);
        }
    }

    private bool Take(in SdlEvent sdl, out WindowEvent e)
    {
        if (sdl.Type != SdlEvent.Window)
        {
            return translation.Translate(sdl, out e);
        }

        e = default;
        switch (sdl.WindowChange)
        {
            case SdlEvent.WindowShown or SdlEvent.WindowExposed or SdlEvent.WindowRestored or SdlEvent.WindowMaximized:
                IsVisible = true;
                NeedsPaint = true;
                break;
            case SdlEvent.WindowHidden or SdlEvent.WindowMinimized:
                IsVisible = false;
                break;
            case SdlEvent.WindowSizeChanged or SdlEvent.WindowDisplayChanged:
                SetSizes();
                e = Resized();
                break;
            case SdlEvent.WindowLeave:
                e = translation.Event(WindowEventKind.PointerLeft);
                break;
            case SdlEvent.WindowFocusGained:
                translation.ForgetModifiers(Sdl.GetModifiers());
                break;
            default:
                break;
        }

        return e.Kind != WindowEventKind.None;
    }

    private void SetSizes()
    {
        NeedsPaint = true;
        Sdl.GetWindowSize(window, out var width, out var height);
        var size = pixels.Size;
        if (width < 1 || height < 1 || size.IsEmpty)
        {
            return;
        }

        var pixelsPerCoordinate = (float)size.Width / width;
        var display = Sdl.GetWindowDisplayIndex(window);
        var dpi = Sdl.GetDisplayDpi(display, out _, out var horizontal, out _) == 0 ? horizontal : 0;
        wantedScale = scaleAskedFor ?? WindowScale.Wanted(pixelsPerCoordinate, dpi, OperatingSystem.IsWindows());
        Scale = WindowScale.Fitting(wantedScale, size);
        translation.Scale = Scale;
        translation.UnitsPerCoordinate = pixelsPerCoordinate / Scale;
        var least = OnScreen(WindowScale.LeastWidth, WindowScale.LeastHeight, pixelsPerCoordinate);
        if (least != leastSize)
        {
            // Only then: on X it also moves the window to where SDL last knew it.
            leastSize = least;
            Sdl.SetWindowMinimumSize(window, least.Width, least.Height);
        }
    }

    /// <summary>To a size in layout units, where the screen's scale makes that another than the window was created with.</summary>
    private void Resize(int width, int height)
    {
        Sdl.GetWindowSize(window, out var nowWidth, out var nowHeight);
        var (newWidth, newHeight) = OnScreen(width, height, (float)pixels.Size.Width / nowWidth);
        if (newWidth != nowWidth || newHeight != nowHeight)
        {
            Sdl.SetWindowSize(window, newWidth, newHeight);
            Sdl.SetWindowPosition(window, Sdl.PositionCentred, Sdl.PositionCentred);
            SetSizes();
        }
    }

    /// <summary>From layout units at the scale wanted to the system's units for windows, no more than the screen has.</summary>
    private (int Width, int Height) OnScreen(int width, int height, float pixelsPerCoordinate)
    {
        var (wide, high) = ((int)(width * wantedScale / pixelsPerCoordinate), (int)(height * wantedScale / pixelsPerCoordinate));
        return Sdl.GetDisplayUsableBounds(Sdl.GetWindowDisplayIndex(window), out var screen) == 0 && screen is { Width: > 0, Height: > 0 }
            ? (Math.Min(wide, screen.Width), Math.Min(high, screen.Height))
            : (wide, high);
    }

    /// <summary>Before there is a window.</summary>
    private sealed class NoPixels : IWindowPixels
    {
        public SKSizeI Size => default;

        public bool Paint(Action<SKCanvas> draw) => false;

        public void Dispose()
        {
            // Holds nothing.
        }
    }
}
