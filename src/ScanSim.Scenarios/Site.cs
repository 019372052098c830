namespace ScanSim.Scenarios;

/// <summary>Where the antenna stands: WGS-84 latitude and longitude, heights in metres above mean sea level.</summary>
/// <remarks>Heights above mean sea level are used as heights above the ellipsoid: the geoid's separation is left out.</remarks>
public sealed record Site
{
    public required string Name { get; init; }

    public required double LatitudeRad { get; init; }

    public required double LongitudeRad { get; init; }

    public required double GroundHeightM { get; init; }

    /// <summary>Height of the antenna's phase centre above the ground at the site.</summary>
    public required double AntennaHeightM { get; init; }

    /// <summary>Height of the antenna's phase centre above mean sea level.</summary>
    public double AntennaAltitudeM => GroundHeightM + AntennaHeightM;
}
