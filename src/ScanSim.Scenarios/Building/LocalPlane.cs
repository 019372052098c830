using ScanSim.Physics.Earth;
using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>Turns the ways to write a position into east and north of the site (see <see cref="Track"/>).</summary>
internal sealed class LocalPlane(double siteLatitudeRad, double siteLongitudeRad)
{
    /// <summary>As for the other ways to write a position; it also keeps away from the antipode, where bearings end.</summary>
    private const double FarthestM = 2_000_000;

    /// <summary>A point far round the globe is farther than any site may see; a spherical distance is enough to tell.</summary>
    private const double FarthestArcRad = 0.5;

    /// <summary>Null, with a fault, when the position is too far away.</summary>
    public (double EastM, double NorthM)? Position(CheckedBlock place, FaultList faults)
    {
        if (place.Has("east"))
        {
            return (place.Si("east"), place.Si("north"));
        }

        if (place.Has("bearing"))
        {
            return Polar(place.Si("bearing"), place.Si("range"));
        }

        var (latitudeRad, longitudeRad) = (place.Si("latitude"), place.Si("longitude"));
        if (ArcRad(latitudeRad, longitudeRad) < FarthestArcRad)
        {
            var line = Geodesic.Inverse(siteLatitudeRad, siteLongitudeRad, latitudeRad, longitudeRad);
            if (line.DistanceM <= FarthestM)
            {
                return Polar(line.Azimuth12Rad, line.DistanceM);
            }
        }

        faults.Add(
            place.Values["latitude"],
            "a position more than 2000 km from the site",
            "a position within 2000 km of the site (check the signs of latitude and longitude)");
        return null;
    }

    private static (double EastM, double NorthM) Polar(double bearingRad, double rangeM)
    {
        var (sin, cos) = Math.SinCos(bearingRad);
        return (rangeM * sin, rangeM * cos);
    }

    /// <summary>Great-circle arc by the haversine formula.</summary>
    private double ArcRad(double latitudeRad, double longitudeRad)
    {
        var a = Math.Sin((latitudeRad - siteLatitudeRad) / 2);
        var b = Math.Sin((longitudeRad - siteLongitudeRad) / 2);
        return 2 * Math.Asin(Math.Min(1, Math.Sqrt(a * a + Math.Cos(latitudeRad) * Math.Cos(siteLatitudeRad) * b * b)));
    }
}
