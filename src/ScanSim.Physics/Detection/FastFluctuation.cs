namespace ScanSim.Physics.Detection;

/// <summary>Tails of the sum for case 4 (a new draw of density 4x/m²·exp(−2x/m) at each pulse).</summary>
/// <remarks>
/// With c = 1 + S/2 and p = 1 − 1/c the probability is Σ_(k=0..n) C(n, k)·p^k·(1−p)^(n−k)·Q(n+k, T/c): each pulse is one exponential
/// of mean c, and with probability p two (from its moment generating function (1−t)/(1−ct)²). All terms are positive; the recursions
/// printed for this case alternate in sign. Weights and tails are carried with a common scale, as both leave the range of doubles.
/// </remarks>
internal static class FastFluctuation
{
    private const double RescaleAbove = 1e100;

    /// <summary>Probability that the sum exceeds the threshold; meant for thresholds above the mean.</summary>
    public static double Upper(int pulses, double snrRatio, double threshold)
    {
        var odds = 0.5 * snrRatio;
        var scaled = threshold / (1 + odds);
        var logScale = IncompleteGamma.LogUpperRegularized(pulses, scaled);
        var step = Math.Exp(PoissonTerm.Log(pulses, scaled) - logScale);
        logScale -= pulses * PoissonTerm.LogOnePlus(odds);
        double weight = 1, tail = 1, sum = 1;
        for (var k = 1; k <= pulses; k++)
        {
            weight *= odds * (pulses - k + 1) / k;
            tail += step;
            step *= scaled / (pulses + k);
            sum += weight * tail;
            Rescale(ref weight, ref tail, ref step, ref sum, ref logScale);
        }

        return Math.Min(1, Math.Exp(logScale + Math.Log(sum)));
    }

    /// <summary>Probability that the sum stays below the threshold; meant for thresholds below the mean.</summary>
    public static double Lower(int pulses, double snrRatio, double threshold)
    {
        var odds = 0.5 * snrRatio;
        var scaled = threshold / (1 + odds);
        var logScale = IncompleteGamma.LogLowerRegularized(2 * pulses, scaled);
        var step = Math.Exp(PoissonTerm.Log(2 * pulses - 1, scaled) - logScale);
        logScale -= pulses * PoissonTerm.LogOnePlus(1 / odds);
        double weight = 1, tail = 1, sum = 1;
        for (var k = pulses - 1; k >= 0; k--)
        {
            weight *= (k + 1) / (odds * (pulses - k));
            tail += step;
            step *= (pulses + k) / scaled;
            sum += weight * tail;
            Rescale(ref weight, ref tail, ref step, ref sum, ref logScale);
        }

        return Math.Min(1, Math.Exp(logScale + Math.Log(sum)));
    }

    private static void Rescale(ref double weight, ref double tail, ref double step, ref double sum, ref double logScale)
    {
        if (tail > RescaleAbove)
        {
            var factor = tail;
            tail = 1;
            step /= factor;
            sum /= factor;
            logScale += Math.Log(factor);
        }

        if (weight > RescaleAbove)
        {
            var factor = weight;
            weight = 1;
            sum /= factor;
            logScale += Math.Log(factor);
        }
    }
}
