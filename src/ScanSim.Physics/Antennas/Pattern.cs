namespace ScanSim.Physics.Antennas;

/// <summary>One cut of an antenna pattern: one-way power relative to the peak, over the angle from the peak.</summary>
/// <remarks>
/// Angles lie in [−π, π]; the peak is 1 and every value is finite and ≥ 0. A closed form that knows nothing of what lies behind
/// the antenna gives 0 there: the floor of <see cref="SampledPattern"/> stands for far side lobes and the back. Immutable.
/// NaN in, NaN out.
/// </remarks>
public abstract class Pattern
{
    /// <summary>Width between the one-way half-power points.</summary>
    public abstract double BeamwidthRad { get; }

    /// <summary>One-way power relative to the peak.</summary>
    public abstract double GainRatio(double offsetRad);

    /// <summary>Rejects a beamwidth that is not in (0, 2π].</summary>
    protected static double CheckedBeamwidth(double beamwidthRad) =>
        beamwidthRad is > 0 and <= 2.0 * Math.PI
            ? beamwidthRad
            : throw new ArgumentOutOfRangeException(nameof(beamwidthRad), beamwidthRad, "a beamwidth lies above 0 and up to 2π rad");
}
