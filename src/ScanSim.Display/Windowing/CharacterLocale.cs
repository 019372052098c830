using System.Runtime.InteropServices;

namespace ScanSim.Display.Windowing;

/// <summary>
/// The C library's idea of characters. .NET leaves it at ASCII; then Xlib cannot convert a window title with other letters, and SDL leaves the
/// old title standing.
/// </summary>
internal static partial class CharacterLocale
{
    /// <summary>In glibc and musl; other systems, which have no need of this, number otherwise.</summary>
    private const int LcCtype = 0;

    public static void UseUtf8()
    {
        if (OperatingSystem.IsLinux())
        {
            // If the system has none, the title is all that suffers.
            _ = SetLocale(LcCtype, "C.UTF-8");
        }
    }

    [LibraryImport("libc", EntryPoint = "setlocale", StringMarshalling = StringMarshalling.Utf8)]
    private static partial nint SetLocale(int category, string locale);
}
