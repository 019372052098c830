namespace ScanSim.Physics.Detection;

/// <summary>Checks of the arguments of this folder. NaN passes: it comes out as NaN.</summary>
internal static class DetectionArgument
{
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
