namespace ScanSim.Physics.Detection;

/// <summary>Tails of the sum for case 4 (a new draw of density 4x/m²·exp(−2x/m) at each pulse).</summary>
/// <remarks>
/// With c = 1 + S/2 and p = 1 − 1/c the probability is Σ_(k=0..n) C(n, k)·p^k·(1−p)^(n−k)·Q(n+k, T/c): each pulse is one exponential
/// of mean c, and with probability p two (from its moment generating function (1−t)/(1−ct)²). All terms are positive; the recursions
/// printed for this case alternate in sign. As in <see cref="MarcumQ"/> the sum starts where its terms are negligible and is stepped in
/// the direction in which the tails add up.
/// </remarks>
internal static class FastFluctuation
{
    private const double Negligible = 1e-17;

    /// <summary>Probability that the sum exceeds the threshold; meant for thresholds above the mean.</summary>
    public static double Upper(int pulses, double snrRatio, double threshold)
    {
        var odds = 0.5 * snrRatio;
        var scaled = threshold / (1 + odds);
        var (peak, width) = Summit(pulses, odds * scaled);
        var k = Math.Max(0, Math.Floor(peak - 9.5 * width - 5));
        var logTail = IncompleteGamma.LogUpperRegularized(pulses + k, scaled);
        var step = Math.Exp(PoissonTerm.Log(pulses + k, scaled) - logTail);
        var logFirst = logTail + LogWeight(pulses, k, odds);
        double term = 1, sum = 1;
        while (k < pulses && (k < peak || term > Negligible * sum))
        {
            var ratio = odds * (pulses - k) / (k + 1);
            k++;
            term = ratio * (term + step);
            step *= ratio * (scaled / (pulses + k));
            sum += term;
        }

        return Math.Min(1, Math.Exp(logFirst + Math.Log(sum)));
    }

    /// <summary>Probability that the sum stays below the threshold; meant for thresholds below the mean.</summary>
    public static double Lower(int pulses, double snrRatio, double threshold)
    {
        var odds = 0.5 * snrRatio;
        var scaled = threshold / (1 + odds);
        var (peak, width) = Summit(pulses, odds * scaled);
        var k = LastTerm(pulses, odds * scaled, peak, width);
        var logTail = IncompleteGamma.LogLowerRegularized(pulses + k, scaled);
        var step = Math.Exp(PoissonTerm.Log(pulses + k - 1, scaled) - logTail);
        var logFirst = logTail + LogWeight(pulses, k, odds);
        double term = 1, sum = 1;
        while (k > 0 && (k > peak || term > Negligible * sum))
        {
            var ratio = k / (odds * (pulses - k + 1));
            k--;
            term = ratio * (term + step);
            step *= ratio * ((pulses + k) / scaled);
            sum += term;
        }

        return Math.Min(1, Math.Exp(logFirst + Math.Log(sum)));
    }

    /// <summary>log of the binomial weight as three Poisson terms, [Loader2000]: Bin(k; n, p) = Pois(k; np)·Pois(n−k; nq)/Pois(n; n).</summary>
    private static double LogWeight(int pulses, double k, double odds) =>
        PoissonTerm.Log(k, pulses * (odds / (1 + odds))) + PoissonTerm.Log(pulses - k, pulses / (1 + odds)) - PoissonTerm.Log(pulses, pulses);

    /// <summary>Where the terms are greatest, k·(n+k) = product·(n−k+1), and their width as that of a normal density.</summary>
    private static (double Peak, double Width) Summit(int pulses, double product)
    {
        var half = 0.5 * (pulses + product);
        var peak = product * (pulses + 1) / (half + Math.Sqrt(half * half + product * (pulses + 1)));
        return (peak, 1 / Math.Sqrt(1 / peak + 1 / (pulses + peak) + 1 / (pulses + 1 - peak)));
    }

    private static double LastTerm(int pulses, double product, double peak, double width)
    {
        if (peak > 10)
        {
            return Math.Min(pulses, Math.Ceiling(peak + 9.5 * width + 20));
        }

        var k = 0.0;
        for (var term = 1.0; k < pulses && (k < peak || term > 0.1 * Negligible); k++)
        {
            term *= product * (pulses - k) / ((k + 1) * (pulses + k + 1));
        }

        return k;
    }
}
