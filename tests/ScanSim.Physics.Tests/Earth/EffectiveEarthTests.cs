using CsCheck;
using ScanSim.Physics.Earth;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Earth;

public sealed class EffectiveEarthTests
{
    private static readonly EffectiveEarth FourThirds = new(4.0 / 3.0 * 6_371_000.0);

    [Fact]
    public void Slant_range_and_elevation_agree_with_ray_heights_on_the_four_thirds_sphere()
    {
        var table = ReferenceTable.Load("earth_ray_heights.csv");
        var ranges = new Comparison("Slant range on the 4/3 earth", table.Source, 1.1e-3, 0.0, "m");
        var elevations = new Comparison("Elevation on the 4/3 earth", table.Source, 1.1e-7, 0.0, "rad");
        foreach (string[] row in table.Rows)
        {
            SlantGeometry seen = FourThirds.Geometry(0.0, 1e3 * table.Number(row, "height_km"), 1e3 * table.Number(row, "ground_km"));
            string name = $"{table.Text(row, "elevation_deg")} deg, {table.Text(row, "slant_range_km")} km";
            ranges.Add(name, 1e3 * table.Number(row, "slant_range_km"), seen.SlantRangeM);
            elevations.Add(name, Degrees.ToRad(table.Number(row, "elevation_deg")), seen.ElevationRad);
        }

        ranges.Conclude();
        elevations.Conclude();
    }

