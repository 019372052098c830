namespace ScanSim.Display.Painting;

/// <summary>Steps of scales that read well.</summary>
internal static class NiceStep
{
    private static ReadOnlySpan<double> TimeSteps =>
    [
        1, 2, 5, 10, 15, 30,
        60, 120, 300, 600, 900, 1800,
        3600, 7200, 10_800, 21_600, 43_200, 86_400,
    ];

    /// <summary>The smallest of 1, 2 or 5 times a power of ten that is not below <paramref name="least"/> (positive).</summary>
    public static double AtLeast(double least)
    {
        var power = Math.Pow(10, Math.Floor(Math.Log10(least)));
        // The allowance keeps 5.000000001 from becoming 10.
        var mantissa = least / power * (1 - 1e-9);
        return power * (mantissa <= 1 ? 1 : mantissa <= 2 ? 2 : mantissa <= 5 ? 5 : 10);
    }

    /// <summary>The smallest usual step of a clock (seconds, minutes, hours, days) that is not below <paramref name="leastS"/>.</summary>
    public static double TimeAtLeast(double leastS)
    {
        foreach (var step in TimeSteps)
        {
            if (step >= leastS)
            {
                return step;
            }
        }

        return 86_400 * AtLeast(leastS / 86_400);
    }
}
