namespace ScanSim.Physics.Earth;

/// <summary>Radius of the sphere that fits the ellipsoid best at one place.</summary>
public static class EarthRadius
{
    /// <summary>Gaussian mean radius √(M N) = a √(1 − e²) / (1 − e² sin² φ): the mean over all azimuths.</summary>
    /// <remarks>
    /// Source: W. Torge and J. Müller, Geodesy, 4th ed., de Gruyter 2012, section 4.1 (from memory); M and N are the radii of
    /// curvature of meridian and prime vertical. From 6,356,752 m at the equator to 6,399,594 m at the poles.
    /// Domain: |latitude| ≤ π/2. Accuracy: a few 2⁻⁵³ relative. NaN in, NaN out.
    /// </remarks>
    public static double GaussianMeanM(double latitudeRad)
    {
        double sine = Math.Sin(latitudeRad);
        return Wgs84.SemiMinorAxisM / (1.0 - Wgs84.EccentricitySquared * sine * sine);
    }
}
