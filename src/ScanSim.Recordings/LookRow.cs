namespace ScanSim.Recordings;

/// <summary>One target in one dwell's beam. The terms *Db add up to <see cref="SnrDb"/>, the mean signal-to-noise ratio per pulse.</summary>
public readonly record struct LookRow
{
    /// <summary>Middle of the dwell, seconds since the scenario's start.</summary>
    public required double TimeS { get; init; }

    public required int Scan { get; init; }

    public required long Dwell { get; init; }

    public required string Target { get; init; }

    /// <summary>True slant range.</summary>
    public required double RangeM { get; init; }

    public required double AzimuthDeg { get; init; }

    public required double ElevationDeg { get; init; }

    /// <summary>Positive when the range grows.</summary>
    public required double RadialSpeedMps { get; init; }

    public required double BeamAzimuthDeg { get; init; }

    public required int Pulses { get; init; }

    /// <summary>Everything that is the same for all targets: power, gains, wavelength, (4π)³, losses, noise.</summary>
    public required double RadarDb { get; init; }

    /// <summary>Mean radar cross section in dB over 1 m².</summary>
    public required double RcsDb { get; init; }

    /// <summary>−40 lg(range / 1 m).</summary>
    public required double SpreadingDb { get; init; }

    /// <summary>Two-way azimuth pattern, mean over the dwell's pulses.</summary>
    public required double AzimuthBeamDb { get; init; }

    /// <summary>Two-way elevation pattern (with the side-lobe floor).</summary>
    public required double ElevationBeamDb { get; init; }

    public required double EclipsingDb { get; init; }

    public required double SnrDb { get; init; }

    /// <summary>Analytic probability of detection of this look alone.</summary>
    public required double Pd { get; init; }

    /// <summary>Drawn RCS over mean RCS for cases 0, 1 and 3; null for 2 and 4 (each pulse has its own).</summary>
    public required double? FluctuationDb { get; init; }

    /// <summary>Drawn detection statistic over the threshold.</summary>
    public required double StatisticDb { get; init; }

    public required bool Detected { get; init; }

    public required LossReason LostTo { get; init; }

    /// <summary>Number of targets in this range cell and dwell, this one included.</summary>
    public required int TargetsInCell { get; init; }
}
