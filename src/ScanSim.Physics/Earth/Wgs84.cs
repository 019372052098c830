namespace ScanSim.Physics.Earth;

/// <summary>The ellipsoid of the World Geodetic System 1984.</summary>
/// <remarks>Source: NIMA TR8350.2, 3rd ed. (amended 2000), table 3.1; ICAO Doc 9674. Defining constants, exact.</remarks>
public static class Wgs84
{
    /// <summary>Semi-major axis a.</summary>
    public const double SemiMajorAxisM = 6_378_137.0;

    /// <summary>Flattening f.</summary>
    public const double FlatteningRatio = 1.0 / 298.257223563;

    /// <summary>Semi-minor axis b = a (1 − f).</summary>
    public const double SemiMinorAxisM = SemiMajorAxisM * (1.0 - FlatteningRatio);

    /// <summary>First eccentricity squared, f (2 − f).</summary>
    public const double EccentricitySquared = FlatteningRatio * (2.0 - FlatteningRatio);
}