    /// <summary>The model's own error, where it is meant to be used: up to 100 km and 10 km height.</summary>
    [Fact]
    public void The_effective_earth_sees_a_target_where_an_exponential_atmosphere_bends_the_ray_to()
    {
        var table = ReferenceTable.Load("earth_ray_heights.csv");
        var comparison = new Comparison("Elevation on the 4/3 earth against rays through an exponential atmosphere", table.Source, 5e-4, 0.0, "rad");
        foreach (string[] row in table.Rows)
        {
            double heightKm = table.Number(row, "height_exponential_km");
            if (heightKm <= 10.0 && table.Number(row, "slant_range_km") <= 100.0)
            {
                comparison.Add(
                    $"{table.Text(row, "elevation_deg")} deg, {table.Text(row, "slant_range_km")} km",
                    Degrees.ToRad(table.Number(row, "elevation_deg")),
                    FourThirds.ElevationRad(0.0, 1e3 * heightKm, 1e3 * table.Number(row, "ground_exponential_km")));
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void Horizons_agree_with_the_arc_and_with_the_published_rules()
    {
        var table = ReferenceTable.Load("earth_horizon.csv");
        var arcs = new Comparison("Radio horizon of two heights, exact arc", table.Source, 6e-4, 0.0, "m");
        var rules = new Comparison("Radio horizon of two heights, rule 4.12 √h", table.Source, 0.0, 1.1e-3);
        var standards = new Comparison("Radio horizon of two heights, Federal Standard 1037C", table.Source, 0.0, 2.5e-3);
        foreach (string[] row in table.Rows)
        {
            double antennaM = table.Number(row, "antenna_m");
            double targetM = table.Number(row, "target_m");
            double arcM = FourThirds.HorizonDistanceM(antennaM) + FourThirds.HorizonDistanceM(targetM);
            string name = $"{antennaM} m and {targetM} m";
            arcs.Add(name, 1e3 * table.Number(row, "arc_km"), arcM);
            rules.Add(name, 1e3 * table.Number(row, "rule_km"), arcM);
            standards.Add(name, 1e3 * table.Number(row, "fs1037c_km"), arcM);
            Assert.True(FourThirds.IsAboveHorizon(antennaM, targetM, arcM));
            Assert.False(FourThirds.IsAboveHorizon(antennaM, targetM, arcM + 1e-6));
        }

        arcs.Conclude();
        rules.Conclude();
        standards.Conclude();
    }

    /// <summary>At the horizon the ray grazes: seen from the antenna the surface point lies at the dip angle, and the ray is a tangent.</summary>
    [Fact]
    public void The_ray_to_the_horizon_is_a_tangent()
    {
        foreach (double heightM in new[] { 1.0, 30.0, 3000.0 })
        {
            double arcM = FourThirds.HorizonDistanceM(heightM);
            SlantGeometry seen = FourThirds.Geometry(heightM, 0.0, arcM);
            Assert.Equal(-arcM / FourThirds.RadiusM, seen.ElevationRad, 1e-12);
        }
    }

    [Theory]
    [InlineData(0.0, 25.0)]
    [InlineData(1e-6, 0.0)]
    [InlineData(0.5, 1e-3)]
    [InlineData(3.0, 40.0)]
    [InlineData(50.0, -20.0)]
    public void At_short_distance_the_earth_is_flat_to_full_precision(double groundM, double riseM)
    {
        SlantGeometry seen = FourThirds.Geometry(0.0, riseM, groundM);
        double flatM = Math.Sqrt(groundM * groundM + riseM * riseM);
        Assert.Equal(1.0, seen.SlantRangeM / flatM, 5e-6);
        Assert.Equal(Math.Atan2(riseM, groundM), seen.ElevationRad, 5e-6);
    }

    [Fact]
    public void The_stable_form_keeps_the_digits_that_the_law_of_cosines_loses()
    {
        // d = 2 (R + h) sin(φ/2) for equal heights; the plain law of cosines has d² with an error of R² 2⁻⁵³, 0.1 m at 0.01 m.
        double radiusM = FourThirds.RadiusM;
        Assert.Equal(0.01 * (radiusM + 20.0) / radiusM, FourThirds.SlantRangeM(20.0, 20.0, 0.01), 1e-16);
    }

    [Fact]
    public void Range_and_elevation_agree_with_the_law_of_cosines_where_that_holds_its_digits()
    {
        Property.Holds(
            Gen.Select(Gen.Double[0, 500], Gen.Double[0, 12_000], Gen.Double[1e4, 4e5]),
            5000,
            v =>
            {
                var (antennaM, targetM, groundM) = v;
                double r1 = FourThirds.RadiusM + antennaM;
                double r2 = FourThirds.RadiusM + targetM;
                double phi = groundM / FourThirds.RadiusM;
                double slantM = Math.Sqrt(r1 * r1 + r2 * r2 - 2.0 * r1 * r2 * Math.Cos(phi));
                double elevationRad = Math.Asin((r2 * Math.Cos(phi) - r1) / slantM);
                SlantGeometry seen = FourThirds.Geometry(antennaM, targetM, groundM);
                return Math.Abs(seen.SlantRangeM - slantM) < 5e-6
                    && Math.Abs(seen.ElevationRad - elevationRad) < 1e-9
                    && Math.Abs(FourThirds.SlantRangeM(antennaM, targetM, groundM) / seen.SlantRangeM - 1.0) < 1e-15
                    && seen.ElevationRad == FourThirds.ElevationRad(antennaM, targetM, groundM);
            });
    }

    [Fact]
    public void Range_rate_is_the_derivative_of_the_range()
    {
        Property.Holds(
            Gen.Select(Gen.Double[0, 500], Gen.Double[0, 12_000], Gen.Double[1e4, 4e5], Gen.Double[-300, 300], Gen.Double[-30, 30]),
            5000,
            v =>
            {
                var (antennaM, targetM, groundM, groundRateMps, climbMps) = v;
                const double StepS = 1e-3;
                double later = FourThirds.SlantRangeM(antennaM, targetM + climbMps * StepS, groundM + groundRateMps * StepS);
                double sooner = FourThirds.SlantRangeM(antennaM, targetM - climbMps * StepS, groundM - groundRateMps * StepS);
                double rate = FourThirds.RangeRateMps(antennaM, targetM, groundM, groundRateMps, climbMps);
                return Math.Abs((later - sooner) / (2.0 * StepS) - rate) < 1e-6;
            });
    }

    [Fact]
    public void Nothing_is_known_about_an_unknown_place_or_an_earth_without_radius()
    {
        Assert.Equal(double.NaN, FourThirds.Geometry(0, double.NaN, 1e3).SlantRangeM);
        Assert.Equal(double.NaN, default(EffectiveEarth).Geometry(10, 10, 1e3).SlantRangeM);
        Assert.Equal(double.NaN, FourThirds.RangeRateMps(10, 10, 0, 5, 5));
        Assert.Equal(0.0, FourThirds.HorizonDistanceM(-3.0));
    }
}
