using ScanSim.Recordings;

namespace ScanSim.Display;

/// <summary>Where one target really was once a scan: its true slant range laid off along its azimuth, and its ground speed.</summary>
public readonly record struct TruthMark(double TimeS, int Scan, float EastM, float NorthM, float EastMps, float NorthMps, TargetView View)
{
    /// <summary>Above mean sea level.</summary>
    public float HeightM { get; init; }
}
