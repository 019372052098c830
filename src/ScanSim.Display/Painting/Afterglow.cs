namespace ScanSim.Display.Painting;

/// <summary>How plots fade with age: in whole scans, from full to faint, and only that.</summary>
internal static class Afterglow
{
    private const double Faintest = 0.10;

    /// <summary>Age in whole scans of something reported at <paramref name="reportedS"/>.</summary>
    public static int AgeScans(double timeS, double reportedS, double periodS) => (int)((timeS - reportedS) / periodS);

    /// <summary>Opacity in (0, 1] at an age from 0 to <paramref name="scans"/> − 1.</summary>
    public static double Opacity(int ageScans, int scans)
    {
        var rest = 1 - (double)ageScans / scans;
        return Faintest + (1 - Faintest) * Math.Pow(rest, 1.5);
    }
}
