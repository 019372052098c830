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
        // The user's own where it has all letters, as old window managers want the title in it. If there is none, the title is all that suffers.
        if (OperatingSystem.IsLinux() && Marshal.PtrToStringUTF8(SetLocale(LcCtype, ""))?.Contains("UTF", StringComparison.OrdinalIgnoreCase) != true)
        {
            _ = SetLocale(LcCtype, "C.UTF-8");
        }
    }

    [LibraryImport("libc", EntryPoint = "setlocale", StringMarshalling = StringMarshalling.Utf8)]
    private static partial nint SetLocale(int category, string locale);
}
