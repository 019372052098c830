namespace ScanSim.Scenarios;

/// <summary>The receiving chain: system noise temperature at the antenna terminals.</summary>
public sealed record Receiver
{
    /// <summary>Given, or made of antenna temperature, line loss and noise figure.</summary>
    public required double SystemTemperatureK { get; init; }

    /// <summary>Present when the temperature was computed from its parts.</summary>
    public ReceiverParts? Parts { get; init; }
}
