namespace ScanSim.Physics.Detection;

/// <summary>Marcum's Q function of whole order, Q_m(a, b), with its complement and its logarithm.</summary>
/// <remarks>
/// Definition: Q_m(a, b) = ∫_b^∞ x·(x/a)^(m−1)·exp(−(x² + a²)/2)·I_(m−1)(a·x) dx, [Marcum1960]; not the variants in (a²/2, b²/2).
/// Computed as the Poisson mixture Σ_k Pois(k; a²/2)·Q(m+k, b²/2) of [Shnidman1989], the smaller tail first, started where its terms
/// are negligible and stepped in the direction in which everything is added (no subtraction anywhere).
/// Domain: m ≥ 1; a, b ≥ 0, at most one of them infinite. Accuracy: relative 1e-12 down to 1e-300 for a, b up to several hundred
/// (docs/physics/detection.md). The number of terms grows with √(a·b): 20 at 1, 3,000 at 300.
/// NaN in, NaN out; arguments outside the domain are an <see cref="ArgumentOutOfRangeException"/>.
/// </remarks>
public static class MarcumQ
{
    private const double Negligible = 1e-17;

    /// <summary>Q_m(a, b).</summary>
    public static double Q(int m, double a, double b)
    {
        Check(m, a, b);
        return Upper(m, 0.5 * a * a, 0.5 * b * b);
    }

    /// <summary>1 − Q_m(a, b), accurate by itself.</summary>
    public static double Complement(int m, double a, double b)
    {
        Check(m, a, b);
        return Lower(m, 0.5 * a * a, 0.5 * b * b);
    }

    /// <summary>log Q_m(a, b), also where Q is below the smallest double.</summary>
    public static double LogQ(int m, double a, double b)
    {
        Check(m, a, b);
        var energy = 0.5 * a * a;
        var threshold = 0.5 * b * b;
        return threshold > m + energy ? LogUpperTail(m, energy, threshold) : PoissonTerm.LogOnePlus(-Math.Exp(LogLowerTail(m, energy, threshold)));
    }

    /// <summary>log(1 − Q_m(a, b)), also where 1 − Q is below the smallest double.</summary>
    public static double LogComplement(int m, double a, double b)
    {
        Check(m, a, b);
        var energy = 0.5 * a * a;
        var threshold = 0.5 * b * b;
        return threshold > m + energy ? PoissonTerm.LogOnePlus(-Math.Exp(LogUpperTail(m, energy, threshold))) : LogLowerTail(m, energy, threshold);
    }

    /// <summary>Q_m(√(2·energy), √(2·threshold)) without the detour over the roots.</summary>
    internal static double Upper(int m, double energy, double threshold) =>
        threshold > m + energy ? Math.Exp(LogUpperTail(m, energy, threshold)) : 1 - Math.Exp(LogLowerTail(m, energy, threshold));

    /// <summary>1 − Q_m(√(2·energy), √(2·threshold)).</summary>
    internal static double Lower(int m, double energy, double threshold) =>
        threshold > m + energy ? 1 - Math.Exp(LogUpperTail(m, energy, threshold)) : Math.Exp(LogLowerTail(m, energy, threshold));

    private static void Check(int m, double a, double b)
    {
        DetectionArgument.AtLeastOne(m, nameof(m));
        DetectionArgument.NotNegative(a, nameof(a));
        DetectionArgument.NotNegative(b, nameof(b));
        if (double.IsInfinity(a) && double.IsInfinity(b))
        {
            throw new ArgumentOutOfRangeException(nameof(b), b, "a and b are both infinite; at most one may be.");
        }
    }

    /// <summary>Σ_k Pois(k; energy)·Q(m+k, threshold) upwards; meant for threshold &gt; m + energy.</summary>
    private static double LogUpperTail(int m, double energy, double threshold)
    {
        if (energy == 0 || double.IsPositiveInfinity(threshold))
        {
            return IncompleteGamma.LogUpperRegularized(m, threshold);
        }

        var (peak, width) = Summit(m, energy, threshold);
        var k = Math.Max(0, Math.Floor(peak - 9.5 * width - 5));
        var shape = m + k;
        var logFirst = IncompleteGamma.LogUpperRegularized(shape, threshold);
        var logScale = logFirst + PoissonTerm.Log(k, energy);
        var step = Math.Exp(PoissonTerm.Log(shape, threshold) - logFirst);
        double sum = 1, term = 1;
        while (k < peak || term > Negligible * sum)
        {
            // Weight and tail apart would leave the range of doubles; their product, the term, does not.
            k++;
            shape++;
            var ratio = energy / k;
            term = ratio * (term + step);
            step *= ratio * (threshold / shape);
            sum += term;
        }

        return Math.Min(0, logScale + Math.Log(sum));
    }

    /// <summary>Σ_k Pois(k; energy)·P(m+k, threshold) downwards; meant for threshold ≤ m + energy. NaN arrives here too.</summary>
    private static double LogLowerTail(int m, double energy, double threshold)
    {
        if (double.IsNaN(energy + threshold) || energy == 0)
        {
            return IncompleteGamma.LogLowerRegularized(m, threshold + energy);
        }

        if (threshold == 0 || double.IsPositiveInfinity(energy))
        {
            return double.NegativeInfinity;
        }

        var (peak, width) = Summit(m, energy, threshold);
        var k = LastTerm(m, energy * threshold, peak, width);
        var shape = m + k;
        var logFirst = IncompleteGamma.LogLowerRegularized(shape, threshold);
        var logScale = logFirst + PoissonTerm.Log(k, energy);
        var step = Math.Exp(PoissonTerm.Log(shape - 1, threshold) - logFirst);
        double sum = 1, term = 1;
        while (k > 0 && (k > peak || term > Negligible * sum))
        {
            var ratio = k / energy;
            k--;
            shape--;
            term = ratio * (term + step);
            step *= ratio * (shape / threshold);
            sum += term;
        }

        return Math.Min(0, logScale + Math.Log(sum));
    }

    /// <summary>Where the terms are greatest, k·(m+k) = energy·threshold, and their width as that of a normal density.</summary>
    private static (double Peak, double Width) Summit(int m, double energy, double threshold)
    {
        var root = 2 * Math.Sqrt(energy) * Math.Sqrt(threshold);
        var peak = root / (m / root + Math.Sqrt(m / root * (m / root) + 1)) * 0.5;
        return (peak, Math.Sqrt(peak * (m + peak) / (m + 2 * peak)));
    }

    private static double LastTerm(int m, double product, double peak, double width)
    {
        if (peak > 10)
        {
            return Math.Ceiling(peak + 9.5 * width + 20);
        }

        var k = 0.0;
        for (var term = 1.0; k < peak || term > 0.1 * Negligible; k++)
        {
            term *= product / ((k + 1) * (m + k + 1));
        }

        return k;
    }
}
