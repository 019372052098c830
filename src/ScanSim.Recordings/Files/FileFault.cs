namespace ScanSim.Recordings.Files;

/// <summary>Turns what the operating system says about a file into a message for the user.</summary>
internal static class FileFault
{
    public static bool IsOne(Exception fault) =>
        fault is IOException or UnauthorizedAccessException or NotSupportedException or System.Security.SecurityException;

    public static void Writing(string path, Action write)
    {
        try
        {
            write();
        }
        catch (Exception fault) when (IsOne(fault))
        {
            throw new RecordingException($"{path} cannot be written: {fault.Message}", fault);
        }
    }

    public static T Reading<T>(string path, Func<T> read)
    {
        try
        {
            return read();
        }
        catch (Exception fault) when (IsOne(fault))
        {
            throw new RecordingException($"{path} cannot be read: {fault.Message}", fault);
        }
    }
}
