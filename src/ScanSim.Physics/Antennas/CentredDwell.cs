namespace ScanSim.Physics.Antennas;

/// <summary>A dwell whose middle points at the target: the best a scanning beam can do.</summary>
public static class CentredDwell
{
    /// <summary>Mean two-way azimuth pattern over the dwell's pulses, the first and last equally far from the peak. Its inverse is the beam-shape loss that no dwell escapes.</summary>
    /// <remarks>
    /// For a dense dwell of one Gaussian beamwidth −1.67 dB (the mean two-way gain between half-power points). Domain: pulses ≥ 1; offsets
    /// beyond ±π count as ±π. Accuracy: that of the sampled pattern. NaN in, NaN out.
    /// </remarks>
    /// <param name="azimuth">One-way azimuth pattern.</param>
    /// <param name="stepRad">Angle that the beam moves from pulse to pulse.</param>
    /// <param name="pulses">Pulses of the dwell.</param>
    public static double MeanTwoWayRatio(SampledPattern azimuth, double stepRad, int pulses)
    {
        double sum = 0.0;
        for (int pulse = 0; pulse < pulses; pulse++)
        {
            double gain = azimuth.GainRatio(Math.Clamp(stepRad * (pulse - 0.5 * (pulses - 1)), -Math.PI, Math.PI));
            sum += gain * gain;
        }

        return sum / pulses;
    }
}
