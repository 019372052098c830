namespace ScanSim.Display.Overlays;

/// <summary>An overlay that cannot be read; the message is for the user and says where, what was read and what would be right.</summary>
public sealed class OverlayException : Exception
{
    public OverlayException(string message)
        : base(message)
    {
    }

    public OverlayException(string message, Exception cause)
        : base(message, cause)
    {
    }
}
