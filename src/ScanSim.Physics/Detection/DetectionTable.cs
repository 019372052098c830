namespace ScanSim.Physics.Detection;

/// <summary>Probability of detection over SNR for one case, number of pulses and threshold, made once and read in about 10 ns.</summary>
/// <remarks>
/// The log odds log(Pd/(1−Pd)) are a cubic polynomial in the SNR on each segment, through four exact values; a segment is the 2^−m part of an
/// octave, found from the bits of the double, so that reading needs no logarithm. m is raised until, where the error of the cubic of
/// every segment is greatest, the table is within a tenth of its accuracy of <see cref="DetectionProbability"/>; 16 to 32 segments an
/// octave do for n to 4096 and Pfa to 1e-15, and more than 256 are refused with an <see cref="ArithmeticException"/>. Below the table Pd is Q(n, T), above it 1.
/// Accuracy: 1e-6 absolute everywhere and 1e-4 relative where Pd &lt; 1e-4. NaN in, NaN out; a negative SNR is an
/// <see cref="ArgumentOutOfRangeException"/>. Immutable, safe for any number of threads.
/// </remarks>
public sealed class DetectionTable
{
    private const int LeastSplit = 2;
    private const int GreatestSplit = 8;
    private const int MantissaBits = 52;
    private const double TestedAbsolute = 1e-7;
    private const double TestedRelative = 1e-5;

    /// <summary>Below this probability only the absolute accuracy is asked for.</summary>
    private const double NeverSeen = 1e-100;

    private readonly double noiseOnly;
    private readonly double lowRatio;
    private readonly double highRatio;
    private readonly int shift;
    private readonly long firstIndex;
    private readonly double segmentScale;
    private readonly Cubic[] segments;

    /// <summary>Makes the table from some thousand exact values (1 to 30 ms).</summary>
    /// <param name="fluctuation">How the target fluctuates.</param>
    /// <param name="pulses">Number of pulses summed, 1 or more.</param>
    /// <param name="threshold">Threshold on the sum in units of the noise power of a sample, as of <see cref="DetectionThreshold"/>.</param>
    public DetectionTable(FluctuationCase fluctuation, int pulses, double threshold)
    {
        Fluctuation = fluctuation;
        Pulses = pulses;
        Threshold = threshold;
        noiseOnly = DetectionProbability.Detect(fluctuation, pulses, 0, threshold);
        if (double.IsNaN(noiseOnly))
        {
            throw new ArgumentOutOfRangeException(nameof(threshold), threshold, "The threshold is not a number.");
        }

        lowRatio = LowEnd();
        highRatio = HighEnd();
        for (var split = LeastSplit; ; split++)
        {
            shift = MantissaBits - split;
            segmentScale = Math.ScaleB(1, -shift);
            firstIndex = BitConverter.DoubleToInt64Bits(lowRatio) >> shift;
            segments = Build();
            if (IsCloseEnough())
            {
                return;
            }

            if (split == GreatestSplit)
            {
                throw new ArithmeticException(
                    $"The table of {fluctuation}, {pulses} pulses, threshold {threshold:R} misses its accuracy with {1 << split} segments an octave.");
            }
        }
    }

    public FluctuationCase Fluctuation { get; }

    public int Pulses { get; }

    public double Threshold { get; }

    /// <summary>Pd at a mean SNR per pulse.</summary>
    public double Detect(double snrRatio)
    {
        if (!(snrRatio >= lowRatio))
        {
            return BelowTable(snrRatio);
        }

        if (snrRatio >= highRatio)
        {
            return 1;
        }

        var bits = BitConverter.DoubleToInt64Bits(snrRatio);
        var part = (bits & ((1L << shift) - 1)) * segmentScale;
        ref readonly var cubic = ref segments[(int)((bits >> shift) - firstIndex)];
        return 1 / (1 + Math.Exp(-(cubic.C0 + part * (cubic.C1 + part * (cubic.C2 + part * cubic.C3)))));
    }

    private double BelowTable(double snrRatio)
    {
        DetectionArgument.NotNegative(snrRatio, nameof(snrRatio));
        return double.IsNaN(snrRatio) ? snrRatio : noiseOnly;
    }

    /// <summary>A power of two below which the signal raises Pd by less than 1e-6 of itself.</summary>
    private double LowEnd()
    {
        var exponent = 0;
        while (exponent > -60 && DetectionProbability.Detect(Fluctuation, Pulses, Math.ScaleB(1, exponent), Threshold) > noiseOnly * (1 + 1e-6))
        {
            exponent--;
        }

        return Math.ScaleB(1, exponent);
    }

    /// <summary>A power of two above which the probability of a miss is below 1e-8.</summary>
    private double HighEnd()
    {
        var ratio = 2 * lowRatio;
        while (ratio < 1e15 && DetectionProbability.Miss(Fluctuation, Pulses, ratio, Threshold) > 1e-8)
        {
            ratio *= 2;
        }

        return ratio;
    }

    private Cubic[] Build()
    {
        var count = (int)((BitConverter.DoubleToInt64Bits(highRatio) >> shift) - firstIndex);
        var made = new Cubic[count];
        var left = LogOdds(SegmentStart(0));
        for (var i = 0; i < count; i++)
        {
            var start = SegmentStart(i);
            var width = SegmentStart(i + 1) - start;
            var right = LogOdds(start + width);
            made[i] = Cubic.Through(left, LogOdds(start + width / 3), LogOdds(start + width * (2.0 / 3)), right);
            left = right;
        }

        return made;
    }

    private bool IsCloseEnough()
    {
        for (var i = 0; i < segments.Length; i++)
        {
            var start = SegmentStart(i);
            var width = SegmentStart(i + 1) - start;

            // The error of the cubic is greatest near 0.13 and 0.87 of the segment.
            if (!IsCloseAt(start + 0.127 * width) || !IsCloseAt(start + 0.873 * width))
            {
                return false;
            }
        }

        return true;
    }

    private bool IsCloseAt(double snrRatio)
    {
        var exact = DetectionProbability.Detect(Fluctuation, Pulses, snrRatio, Threshold);
        var difference = Math.Abs(Detect(snrRatio) - exact);
        return difference <= TestedAbsolute && (exact > 1e-3 || exact < NeverSeen || difference <= TestedRelative * exact);
    }

    private double SegmentStart(int index) => BitConverter.Int64BitsToDouble((firstIndex + index) << shift);

    private double LogOdds(double snrRatio)
    {
        // Beyond 700 the exponential leaves the range of doubles; the probability is 1 or 0 there to every digit.
        return Math.Clamp(DetectionProbability.LogOdds(Fluctuation, Pulses, snrRatio, Threshold), -700, 700);
    }

    private readonly record struct Cubic(double C0, double C1, double C2, double C3)
    {
        /// <summary>The cubic through values at 0, 1/3, 2/3 and 1.</summary>
        public static Cubic Through(double y0, double y1, double y2, double y3) =>
            new(y0, 0.5 * (-11 * y0 + 18 * y1 - 9 * y2 + 2 * y3), 4.5 * (2 * y0 - 5 * y1 + 4 * y2 - y3), 4.5 * (-y0 + 3 * y1 - 3 * y2 + y3));
    }
}
