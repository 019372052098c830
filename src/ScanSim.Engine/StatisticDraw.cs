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

    /// <summary>z for case 2: each pulse's sample is complex normal with variance 1 + SNR.</summary>
    public static double OfCase2(ReadOnlySpan<double> pulseSnrRatio, ref DrawStream draws)
    {
        double sum = 0;
        foreach (var snr in pulseSnrRatio)
        {
            sum += (1 + snr) * draws.NextExponential();
        }

        return sum;
    }

    /// <summary>
    /// z for case 4. One pulse's characteristic function is (1 − t)/(1 − ct)² with c = 1 + SNR/2: a mixture of c·Gamma(1)
    /// (probability 1/c) and c·Gamma(2).
    /// </summary>
    public static double OfCase4(ReadOnlySpan<double> pulseSnrRatio, ref DrawStream draws)
    {
        double sum = 0;
        foreach (var snr in pulseSnrRatio)
        {
            var c = 1 + 0.5 * snr;
            var sample = draws.NextExponential();
            if (draws.NextUniform() * c > 1)
            {
                sample += draws.NextExponential();
            }

            sum += c * sample;
        }

        return sum;
    }
}
