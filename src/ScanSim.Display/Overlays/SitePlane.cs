using ScanSim.Physics.Earth;
using ScanSim.Scenarios;

namespace ScanSim.Display.Overlays;

/// <summary>The site's azimuthal-equidistant plane.</summary>
internal sealed class SitePlane(Site site)
{
    private const double RadPerDeg = Math.PI / 180;

    /// <summary>Well beyond the limit on any radius of the earth, well short of the antipode: the geodesic is computed within it only.</summary>
    private const double FarthestArcRad = 0.5;

    /// <summary>Null when the place is farther than <see cref="Overlay.FarthestM"/>.</summary>
    public OverlayVertex? Place(double longitudeDeg, double latitudeDeg)
    {
        var (latitudeRad, longitudeRad) = (latitudeDeg * RadPerDeg, longitudeDeg * RadPerDeg);
        if (ArcRad(latitudeRad, longitudeRad) > FarthestArcRad)
        {
            return null;
        }

        var line = Geodesic.Inverse(site.LatitudeRad, site.LongitudeRad, latitudeRad, longitudeRad);
        var (sin, cos) = Math.SinCos(line.Azimuth12Rad);
        return line.DistanceM > Overlay.FarthestM ? null : new OverlayVertex((float)(line.DistanceM * sin), (float)(line.DistanceM * cos));
    }

    /// <summary>Great-circle arc by the haversine formula.</summary>
    private double ArcRad(double latitudeRad, double longitudeRad)
    {
        var a = Math.Sin((latitudeRad - site.LatitudeRad) / 2);
        var b = Math.Sin((longitudeRad - site.LongitudeRad) / 2);
        return 2 * Math.Asin(Math.Min(1, Math.Sqrt(a * a + Math.Cos(latitudeRad) * Math.Cos(site.LatitudeRad) * b * b)));
    }
}
