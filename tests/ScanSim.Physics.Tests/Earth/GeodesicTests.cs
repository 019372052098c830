using CsCheck;
using ScanSim.Physics.Earth;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Earth;

public sealed class GeodesicTests
{
    [Fact]
    public void Distances_and_azimuths_agree_with_an_independent_geodesic()
    {
        var table = ReferenceTable.Load("earth_geodesics.csv");
        var distances = new Comparison("Geodesic distance", table.Source, 1e-4, 0.0, "m");
        var azimuths = new Comparison("Geodesic azimuth, both ends", table.Source, 1e-9, 0.0, "rad");
        var places = new Comparison("Direct geodesic: end point", table.Source, 1e-10, 0.0, "rad");
        foreach (string[] row in table.Rows)
        {
            double Rad(string column) => Degrees.ToRad(table.Number(row, column));
            string name = $"{table.Text(row, "case")} {table.Text(row, "lat1_deg")} {table.Text(row, "lon1_deg")}";
            GeodesicLine line = Geodesic.Inverse(Rad("lat1_deg"), Rad("lon1_deg"), Rad("lat2_deg"), Rad("lon2_deg"));
            distances.Add(name, table.Number(row, "distance_m"), line.DistanceM);
            azimuths.Add(name + ", first end", 0.0, Degrees.Between(Rad("azimuth12_deg"), line.Azimuth12Rad));
            azimuths.Add(name + ", second end", 0.0, Degrees.Between(Rad("azimuth21_deg"), line.Azimuth21Rad));
            Geographic end = Geodesic.Direct(Rad("lat1_deg"), Rad("lon1_deg"), Rad("azimuth12_deg"), table.Number(row, "distance_m"));
            places.Add(name + ", latitude", Rad("lat2_deg"), end.LatitudeRad);
            places.Add(name + ", longitude", 0.0, Degrees.Between(Rad("lon2_deg"), end.LongitudeRad));
        }

        distances.Conclude();
        azimuths.Conclude();
        places.Conclude();
    }

    [Fact]
    public void The_inverse_undoes_the_direct_geodesic()
    {
        Property.Holds(
            Gen.Select(Gen.Double[-1.55, 1.55], Gen.Double[-Math.PI, Math.PI], Gen.Double[0, 2 * Math.PI], Gen.Double[0, 6.3]),
            20_000,
            v =>
            {
                var (latitude, longitude, azimuth, exponent) = v;
                double distanceM = Math.Pow(10.0, exponent);
                Geographic end = Geodesic.Direct(latitude, longitude, azimuth, distanceM);
                GeodesicLine back = Geodesic.Inverse(latitude, longitude, end.LatitudeRad, end.LongitudeRad);
                return Math.Abs(back.DistanceM - distanceM) < 1e-7 + 1e-13 * distanceM / Math.Cos(latitude)
                    && Math.Abs(Degrees.Between(back.Azimuth12Rad, azimuth)) * distanceM < 1e-6 + 1e-10 * distanceM;
            });
    }

    [Fact]
    public void The_line_is_the_same_from_both_ends()
    {
        Property.Holds(
            Gen.Select(Gen.Double[-1.5, 1.5], Gen.Double[-1.5, 1.5], Gen.Double[-2, 2]),
            5000,
            v =>
            {
                var (lat1, lat2, longitude) = v;
                GeodesicLine there = Geodesic.Inverse(lat1, 0.0, lat2, longitude);
                GeodesicLine back = Geodesic.Inverse(lat2, longitude, lat1, 0.0);
                return Math.Abs(there.DistanceM - back.DistanceM) < 1e-6
                    && Math.Abs(Degrees.Between(there.Azimuth12Rad, back.Azimuth21Rad)) * Math.Cos(lat1) < 1e-8
                    && there.Azimuth12Rad is >= 0.0 and < 2.0 * Math.PI;
            });
    }

    [Fact]
    public void Coincident_points_have_no_distance()
    {
        Assert.Equal(default, Geodesic.Inverse(0.7, 0.2, 0.7, 0.2));
        Assert.Equal(default, Geodesic.Inverse(0.7, Math.PI, 0.7, -Math.PI));
        Assert.Equal(0.7, Geodesic.Direct(0.7, 0.2, 1.0, 0.0).LatitudeRad, 1e-15);
        Assert.Equal(0.2, Geodesic.Direct(0.7, 0.2, 1.0, 0.0).LongitudeRad, 1e-15);
    }

    [Theory]
    [InlineData(0.0, 179.5)]
    [InlineData(0.0, 180.0)]
    [InlineData(0.3, 179.7)]
    public void Nearly_antipodal_points_are_refused_with_the_reason(double lat2Deg, double lon2Deg)
    {
        var refused = Assert.Throws<ArgumentOutOfRangeException>(() => Geodesic.Inverse(0.0, 0.0, Degrees.ToRad(lat2Deg), Degrees.ToRad(lon2Deg)));
        Assert.Contains("nearly antipodal", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_pole_can_be_an_end()
    {
        GeodesicLine quarter = Geodesic.Inverse(0.0, 0.4, 0.5 * Math.PI, 0.0);
        Assert.Equal(10_001_965.7293, quarter.DistanceM, 1e-3);
        Assert.Equal(0.0, Degrees.Between(quarter.Azimuth12Rad, 0.0), 1e-12);
    }

    [Fact]
    public void Unknown_points_have_an_unknown_distance() => Assert.Equal(double.NaN, Geodesic.Inverse(0.1, 0.2, double.NaN, 0.3).DistanceM);
}
