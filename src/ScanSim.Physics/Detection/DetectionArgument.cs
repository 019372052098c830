namespace ScanSim.Physics.Detection;

/// <summary>Checks of the arguments of this folder. NaN passes: it comes out as NaN.</summary>
internal static class DetectionArgument
{
    /// <summary>300 dB: far above any echo; beyond it intermediate products could leave the range of doubles.</summary>
    private const double GreatestSnrRatio = 1e30;

    public static void Snr(double snrRatio, string name)
    {
        if (snrRatio is < 0 or > GreatestSnrRatio)
        {
            throw new ArgumentOutOfRangeException(name, snrRatio, $"The SNR ratio is {snrRatio:R}; it must be from 0 to {GreatestSnrRatio}.");
        }
    }

    public static void Threshold(double threshold, string name)
    {
        if (threshold < 0 || double.IsPositiveInfinity(threshold))
        {
            throw new ArgumentOutOfRangeException(name, threshold, $"The threshold is {threshold:R}; it must be 0 or more and finite.");
        }
    }

    public static void AtLeastOne(int value, string name)
    {
        if (value < 1)
        {
            throw new ArgumentOutOfRangeException(name, value, $"{name} is {value}; it must be 1 or more.");
        }
    }

    public static void NotNegative(double value, string name)
    {
        if (value < 0)
        {
            throw new ArgumentOutOfRangeException(name, value, $"{name} is {value:R}; it must be 0 or more.");
        }
    }

    public static void Positive(double value, string name)
    {
        if (value <= 0)
        {
            throw new ArgumentOutOfRangeException(name, value, $"{name} is {value:R}; it must be greater than 0.");
        }
    }

    public static void InsideZeroToOne(double value, string name)
    {
        if (value is <= 0 or >= 1)
        {
            throw new ArgumentOutOfRangeException(name, value, $"{name} is {value:R}; it must lie between 0 and 1, both excluded.");
        }
    }
}
