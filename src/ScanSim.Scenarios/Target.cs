namespace ScanSim.Scenarios;

/// <summary>A moving target.</summary>
public sealed record Target
{
    /// <summary>Unique; letters, digits, '-', '_' and '.' only ('+' joins ids of targets that share a cell).</summary>
    public required string Id { get; init; }

    /// <summary>What it is, in words ("fishing boat"); free text.</summary>
    public required string Class { get; init; }

    /// <summary>Mean radar cross section.</summary>
    public required double RcsM2 { get; init; }

    /// <summary>Fluctuation case 0 (steady) to 4.</summary>
    public required int FluctuationCase { get; init; }

    public required Track Track { get; init; }
}
