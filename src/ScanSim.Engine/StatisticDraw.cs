using ScanSim.Physics.Detection;
using ScanSim.Physics.Draws;

namespace ScanSim.Engine;

/// <summary>Draws of the detection statistic z: the sum over a dwell's pulses of the squared envelope, noise power 1 per pulse.</summary>
internal static class StatisticDraw
{
    /// <summary>Drawn RCS over mean RCS: 1 for case 0, exponential for 1 and 2, Gamma(2)/2 for 3 and 4.</summary>
    /// <remarks>Source: P. Swerling, RAND RM-1217 (1954): chi-square with 2 (cases 1, 2) or 4 (cases 3, 4) degrees of freedom.</remarks>
    public static double Fluctuation(FluctuationCase fluctuation, ref DrawStream draws) => fluctuation switch
    {
        FluctuationCase.Steady => 1,
        FluctuationCase.Case1 or FluctuationCase.Case2 => draws.NextExponential(),
        _ => 0.5 * (draws.NextExponential() + draws.NextExponential()),
    };

    /// <summary>
    /// z for a known signal of given energy (sum over the pulses of |signal|²): the sum of n complex samples' squares depends on the
    /// energy only, so it is one sample that holds all of the signal, plus n − 1 of noise alone.
    /// </summary>
    public static double OfKnownSignal(int pulses, double energyRatio, ref DrawStream draws)
    {
        var inPhase = Math.Sqrt(energyRatio) + draws.NextNormal() * Math.Sqrt(0.5);
        var quadrature = draws.NextNormal();
        return inPhase * inPhase + 0.5 * quadrature * quadrature + draws.NextGamma(pulses - 1);
    }

    /// <summary>z for cases 2 and 4: each pulse has an RCS of its own, and its own mean SNR.</summary>
    /// <remarks>
    /// One pulse's moment generating function is 1/(1 − mt) with m = 1 + S for case 2, (1 − t)/(1 − mt)² with m = 1 + S/2 for case 4.
    /// Since (1 − t)/(1 − mt) = 1/m + (1 − 1/m)/(1 − mt), each is that of noise, 1/(1 − t), plus one (case 2) or two (case 4)
    /// exponentials of mean m that are there with probability 1 − 1/m each. So z is the sum of n noise samples, Gamma(n), plus those
    /// exponentials: exact, and most of them are absent when the signal is weak. Which come is found run by run: the next comes
    /// where the probability of none since the last one, the product of 1/m, falls below a uniform number.
    /// </remarks>
    public static double OfPulseFluctuation(FluctuationCase fluctuation, ReadOnlySpan<double> pulseSnrRatio, ref DrawStream draws)
    {
        var stages = fluctuation == FluctuationCase.Case2 ? 1 : 2;
        var sum = draws.NextGamma(pulseSnrRatio.Length);
        var product = 1.0;
        var limit = draws.NextUniform();
        foreach (var snr in pulseSnrRatio)
        {
            var mean = 1 + snr / stages;
            for (var stage = 0; stage < stages; stage++)
            {
                product *= mean;
                if (product * limit > 1)
                {
                    sum += mean * draws.NextExponential();
                    product = 1;
                    limit = draws.NextUniform();
                }
            }
        }

        return sum;
    }
}
