namespace ScanSim.Recordings;

/// <summary>One extracted report: the hits of one pass that hang together.</summary>
public readonly record struct PlotRow
{
    /// <summary>When the beam's centre pointed at the plot's azimuth, seconds since the scenario's start.</summary>
    public required double TimeS { get; init; }

    public required int Scan { get; init; }

    public required double RangeM { get; init; }

    public required double AzimuthDeg { get; init; }

    /// <summary>Measured signal-to-noise ratio per pulse of the strongest hit.</summary>
    public required double SnrDb { get; init; }

    public required int Hits { get; init; }

    /// <summary>Standard deviation of the range error as the extractor would state it.</summary>
    public required double SigmaRangeM { get; init; }

    public required double SigmaAzimuthDeg { get; init; }

    public required EchoKind Kind { get; init; }

    /// <summary>Ids joined by '+', the strongest first; empty for noise.</summary>
    public required string Target { get; init; }
}
