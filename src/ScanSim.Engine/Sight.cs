namespace ScanSim.Engine;

/// <summary>A target as seen from the antenna, on the effective earth.</summary>
/// <remarks>default(Sight) is a target in the antenna itself, below the horizon.</remarks>
public readonly record struct Sight
{
    /// <summary>Distance over the surface.</summary>
    public required double GroundM { get; init; }

    /// <summary>Slant range.</summary>
    public required double RangeM { get; init; }

    /// <summary>In [0, 2π), clockwise from true north.</summary>
    public required double AzimuthRad { get; init; }

    public required double ElevationRad { get; init; }

    public required double CosElevation { get; init; }

    public required bool AboveHorizon { get; init; }
}
