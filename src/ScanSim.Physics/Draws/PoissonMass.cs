namespace ScanSim.Physics.Draws;

/// <summary>Probability mass of the Poisson distribution without the cancellation of −μ + k ln μ − ln k!.</summary>
internal static class PoissonMass
{
    /// <summary>ln √(2π).</summary>
    private const double HalfLogTwoPi = 0.918938533204672741780;

    /// <summary>Below this count the factorial is multiplied out; from it on the Stirling remainder has 2e-16 with the terms kept.</summary>
    private const int FirstStirling = 16;

    /// <summary>ln of the mass at <paramref name="k"/> ≥ 0 for a mean above 0.</summary>
    /// <remarks>
    /// Source: C. Loader, Fast and accurate computation of binomial probabilities, 2000 (saddle-point form): for k &gt; 0
    /// −D(k, μ) − δ(k) − ½ ln(2πk), with the deviance D and the remainder δ of Stirling's series. Accuracy: 1e-14 absolute
    /// plus 2⁻⁵²·D.
    /// </remarks>
    public static double Log(int k, double mean)
    {
        if (k < FirstStirling)
        {
            double factorial = 1.0;
            for (int i = 2; i <= k; i++)
            {
                factorial *= i;
            }

            return k * Math.Log(mean) - mean - Math.Log(factorial);
        }

        return -Deviance(k, mean) - StirlingRemainder(k) - HalfLogTwoPi - 0.5 * Math.Log(k);
    }

    /// <summary>k ln(k/μ) + μ − k; close to the mean by its series in v = (k − μ)/(k + μ).</summary>
    private static double Deviance(double k, double mean)
    {
        double difference = k - mean;
        if (Math.Abs(difference) >= 0.1 * (k + mean))
        {
            return k * Math.Log(k / mean) - difference;
        }

        double v = difference / (k + mean);
        double sum = difference * v;
        double term = 2.0 * k * v;
        for (int j = 1; j < 1000; j++)
        {
            term *= v * v;
            double next = sum + term / (2 * j + 1);
            if (next == sum)
            {
                break;
            }

            sum = next;
        }

        return sum;
    }

    private static double StirlingRemainder(double k)
    {
        double square = k * k;
        return (1.0 / 12.0 - (1.0 / 360.0 - (1.0 / 1260.0 - (1.0 / 1680.0 - 1.0 / 1188.0 / square) / square) / square) / square) / k;
    }
}
