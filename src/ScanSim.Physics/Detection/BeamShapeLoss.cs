namespace ScanSim.Physics.Detection;

/// <summary>Loss of a scanning Gaussian beam against n pulses at the beam's peak, n counted between the one-way half-power points.</summary>
/// <remarks>
/// Widths are in units of the one-way half-power beamwidth; the two-way power pattern is exp(−8·ln2·u²). Loss ratios are for one
/// scanned coordinate; two coordinates multiply. Not to be mixed: the matched figure is [Barton1988]'s 1.24 dB, the uniform window that
/// of [Blake1969], 1.6 dB (both printed figures from memory; the integrals are exact). They are for comparison with published budgets,
/// not factors of a budget whose pulses are weighted one by one (<see cref="UnequalPulses"/>). Accuracy: relative 1e-14.
/// NaN in, NaN out; a negative width is an <see cref="ArgumentOutOfRangeException"/>.
/// </remarks>
public static class BeamShapeLoss
{
    /// <summary>Width of the uniform window with the least loss, the root of d(√w/∫)/dw = 0; 0.8408 beamwidths.</summary>
    public const double OptimumWindowBeamwidths = 0.840776844014757;

    /// <summary>Dense pulses, each weighted by the pattern: √(8·ln2/π) = 1.3286 (1.234 dB), the reciprocal of ∫exp(−8·ln2·u²) du.</summary>
    public static double DenseMatchedRatio => Math.Sqrt(8 * Math.Log(2) / Math.PI);

    /// <summary>Dense pulses summed with equal weight over a window (square-law detector, small signal): √w/∫_(−w/2..w/2) exp(−8·ln2·u²) du.</summary>
    /// <remarks>The noise of the sum grows with √w, the signal with the integral. Domain: width ≥ 0; infinite at 0.</remarks>
    public static double UniformWindowRatio(double windowBeamwidths) =>
        windowBeamwidths == 0 ? double.PositiveInfinity : Math.Sqrt(windowBeamwidths) / PatternIntegral(windowBeamwidths);

    /// <summary>Reciprocal of the mean two-way power gain over a window, w/∫_(−w/2..w/2) exp(−8·ln2·u²) du; 1 for a narrow window.</summary>
    public static double MeanPowerRatio(double windowBeamwidths) =>
        windowBeamwidths == 0 ? 1 : windowBeamwidths / PatternIntegral(windowBeamwidths);

    /// <summary>∫ over the window = √(π/(8·ln2))·erf(½·w·√(8·ln2)), with erf(x) = P(½, x²) ([DLMF] 8.4.1).</summary>
    private static double PatternIntegral(double windowBeamwidths)
    {
        DetectionArgument.NotNegative(windowBeamwidths, nameof(windowBeamwidths));
        return IncompleteGamma.LowerRegularized(0.5, 2 * Math.Log(2) * windowBeamwidths * windowBeamwidths) / DenseMatchedRatio;
    }
}
