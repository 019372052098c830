namespace ScanSim.Physics.Antennas;

/// <summary>Gaussian main lobe without side lobes: exp(−4 ln 2 (θ/θ3)²), which is −12.041 (θ/θ3)² dB.</summary>
/// <remarks>Follows from the definition (half power at θ3/2). Accuracy: (1 + |exponent|)·2⁻⁵² relative. NaN in, NaN out.</remarks>
public sealed class GaussianPattern(double beamwidthRad) : Pattern
{
    private const double FourLogTwo = 2.77258872223978123767;

    public override double BeamwidthRad { get; } = CheckedBeamwidth(beamwidthRad);

    public override double GainRatio(double offsetRad)
    {
        double widths = offsetRad / BeamwidthRad;
        return Math.Exp(-FourLogTwo * widths * widths);
    }
}
