namespace ScanSim.Physics.Waveforms;

/// <summary>Pulses within the one-way half-power beamwidth of a turning antenna.</summary>
public static class BeamwidthPulses
{
    /// <summary>n = θ3 PRF / ω, a real number; with degrees and turns per minute this is θ3 PRF / (6 rpm).</summary>
    /// <remarks>
    /// Source: M. I. Skolnik, Introduction to Radar Systems, 3rd ed., 2001, section 2.7 (from memory).
    /// Domain: scan rate ≠ 0 (its sign does not matter). Two roundings. NaN in, NaN out.
    /// </remarks>
    public static double Count(double beamwidthRad, double prfHz, double scanRateRadPerS) =>
        beamwidthRad * prfHz / Math.Abs(scanRateRadPerS);
}
