namespace ScanSim.Scenarios;

/// <summary>One antenna for both ways. Gain over the isotropic radiator; pattern = azimuth cut × elevation cut, floored.</summary>
public sealed record Antenna
{
    public required double GainRatio { get; init; }

    public required PatternCut Azimuth { get; init; }

    public required PatternCut Elevation { get; init; }

    /// <summary>Elevation of the beam's peak above the horizontal, positive up.</summary>
    public required double TiltRad { get; init; }

    /// <summary>Level below the peak (one way, power ratio ≤ 1) under which the whole pattern never falls.</summary>
    public required double SideLobeFloorRatio { get; init; }
}
