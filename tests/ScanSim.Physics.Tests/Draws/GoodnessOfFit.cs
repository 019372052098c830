using MathNet.Numerics.Distributions;

namespace ScanSim.Physics.Tests.Draws;

/// <summary>Two tests of a sample against a distribution, each at a chance of 1e-4 to fail when the distribution is right.</summary>
internal static class GoodnessOfFit
{
    public const double Chance = 1e-4;

    /// <summary>Kolmogorov: √n D stays below 2.225 with probability 1 − 2 exp(−2·2.225²) = 1 − 1e-4 (asymptotic, n above some 1,000).</summary>
    private const double KolmogorovLimit = 2.2253;

    /// <summary>The distribution function is evaluated at every fiftieth draw in order: it costs more than the draws, and 50 of 198,000 hide 0.03 % at most.</summary>
    private const int Stride = 50;

    /// <summary>Draws that resolve an error of <paramref name="error"/> in the distribution function.</summary>
    public static int SizeFor(double error) => (int)Math.Ceiling(Math.Pow(KolmogorovLimit / error, 2));

    public static void Kolmogorov(double[] sample, Func<double, double> distribution, string what)
    {
        Array.Sort(sample);
        double worst = 0.0;
        for (int i = 0; i < sample.Length; i += Stride)
        {
            double f = distribution(sample[i]);
            worst = Math.Max(worst, Math.Max(f - (double)i / sample.Length, (i + 1.0) / sample.Length - f));
        }

        double statistic = Math.Sqrt(sample.Length) * worst;
        Assert.True(statistic < KolmogorovLimit, $"{what}: Kolmogorov statistic {statistic:F3}, limit {KolmogorovLimit}");
    }

    /// <summary>Pearson's chi-square; neighbouring classes are pooled until at least 10 are expected in each.</summary>
    public static void ChiSquare(IReadOnlyList<double> expected, IReadOnlyList<long> counted, string what)
    {
        double statistic = 0.0;
        int classes = 0;
        double e = 0.0;
        double o = 0.0;
        double expectedLeft = expected.Sum();
        for (int i = 0; i < expected.Count; i++)
        {
            e += expected[i];
            o += counted[i];
            expectedLeft -= expected[i];
            if (e >= 10.0 && (expectedLeft >= 10.0 || i == expected.Count - 1))
            {
                statistic += (o - e) * (o - e) / e;
                classes++;
                e = 0.0;
                o = 0.0;
            }
        }

        if (e > 0.0)
        {
            statistic += (o - e) * (o - e) / e;
            classes++;
        }

        double limit = ChiSquared.InvCDF(classes - 1, 1.0 - Chance);
        Assert.True(classes > 1 && statistic < limit, $"{what}: chi-square {statistic:F1} over {classes} classes, limit {limit:F1}");
    }
}
