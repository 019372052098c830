namespace ScanSim.Physics.Tests.Detection;

/// <summary>
/// Exact tail of a sum of exponentials of different means: the chain "stage 1, stage 2, …, done" is uniformized (Jensen 1953), so the
/// probability of not being done at T is a Poisson mixture of the states after k jumps. Only positive numbers are added.
/// </summary>
/// <remarks>
/// A pulse of case 2 is one exponential stage of mean 1+S. A pulse of case 4 is one of mean c = 1+S/2 and, with probability 1−1/c, a
/// second one: (1−t)/(1−ct)² = [1/c + (1−1/c)/(1−ct)]/(1−ct).
/// </remarks>
internal static class PulseChain
{
    /// <summary>Probabilities that the sum exceeds the threshold and that it does not.</summary>
    public static (double Detect, double Miss) Tails(bool case4, ReadOnlySpan<double> snrRatios, double threshold)
    {
        var stages = new List<(double Rate, double SkipNext)>();
        foreach (var snr in snrRatios)
        {
            var c = case4 ? 1 + snr / 2 : 1 + snr;
            stages.Add((1 / c, case4 ? 1 / c : 0));
            if (case4)
            {
                stages.Add((1 / c, 0));
            }
        }

        var fastest = stages.Max(s => s.Rate);
        var mean = fastest * threshold;
        var state = new double[stages.Count + 2];
        state[0] = 1;
        double detect = 0, miss = 0, logWeight = -mean;
        var last = (int)(mean + 40 * Math.Sqrt(mean) + 200 + 8 * stages.Count);
        for (var k = 0; k <= last; k++)
        {
            logWeight += k == 0 ? 0 : Math.Log(mean / k);
            var weight = Math.Exp(logWeight);
            detect += weight * Sum(state.AsSpan(0, stages.Count));
            miss += weight * state[stages.Count];
            Jump(stages, fastest, state);
        }

        return (detect, miss);
    }

    private static double Sum(ReadOnlySpan<double> values)
    {
        var sum = 0.0;
        foreach (var value in values)
        {
            sum += value;
        }

        return sum;
    }

    private static void Jump(List<(double Rate, double SkipNext)> stages, double fastest, double[] state)
    {
        for (var i = stages.Count - 1; i >= 0; i--)
        {
            var moved = state[i] * (stages[i].Rate / fastest);
            state[i] -= moved;
            state[i + 1] += moved * (1 - stages[i].SkipNext);
            state[Math.Min(i + 2, stages.Count)] += moved * stages[i].SkipNext;
        }
    }
}
