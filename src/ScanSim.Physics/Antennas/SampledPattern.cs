using System.Runtime.CompilerServices;

namespace ScanSim.Physics.Antennas;

/// <summary>A pattern as uniform samples over [−π, π], with a floor: what the run itself evaluates.</summary>
/// <remarks>
/// Linear interpolation of the one-way power ratio; each sample is at least the floor, so the result is too. The step is the
/// beamwidth over <see cref="SamplesPerBeamwidth"/> or finer, but never more than 2²⁰ samples. Accuracy within the main lobe:
/// step²/8 times the pattern's curvature, for the Gaussian at most ln 2 / 16384 = 4.3e-5 of the peak (0.0002 dB at the peak).
/// Immutable; several threads may read it.
/// </remarks>
public sealed class SampledPattern
{
    public const int SamplesPerBeamwidth = 128;

    /// <summary>Share of a step by which the bound of <see cref="MaximumOffsetRad"/> is put outwards: far above the rounding of an index of 2²⁰.</summary>
    private const double OutwardSteps = 1e-6;

    private const int MostIntervals = (1 << 20) - 4;

    private readonly double[] samples;
    private readonly double[] envelope;
    private readonly double stepsPerRad;
    private readonly double centre;

    public SampledPattern(Pattern pattern, double floorRatio)
    {
        if (!(floorRatio >= 0.0 && floorRatio <= 1.0))
        {
            throw new ArgumentOutOfRangeException(nameof(floorRatio), floorRatio, "the side-lobe floor is a ratio from 0 to 1");
        }

        int half = HalfCount(pattern.BeamwidthRad);
        StepRad = Math.PI / half;
        // One unit down, so that ±π times it does not round beyond the first and last sample.
        stepsPerRad = Math.BitDecrement(half / Math.PI);
        centre = half;
        BeamwidthRad = pattern.BeamwidthRad;
        samples = Sample(pattern, floorRatio, half);
        envelope = Envelope(samples, half);
    }

    public double BeamwidthRad { get; }

    public double StepRad { get; }

    /// <summary>One-way power relative to the peak. The offset is wrapped to [−π, π] already; outside it the call throws.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public double GainRatio(double offsetRad)
    {
        double position = offsetRad * stepsPerRad + centre;

        // In range by the wrapping: no need for the saturating conversion of a cast.
        int index = double.ConvertToIntegerNative<int>(position);
        double below = samples[index];
        return below + (position - index) * (samples[index + 1] - below);
    }

    /// <summary>
    /// An upper bound of the |offset| at which <see cref="GainRatio"/> still reaches the level: beyond it the pattern is below
    /// the level on both sides. π when the floor or a far lobe reaches it, 0 when nothing does.
    /// </summary>
    /// <remarks>
    /// The bound is the outermost crossing of the interpolated pattern, plus a millionth of a step for the rounding in
    /// <see cref="GainRatio"/>. NaN gives π: a level that is not known excludes nothing.
    /// </remarks>
    public double MaximumOffsetRad(double levelRatio)
    {
        if (envelope[0] < levelRatio)
        {
            return 0.0;
        }

        int reached = 0;
        int below = envelope.Length;
        while (below - reached > 1)
        {
            int middle = (reached + below) >>> 1;
            if (envelope[middle] < levelRatio)
            {
                below = middle;
            }
            else
            {
                reached = middle;
            }
        }

        if (reached == envelope.Length - 1)
        {
            return Math.PI;
        }

        int half = envelope.Length - 1;
        double share = Math.Max(
            ShareOfStep(samples[half + reached], samples[half + reached + 1], levelRatio),
            ShareOfStep(samples[half - reached], samples[half - reached - 1], levelRatio));
        return Math.Min(Math.PI, (reached + share + OutwardSteps) * StepRad);
    }

    private static int HalfCount(double beamwidthRad)
    {
        double needed = Math.Ceiling(Math.PI * SamplesPerBeamwidth / beamwidthRad);
        return (int)Math.Clamp(needed, SamplesPerBeamwidth, MostIntervals / 2);
    }

    private static double[] Sample(Pattern pattern, double floorRatio, int half)
    {
        // One sample more than the closed interval needs: an offset of exactly π reads the pair (last, guard).
        double[] values = new double[2 * half + 2];
        for (int i = 0; i <= 2 * half; i++)
        {
            double offsetRad = i == 0 ? -Math.PI : i == 2 * half ? Math.PI : (i - half) * (Math.PI / half);
            values[i] = Math.Max(pattern.GainRatio(offsetRad), floorRatio);
        }

        values[^1] = values[^2];
        return values;
    }

    /// <summary>Entry k is the greatest sample at or beyond k steps from the peak, on either side.</summary>
    private static double[] Envelope(double[] values, int half)
    {
        double[] greatestBeyond = new double[half + 1];
        double greatest = 0.0;
        for (int k = half; k >= 0; k--)
        {
            greatest = Math.Max(greatest, Math.Max(values[half + k], values[half - k]));
            greatestBeyond[k] = greatest;
        }

        return greatestBeyond;
    }

    /// <summary>Where a falling pair of samples crosses the level, as a share of the step; 0 when the inner one is below it already.</summary>
    private static double ShareOfStep(double inner, double outer, double levelRatio) =>
        inner < levelRatio ? 0.0 : (inner - levelRatio) / (inner - outer);
}
