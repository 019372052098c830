namespace ScanSim.Display.Windowing;

/// <summary>A window that cannot be opened; the message is one line for the user and says what to do.</summary>
public sealed class WindowException : Exception
{
    public WindowException(string message)
        : base(message)
    {
    }

    public WindowException(string message, Exception cause)
        : base(message, cause)
    {
    }
}
