namespace ScanSim.Display;

/// <summary>A picture that cannot be made; the message is for the user and says what was asked and what would be right.</summary>
public sealed class PictureException : Exception
{
    public PictureException(string message)
        : base(message)
    {
    }

    public PictureException(string message, Exception cause)
        : base(message, cause)
    {
    }
}
