using System.Runtime.InteropServices;
using System.Text;

namespace ScanSim.Display.Tests.Windowing;

/// <summary>Does what a window manager does when the user presses its close button (ICCCM 4.2.8.1): xdotool has no word for it everywhere.</summary>
internal static class XCloseButton
{
    private const int ClientMessage = 33;

    public static void Press(string displayName, ulong window)
    {
        var display = XOpenDisplay(Ascii(displayName));
        Assert.NotEqual(0, display);
        var e = new XClientMessageEvent
        {
            Type = ClientMessage,
            Window = (nuint)window,
            MessageType = XInternAtom(display, Ascii("WM_PROTOCOLS"), 0),
            Format = 32,
            Protocol = XInternAtom(display, Ascii("WM_DELETE_WINDOW"), 0),
        };
        Assert.NotEqual(0, XSendEvent(display, (nuint)window, 0, 0, ref e));
        _ = XCloseDisplay(display);
    }

    private static byte[] Ascii(string text) => Encoding.ASCII.GetBytes(text + '\0');

    [DllImport("libX11.so.6")]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static extern nint XOpenDisplay(byte[] name);

    [DllImport("libX11.so.6")]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static extern nuint XInternAtom(nint display, byte[] name, int onlyIfExists);

    [DllImport("libX11.so.6")]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static extern int XSendEvent(nint display, nuint window, int propagate, nint mask, ref XClientMessageEvent e);

    [DllImport("libX11.so.6")]
    [DefaultDllImportSearchPaths(DllImportSearchPath.SafeDirectories)]
    private static extern int XCloseDisplay(nint display);

    /// <summary>XClientMessageEvent with room for the union that it is part of.</summary>
    [StructLayout(LayoutKind.Sequential, Size = 192)]
    private struct XClientMessageEvent
    {
        public int Type;
        public nuint Serial;
        public int SendEvent;
        public nint Display;
        public nuint Window;
        public nuint MessageType;
        public int Format;
        public nuint Protocol;
        public nint Time;
    }
}
