namespace ScanSim.Recordings;

/// <summary>Where one target really was when the beam's centre passed it (or at mid-scan where the beam never does).</summary>
public readonly record struct TruthRow
{
    public required double TimeS { get; init; }

    public required int Scan { get; init; }

    public required string Target { get; init; }

    public required double LatitudeDeg { get; init; }

    public required double LongitudeDeg { get; init; }

    /// <summary>Above mean sea level.</summary>
    public required double HeightM { get; init; }

    /// <summary>East and north in the site's azimuthal-equidistant plane.</summary>
    public required double EastM { get; init; }

    public required double NorthM { get; init; }

    public required double EastMps { get; init; }

    public required double NorthMps { get; init; }

    public required double UpMps { get; init; }

    /// <summary>Slant range on the effective earth.</summary>
    public required double RangeM { get; init; }

    public required double AzimuthDeg { get; init; }

    public required double ElevationDeg { get; init; }

    public required TargetView View { get; init; }
}
