using System.Reflection;
using System.Runtime.InteropServices;

namespace ScanSim.Display.Windowing;

/// <summary>The functions of SDL 2 that a window of ours needs: names without the prefix SDL_, values as in SDL's headers (2.0.10 and later).</summary>
internal static partial class Sdl
{
    public const uint InitVideo = 0x20;

    public const uint WindowShown = 0x4;
    public const uint WindowResizable = 0x20;
    public const uint WindowAllowHighDpi = 0x2000;
    public const int PositionCentred = 0x2FFF0000;

    public const uint RendererSoftware = 0x1;
    public const int TextureStreaming = 1;

    /// <summary>Surfaces with this flag must be locked before their pixels are touched (SDL_RLEACCEL).</summary>
    public const uint SurfaceMustLock = 0x2;

    public const uint FormatXrgb8888 = 0x16161804;
    public const uint FormatArgb8888 = 0x16362004;
    public const uint FormatXbgr8888 = 0x16561804;
    public const uint FormatAbgr8888 = 0x16762004;
    public const uint FormatRgb565 = 0x15151002;

    private const string Library = "SDL2";

    static Sdl() => NativeLibrary.SetDllImportResolver(typeof(Sdl).Assembly, Resolve);

    [LibraryImport(Library, EntryPoint = "SDL_SetHint", StringMarshalling = StringMarshalling.Utf8)]
    public static partial int SetHint(string name, string value);

    [LibraryImport(Library, EntryPoint = "SDL_InitSubSystem")]
    public static partial int InitSubSystem(uint flags);

    [LibraryImport(Library, EntryPoint = "SDL_QuitSubSystem")]
    public static partial void QuitSubSystem(uint flags);

    [LibraryImport(Library, EntryPoint = "SDL_GetVersion")]
    public static partial void GetVersion(out SdlVersion version);

    [LibraryImport(Library, EntryPoint = "SDL_CreateWindow", StringMarshalling = StringMarshalling.Utf8)]
    public static partial nint CreateWindow(string title, int x, int y, int width, int height, uint flags);

    [LibraryImport(Library, EntryPoint = "SDL_DestroyWindow")]
    public static partial void DestroyWindow(nint window);

    [LibraryImport(Library, EntryPoint = "SDL_SetWindowTitle", StringMarshalling = StringMarshalling.Utf8)]
    public static partial void SetWindowTitle(nint window, string title);

    [LibraryImport(Library, EntryPoint = "SDL_SetWindowMinimumSize")]
    public static partial void SetWindowMinimumSize(nint window, int width, int height);

    [LibraryImport(Library, EntryPoint = "SDL_SetWindowSize")]
    public static partial void SetWindowSize(nint window, int width, int height);

    [LibraryImport(Library, EntryPoint = "SDL_SetWindowPosition")]
    public static partial void SetWindowPosition(nint window, int x, int y);

    [LibraryImport(Library, EntryPoint = "SDL_GetWindowSize")]
    public static partial void GetWindowSize(nint window, out int width, out int height);

    [LibraryImport(Library, EntryPoint = "SDL_GetWindowDisplayIndex")]
    public static partial int GetWindowDisplayIndex(nint window);

    [LibraryImport(Library, EntryPoint = "SDL_GetDisplayDPI")]
    public static partial int GetDisplayDpi(int display, out float diagonal, out float horizontal, out float vertical);

    [LibraryImport(Library, EntryPoint = "SDL_GetDisplayUsableBounds")]
    public static partial int GetDisplayUsableBounds(int display, out SdlRectangle bounds);

    [LibraryImport(Library, EntryPoint = "SDL_GetWindowSurface")]
    public static partial nint GetWindowSurface(nint window);

    [LibraryImport(Library, EntryPoint = "SDL_UpdateWindowSurface")]
    public static partial int UpdateWindowSurface(nint window);

    [LibraryImport(Library, EntryPoint = "SDL_LockSurface")]
    public static partial int LockSurface(nint surface);

    [LibraryImport(Library, EntryPoint = "SDL_UnlockSurface")]
    public static partial void UnlockSurface(nint surface);

    [LibraryImport(Library, EntryPoint = "SDL_CreateRenderer")]
    public static partial nint CreateRenderer(nint window, int index, uint flags);

    [LibraryImport(Library, EntryPoint = "SDL_DestroyRenderer")]
    public static partial void DestroyRenderer(nint renderer);

    [LibraryImport(Library, EntryPoint = "SDL_GetRendererOutputSize")]
    public static partial int GetRendererOutputSize(nint renderer, out int width, out int height);

    [LibraryImport(Library, EntryPoint = "SDL_CreateTexture")]
    public static partial nint CreateTexture(nint renderer, uint format, int access, int width, int height);

    [LibraryImport(Library, EntryPoint = "SDL_DestroyTexture")]
    public static partial void DestroyTexture(nint texture);

    /// <summary>A null rectangle: all of the texture.</summary>
    [LibraryImport(Library, EntryPoint = "SDL_LockTexture")]
    public static partial int LockTexture(nint texture, nint rectangle, out nint pixels, out int pitchBytes);

    [LibraryImport(Library, EntryPoint = "SDL_UnlockTexture")]
    public static partial void UnlockTexture(nint texture);

    [LibraryImport(Library, EntryPoint = "SDL_RenderClear")]
    public static partial int RenderClear(nint renderer);

    [LibraryImport(Library, EntryPoint = "SDL_RenderCopy")]
    public static partial int RenderCopy(nint renderer, nint texture, nint from, nint to);

    [LibraryImport(Library, EntryPoint = "SDL_RenderPresent")]
    public static partial void RenderPresent(nint renderer);

    [LibraryImport(Library, EntryPoint = "SDL_PollEvent")]
    public static partial int PollEvent(out SdlEvent e);

    [LibraryImport(Library, EntryPoint = "SDL_WaitEventTimeout")]
    public static partial int WaitEventTimeout(out SdlEvent e, int milliseconds);

    [LibraryImport(Library, EntryPoint = "SDL_StartTextInput")]
    public static partial void StartTextInput();

    [LibraryImport(Library, EntryPoint = "SDL_GetModState")]
    public static partial ushort GetModifiers();

    public static string Error => Marshal.PtrToStringUTF8(GetErrorText()) ?? "";

    /// <summary>Empty when no video driver runs.</summary>
    public static string VideoDriver => Marshal.PtrToStringUTF8(GetCurrentVideoDriver()) ?? "";

    [LibraryImport(Library, EntryPoint = "SDL_GetError")]
    private static partial nint GetErrorText();

    [LibraryImport(Library, EntryPoint = "SDL_GetCurrentVideoDriver")]
    private static partial nint GetCurrentVideoDriver();

    private static nint Resolve(string name, Assembly assembly, DllImportSearchPath? searchPath)
    {
        if (name != Library)
        {
            return 0;
        }

        foreach (var file in LibraryFiles())
        {
            if (NativeLibrary.TryLoad(file, assembly, DllImportSearchPath.AssemblyDirectory | DllImportSearchPath.SafeDirectories, out var handle))
            {
                return handle;
            }
        }

        return 0;
    }

    private static string[] LibraryFiles() =>
        OperatingSystem.IsWindows() ? ["SDL2.dll"]
        // Homebrew's folders (ARM, Intel) are not on the loader's path.
        : OperatingSystem.IsMacOS() ? ["libSDL2-2.0.0.dylib", "libSDL2.dylib", "/opt/homebrew/lib/libSDL2-2.0.0.dylib", "/usr/local/lib/libSDL2-2.0.0.dylib"]
        : ["libSDL2-2.0.so.0"];
}
