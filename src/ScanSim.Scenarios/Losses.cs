namespace ScanSim.Scenarios;

/// <summary>Losses that lower the signal, as ratios ≥ 1. The receiving line's loss is in the system noise temperature, not here.</summary>
public sealed record Losses
{
    /// <summary>Between the transmitter's flange and the antenna.</summary>
    public required double TransmitRatio { get; init; }

    /// <summary>Filter mismatch, range straddling, CFAR, ageing: whatever the data sheet counts as processing or field loss.</summary>
    public required double ProcessingRatio { get; init; }

    public double TotalRatio => TransmitRatio * ProcessingRatio;
}
