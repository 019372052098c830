namespace ScanSim.Recordings;

/// <summary>A recording that cannot be written or read; the message is for the user and says where, what was found and what would be right.</summary>
public sealed class RecordingException : Exception
{
    public RecordingException(string message)
        : base(message)
    {
    }

    public RecordingException(string message, Exception cause)
        : base(message, cause)
    {
    }
}
