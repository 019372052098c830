namespace ScanSim.Scenarios;

/// <summary>What a system noise temperature was computed from.</summary>
public sealed record ReceiverParts
{
    public required double AntennaTemperatureK { get; init; }

    public required double LineLossRatio { get; init; }

    public required double LineTemperatureK { get; init; }

    public required double NoiseFigureRatio { get; init; }
}
