namespace ScanSim.Display.Replay;

/// <summary>Names of pictures saved from the window.</summary>
internal static class SavedPicture
{
    /// <summary>Scenario and time, and a number when that name is taken: nothing is overwritten.</summary>
    public static string FreeName(string folder, Scene scene, double timeS, string ending)
    {
        var name = $"{Plain(scene.ScenarioName)}-{scene.StartUtc.ToUniversalTime().AddSeconds(timeS):HHmmss}";
        var path = Path.Combine(folder, name + ending);
        for (var number = 2; File.Exists(path); number++)
        {
            path = Path.Combine(folder, $"{name}-{number}{ending}");
        }

        return path;
    }

    /// <summary>Letters and digits in lower case, everything else as single hyphens.</summary>
    private static string Plain(string text)
    {
        var words = new string([.. text.Select(c => char.IsLetterOrDigit(c) ? char.ToLowerInvariant(c) : ' ')]).Split(' ', StringSplitOptions.RemoveEmptyEntries);
        return words.Length == 0 ? "replay" : string.Join('-', words);
    }
}
