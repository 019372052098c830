namespace ScanSim.Engine;

/// <summary>One target in one dwell's beam: geometry and every factor of the per-pulse signal-to-noise ratio, as ratios.</summary>
/// <remarks>SNR per pulse = radar · RCS / range⁴ · azimuth beam · elevation beam · eclipsing; the beams are two-way means over the dwell's pulses. default(Look) is no look.</remarks>
public readonly record struct Look
{
    public required double RangeM { get; init; }

    /// <summary>Range as the receiver sees it: folded by the pulse repetition.</summary>
    public required double ApparentRangeM { get; init; }

    public required double AzimuthRad { get; init; }

    public required double ElevationRad { get; init; }

    /// <summary>Target azimuth minus beam azimuth at the middle of the dwell, in [−π, π].</summary>
    public required double OffsetRad { get; init; }

    public required double AzimuthBeamRatio { get; init; }

    public required double ElevationBeamRatio { get; init; }

    public required double EclipsingRatio { get; init; }

    /// <summary>Mean signal-to-noise ratio per pulse.</summary>
    public required double SnrRatio { get; init; }
}
