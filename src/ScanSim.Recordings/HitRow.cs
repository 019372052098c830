namespace ScanSim.Recordings;

/// <summary>One threshold crossing: one range cell of one dwell.</summary>
public readonly record struct HitRow
{
    public required double TimeS { get; init; }

    public required int Scan { get; init; }

    public required long Dwell { get; init; }

    public required double BeamAzimuthDeg { get; init; }

    /// <summary>Measured (apparent, perhaps folded) slant range.</summary>
    public required double RangeM { get; init; }

    /// <summary>Measured signal-to-noise ratio per pulse: statistic / pulses − 1.</summary>
    public required double SnrDb { get; init; }

    public required EchoKind Kind { get; init; }

    /// <summary>Id; several targets in one cell are joined by '+', the strongest first; empty for noise.</summary>
    public required string Target { get; init; }
}
