namespace ScanSim.Physics.Earth;

/// <summary>Where a target stands as the antenna sees it.</summary>
/// <param name="SlantRangeM">Straight distance on the effective earth.</param>
/// <param name="ElevationRad">Above the antenna's horizontal, positive up.</param>
/// <param name="CosElevation">Cosine of the elevation; 1 in the antenna itself.</param>
public readonly record struct SlantGeometry(double SlantRangeM, double ElevationRad, double CosElevation);
