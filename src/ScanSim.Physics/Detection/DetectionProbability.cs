namespace ScanSim.Physics.Detection;

/// <summary>Probability that the sum of n square-law samples exceeds the threshold: steady target and Swerling's cases 1 to 4.</summary>
/// <remarks>
/// Sources: [Marcum1960] (steady), [Swerling1954] (cases), [Shnidman1989] (mixture form: the probability is
/// Σ_k w_k·Q(n+k, T) with w Poisson, negative binomial or binomial). Every form used here only adds positive numbers, and the smaller
/// of detection and miss is the one computed, so both are accurate by themselves.
/// Domain: pulses ≥ 1 (tested to 4096), mean SNR per pulse from 0 to 1e30 as a ratio, threshold ≥ 0 in units of the noise power of a sample,
/// Q(n, T) above 1e-100. Accuracy: docs/physics/detection.md (1e-13 absolute and relative 1e-12 in both tails against 30-digit values).
/// NaN in, NaN out; arguments outside the domain are an <see cref="ArgumentOutOfRangeException"/>.
/// </remarks>
public static class DetectionProbability
{
    /// <summary>Pd. <paramref name="snrRatio"/> is the mean SNR of each single pulse, not of the sum.</summary>
    public static double Detect(FluctuationCase fluctuation, int pulses, double snrRatio, double threshold)
    {
        Check(pulses, snrRatio, threshold);
        return IsUpperSmaller(pulses, snrRatio, threshold)
            ? Upper(fluctuation, pulses, snrRatio, threshold)
            : 1 - Lower(fluctuation, pulses, snrRatio, threshold);
    }

    /// <summary>1 − Pd, accurate by itself. <paramref name="snrRatio"/> is the mean SNR of each single pulse.</summary>
    public static double Miss(FluctuationCase fluctuation, int pulses, double snrRatio, double threshold)
    {
        Check(pulses, snrRatio, threshold);
        return IsUpperSmaller(pulses, snrRatio, threshold)
            ? 1 - Upper(fluctuation, pulses, snrRatio, threshold)
            : Lower(fluctuation, pulses, snrRatio, threshold);
    }

    /// <summary>log(Pd/(1 − Pd)), from the smaller of the two.</summary>
    internal static double LogOdds(FluctuationCase fluctuation, int pulses, double snrRatio, double threshold)
    {
        if (IsUpperSmaller(pulses, snrRatio, threshold))
        {
            var detect = Upper(fluctuation, pulses, snrRatio, threshold);
            return Math.Log(detect / (1 - detect));
        }

        var miss = Lower(fluctuation, pulses, snrRatio, threshold);
        return Math.Log((1 - miss) / miss);
    }

    private static void Check(int pulses, double snrRatio, double threshold)
    {
        DetectionArgument.AtLeastOne(pulses, nameof(pulses));
        DetectionArgument.Snr(snrRatio, nameof(snrRatio));
        DetectionArgument.Threshold(threshold, nameof(threshold));
    }

    private static bool IsUpperSmaller(int pulses, double snrRatio, double threshold) => threshold > pulses * (1 + snrRatio);

    private static double Upper(FluctuationCase fluctuation, int pulses, double snrRatio, double threshold)
    {
        if (snrRatio < SlowFluctuation.NoSignalBelowRatio)
        {
            return IncompleteGamma.UpperRegularized(pulses, threshold);
        }

        return fluctuation switch
        {
            FluctuationCase.Steady => MarcumQ.Upper(pulses, pulses * snrRatio, threshold),
            FluctuationCase.Case1 when pulses > 1 => SlowFluctuation.Upper(1, pulses, snrRatio, threshold),
            FluctuationCase.Case1 or FluctuationCase.Case2 => IncompleteGamma.UpperRegularized(pulses, threshold / (1 + snrRatio)),
            FluctuationCase.Case3 => SlowFluctuation.Upper(2, pulses, snrRatio, threshold),
            FluctuationCase.Case4 => FastFluctuation.Upper(pulses, snrRatio, threshold),
            _ => throw Unknown(fluctuation),
        };
    }

    private static double Lower(FluctuationCase fluctuation, int pulses, double snrRatio, double threshold)
    {
        if (double.IsNaN(snrRatio + threshold))
        {
            return double.NaN;
        }

        if (snrRatio < SlowFluctuation.NoSignalBelowRatio || threshold == 0)
        {
            return IncompleteGamma.LowerRegularized(pulses, threshold);
        }

        return fluctuation switch
        {
            FluctuationCase.Steady => MarcumQ.Lower(pulses, pulses * snrRatio, threshold),
            FluctuationCase.Case1 when pulses > 1 => SlowFluctuation.Lower(1, pulses, snrRatio, threshold),
            FluctuationCase.Case1 or FluctuationCase.Case2 => IncompleteGamma.LowerRegularized(pulses, threshold / (1 + snrRatio)),
            FluctuationCase.Case3 => SlowFluctuation.Lower(2, pulses, snrRatio, threshold),
            FluctuationCase.Case4 => FastFluctuation.Lower(pulses, snrRatio, threshold),
            _ => throw Unknown(fluctuation),
        };
    }

    private static ArgumentOutOfRangeException Unknown(FluctuationCase fluctuation) =>
        new(nameof(fluctuation), fluctuation, $"Fluctuation case {fluctuation} is unknown; it must be one of 0 (steady) to 4.");
}
