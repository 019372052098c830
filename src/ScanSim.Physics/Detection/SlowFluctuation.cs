namespace ScanSim.Physics.Detection;

/// <summary>Tails of the sum when all pulses share one draw of the target: cases 1 (K = 1) and 3 (K = 2).</summary>
/// <remarks>
/// [Shnidman1989]: the probability is Σ_k NB(k; K, b)·Q(n+k, T), NB = b^k/c for K = 1 and (k+1)·b^k/c² for K = 2, c = 1 + n·S/K,
/// b = 1 − 1/c. Once Q(n+k, T) is 1 the rest of the weights is summed in closed form, so the length of the sums is about
/// T − n + 9·√T whatever the SNR. The closed forms of [Swerling1954] subtract and lose digits where the SNR is small.
/// </remarks>
internal static class SlowFluctuation
{
    /// <summary>Below this SNR the signal changes nothing in double precision, and its reciprocal may overflow.</summary>
    public const double NoSignalBelowRatio = 1e-30;

    private const double Negligible = 1e-17;

    /// <summary>Probability that the sum exceeds the threshold; meant for thresholds above the mean.</summary>
    public static double Upper(int shape, int pulses, double snrRatio, double threshold)
    {
        var extra = pulses * snrRatio / shape;
        var decay = extra / (1 + extra);
        var rest = 1 / (1 + extra);

        // Terms with n + k this far below T are below e^−300 and would underflow on the way.
        var order = Math.Max(pulses, Math.Floor(threshold - Math.Sqrt(600 * threshold)));
        var k = order - pulses;
        var tail = IncompleteGamma.UpperRegularized(order, threshold);
        var step = Math.Exp(PoissonTerm.Log(order, threshold));
        var power = Math.Pow(decay, k);
        var scale = shape == 1 ? rest : rest * rest;
        var sum = 0.0;
        while (order < threshold || step > Negligible * tail)
        {
            sum += scale * power * Multiplicity(shape, k) * tail;
            if (RestOfWeights(shape, k + 1, power * decay, rest) < Negligible * sum)
            {
                return sum;
            }

            tail += step;
            k++;
            order++;
            step *= threshold / order;
            power *= decay;
        }

        return sum + RestOfWeights(shape, k, power, rest);
    }

    /// <summary>Probability that the sum stays below the threshold; meant for thresholds below the mean.</summary>
    public static double Lower(int shape, int pulses, double snrRatio, double threshold)
    {
        var extra = pulses * snrRatio / shape;
        var decay = extra / (1 + extra);
        var rest = 1 / (1 + extra);
        var order = LastOrder(pulses, threshold);
        var tail = IncompleteGamma.LowerRegularized(order, threshold);
        var step = Math.Exp(PoissonTerm.Log(order - 1, threshold));
        var sum = 0.0;
        for (var k = order - pulses; k >= 0; k--)
        {
            sum = sum * decay + Multiplicity(shape, k) * tail;
            order--;
            tail += step;
            step *= order / threshold;
        }

        return sum * (shape == 1 ? rest : rest * rest);
    }

    private static double Multiplicity(int shape, double k) => shape == 1 ? 1 : k + 1;

    private static double RestOfWeights(int shape, double k, double power, double rest) => shape == 1 ? power : power * (1 + k * rest);

    /// <summary>The order above which P(order, T) is negligible beside P(n, T).</summary>
    private static double LastOrder(int pulses, double threshold)
    {
        if (threshold >= pulses)
        {
            return Math.Ceiling(threshold + 9.5 * Math.Sqrt(threshold) + 20);
        }

        var order = (double)pulses;
        for (var term = 1.0; term > 0.1 * Negligible; term *= threshold / order)
        {
            order++;
        }

        return order;
    }
}
