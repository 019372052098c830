namespace ScanSim.Physics.Detection;

/// <summary>Mean SNR per pulse that a probability of detection requires.</summary>
/// <remarks>
/// The root of the exact <see cref="DetectionProbability"/> in the logarithm of the SNR, by the Illinois variant of false position
/// [DowellJarratt1971] on the log odds of detection. Domain: 0 &lt; Pfa &lt; Pd &lt; 1. Accuracy: the SNR is settled to relative 1e-13; against 12-digit
/// values 1e-9 dB. NaN in, NaN out; arguments outside the domain are an <see cref="ArgumentOutOfRangeException"/>.
/// </remarks>
public static class RequiredSnr
{
    private const int StepCap = 300;

    /// <summary>Mean SNR of each pulse (a ratio) with which n pulses reach the detection probability.</summary>
    public static double Ratio(FluctuationCase fluctuation, int pulses, double falseAlarmProbability, double detectionProbability)
    {
        DetectionArgument.InsideZeroToOne(detectionProbability, nameof(detectionProbability));
        if (detectionProbability <= falseAlarmProbability)
        {
            throw new ArgumentOutOfRangeException(
                nameof(detectionProbability),
                detectionProbability,
                $"Detection probability {detectionProbability:R} must exceed the false-alarm probability {falseAlarmProbability:R}.");
        }

        var threshold = DetectionThreshold.FromFalseAlarm(pulses, falseAlarmProbability);
        if (double.IsNaN(threshold + detectionProbability))
        {
            return double.NaN;
        }

        var target = Math.Log(detectionProbability / (1 - detectionProbability));
        return Math.Exp(Root(logSnr => DetectionProbability.LogOdds(fluctuation, pulses, Math.Exp(logSnr), threshold) - target));
    }

    private static double Root(Func<double, double> rising)
    {
        var (low, lowValue, high, highValue) = Bracket(rising);
        var last = double.NaN;
        var lastSide = 0;
        for (var i = 0; i < StepCap; i++)
        {
            var middle = double.IsFinite(lowValue) && double.IsFinite(highValue)
                ? high - highValue * (high - low) / (highValue - lowValue)
                : 0.5 * (low + high);
            var value = rising(middle);
            if (value == 0 || Math.Abs(middle - last) < 1e-14)
            {
                return middle;
            }

            // Illinois: an end that stays twice counts half, so that both ends close in.
            var side = Math.Sign(value);
            if (side > 0)
            {
                (high, highValue) = (middle, value);
                lowValue *= side == lastSide ? 0.5 : 1;
            }
            else
            {
                (low, lowValue) = (middle, value);
                highValue *= side == lastSide ? 0.5 : 1;
            }

            (last, lastSide) = (middle, side);
        }

        throw new ArithmeticException($"The required SNR did not settle in {StepCap} steps between {low:R} and {high:R} (log ratio).");
    }

    private static (double Low, double LowValue, double High, double HighValue) Bracket(Func<double, double> rising)
    {
        const double StepUp = 2;
        var low = 0.0;
        var lowValue = rising(low);
        while (lowValue > 0 && low > -200)
        {
            low -= StepUp;
            lowValue = rising(low);
        }

        var high = low + StepUp;
        var highValue = rising(high);
        while (highValue < 0 && high < 200)
        {
            (low, lowValue) = (high, highValue);
            high += StepUp;
            highValue = rising(high);
        }

        return (low, lowValue, high, highValue);
    }
}
