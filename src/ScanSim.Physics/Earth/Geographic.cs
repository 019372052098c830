namespace ScanSim.Physics.Earth;

/// <summary>Latitude north and longitude east on WGS-84, in radians. The default is the crossing of equator and Greenwich.</summary>
public readonly record struct Geographic(double LatitudeRad, double LongitudeRad);
