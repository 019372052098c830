namespace ScanSim.Display;

/// <summary>Files that stand under their name only when they are whole: written beside, then renamed.</summary>
internal static class FileBeside
{
    /// <summary>Lets <paramref name="write"/> fill the file whose path it is given, and renames that to <paramref name="path"/>. Whatever goes wrong leaves nothing behind.</summary>
    /// <param name="path">The name asked for; a file that has it is replaced.</param>
    /// <param name="what">"Picture" or "Film": begins the message.</param>
    /// <param name="write">Fills an empty file that is there already.</param>
    /// <exception cref="PictureException">The file cannot be written.</exception>
    public static void Write(string path, string what, Action<string> write)
    {
        var unfinished = path + ".part";
        var begun = false;
        try
        {
            using (File.Create(unfinished))
            {
                begun = true;
            }

            write(unfinished);
            File.Move(unfinished, path, overwrite: true);
            begun = false;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw new PictureException($"{what} '{path}' could not be written: {fault.Message}", fault);
        }
        finally
        {
            if (begun)
            {
                Discard(unfinished);
            }
        }
    }

    private static void Discard(string path)
    {
        try
        {
            File.Delete(path);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            // The first fault is the one to report.
        }
    }
}
