namespace ScanSim.Physics.Earth;

/// <summary>Shortest line between two points of the ellipsoid.</summary>
/// <param name="DistanceM">Length on the ellipsoid's surface.</param>
/// <param name="Azimuth12Rad">At point 1 towards point 2, from true north, clockwise, in [0, 2π).</param>
/// <param name="Azimuth21Rad">At point 2 towards point 1, likewise.</param>
public readonly record struct GeodesicLine(double DistanceM, double Azimuth12Rad, double Azimuth21Rad);
