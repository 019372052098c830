using ScanSim.Physics.Earth;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Earth;

/// <summary>The geometry that a look uses (geodesic, Gaussian sphere, k = 1) against straight lines in space on the ellipsoid.</summary>
public sealed class TopocentricTests
{
    [Fact]
    public void Geodesic_and_Gaussian_sphere_agree_with_straight_lines_in_space()
    {
        var table = ReferenceTable.Load("earth_topocentric.csv");
        var azimuths = new Comparison("Azimuth by geodesic against the straight line in space", table.Source, 1e-5, 0.0, "rad");
        var ranges = new Comparison("Slant range on the Gaussian sphere against the straight line in space", table.Source, 0.0, 2e-6);
        var elevations = new Comparison("Elevation on the Gaussian sphere against the straight line in space", table.Source, 4e-5, 0.0, "rad");
        foreach (string[] row in table.Rows)
        {
            double eastM = table.Number(row, "east_m");
            double northM = table.Number(row, "north_m");
            double upM = table.Number(row, "up_m");
            double latitude = Degrees.ToRad(table.Number(row, "ref_lat_deg"));
            GeodesicLine line = Geodesic.Inverse(
                latitude, Degrees.ToRad(table.Number(row, "ref_lon_deg")), Degrees.ToRad(table.Number(row, "lat_deg")), Degrees.ToRad(table.Number(row, "lon_deg")));
            SlantGeometry seen = new EffectiveEarth(EarthRadius.GaussianMeanM(latitude))
                .Geometry(table.Number(row, "ref_h_m"), table.Number(row, "h_m"), line.DistanceM);
            double flatM = Math.Sqrt(eastM * eastM + northM * northM);
            string name = $"{table.Text(row, "lat_deg")} {table.Text(row, "lon_deg")}";
            ranges.Add(name, Math.Sqrt(flatM * flatM + upM * upM), seen.SlantRangeM);
            elevations.Add(name, Math.Atan2(upM, flatM), seen.ElevationRad);
            if (flatM > 0.0)
            {
                azimuths.Add(name, 0.0, Degrees.Between(Math.Atan2(eastM, northM), line.Azimuth12Rad));
            }
        }

        azimuths.Conclude();
        ranges.Conclude();
        elevations.Conclude();
    }
}
