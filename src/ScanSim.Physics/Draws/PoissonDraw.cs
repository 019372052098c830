namespace ScanSim.Physics.Draws;

/// <summary>Draws of the Poisson distribution.</summary>
/// <remarks>
/// Mean below 10: sequential search from 0. From 10: the transformed rejection PTRS of W. Hörmann, The transformed rejection
/// method for generating Poisson random variables, Insurance: Mathematics and Economics 12 (1993), pp. 39-45.
/// </remarks>
internal static class PoissonDraw
{
    /// <summary>PTRS is defined from this mean on, and is then about as quick as the search.</summary>
    private const double SmallestRejectionMean = 10.0;

    /// <summary>32,000 standard deviations below the largest int.</summary>
    private const double LargestMean = 1 << 30;

    /// <summary>2⁻⁵⁶: a mass that no longer changes a sum near 1.</summary>
    private const double LeastMass = 1.0 / (1L << 56);

    public static int Next(ref DrawStream stream, double mean)
    {
        if (!(mean >= 0.0 && mean <= LargestMean))
        {
            throw new ArgumentOutOfRangeException(nameof(mean), mean, "the mean of a Poisson distribution lies from 0 to 2^30");
        }

        return mean < SmallestRejectionMean ? BySearch(ref stream, mean) : ByRejection(ref stream, mean);
    }

    private static int BySearch(ref DrawStream stream, double mean)
    {
        double left = stream.NextUniform();
        double mass = Math.Exp(-mean);
        int count = 0;
        // The masses are summed with rounding: past the point where they no longer change the sum the search ends.
        while (left > mass && (mass > LeastMass || count < mean))
        {
            left -= mass;
            count++;
            mass *= mean / count;
        }

        return count;
    }

    private static int ByRejection(ref DrawStream stream, double mean)
    {
        double b = 0.931 + 2.53 * Math.Sqrt(mean);
        double a = -0.059 + 0.02483 * b;
        double inverseAlpha = 1.1239 + 1.1328 / (b - 3.4);
        double squeeze = 0.9277 - 3.6224 / (b - 2.0);
        while (true)
        {
            double u = stream.NextUniform() - 0.5;
            double v = stream.NextUniform();
            double us = 0.5 - Math.Abs(u);
            double k = Math.Floor((2.0 * a / us + b) * u + mean + 0.43);
            if (us >= 0.07 && v <= squeeze)
            {
                return (int)k;
            }

            if (k < 0.0 || k > int.MaxValue || (us < 0.013 && v > us))
            {
                continue;
            }

            if (Math.Log(v * inverseAlpha / (a / (us * us) + b)) <= PoissonMass.Log((int)k, mean))
            {
                return (int)k;
            }
        }
    }
}
