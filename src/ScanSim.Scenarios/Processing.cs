namespace ScanSim.Scenarios;

/// <summary>What is done with the pulses of a dwell: square-law non-coherent integration against a fixed threshold.</summary>
public sealed record Processing
{
    /// <summary>Pulses per dwell; null: those within one one-way half-power beamwidth.</summary>
    public required int? PulsesPerDwell { get; init; }

    /// <summary>Per range cell and dwell, in (0, 0.1].</summary>
    public required double FalseAlarmProbability { get; init; }
}
