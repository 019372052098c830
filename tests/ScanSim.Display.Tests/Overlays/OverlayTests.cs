using ScanSim.Display.Overlays;
using ScanSim.Physics.Earth;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Display.Tests.Overlays;

public sealed class OverlayTests : IDisposable
{
    private const double RadPerDeg = Math.PI / 180;

    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Points_lie_at_the_published_bearing_and_distance_from_the_site()
    {
        var table = ReferenceTable.Load("earth_geodesics.csv");
        var distances = new Comparison("Overlay points: distance from the site", table.Source, 0.2, 6e-8, "m");
        var bearings = new Comparison("Overlay points: bearing from the site", table.Source, 1e-5, 0, "deg");
        var farther = 0;
        foreach (var row in table.Rows)
        {
            var site = Site(table.Number(row, "lat1_deg"), table.Number(row, "lon1_deg"));
            var overlay = Load($$"""{ "type": "Point", "coordinates": [{{table.Text(row, "lon2_deg")}}, {{table.Text(row, "lat2_deg")}}] }""", site);
            if (table.Number(row, "distance_m") > Overlay.FarthestM)
            {
                Assert.Empty(overlay.Points);
                Assert.Equal(1, overlay.LeftOut);
                farther++;
                continue;
            }

            var (eastM, northM) = Assert.Single(overlay.Points).Place;
            distances.Add(table.Text(row, "case"), table.Number(row, "distance_m"), Math.Sqrt((double)eastM * eastM + (double)northM * northM));
            bearings.Add(table.Text(row, "case"), table.Number(row, "azimuth12_deg"), Math.Atan2(eastM, northM) / RadPerDeg);
        }

        Assert.True(farther > 0 && distances.Count > 5);
        distances.Conclude();
        bearings.Conclude();
    }

    [Fact]
    public void Every_kind_of_geometry_gives_its_lines_and_points_with_names()
    {
        var overlay = Load("""
            { "type": "FeatureCollection", "features": [
              { "type": "Feature", "properties": { "name": "buoy" }, "geometry": { "type": "Point", "coordinates": [0.1, 0.1, 12.5] } },
              { "type": "Feature", "properties": null, "geometry": { "type": "MultiPoint", "coordinates": [[0.1, 0], [0.2, 0]] } },
              { "type": "Feature", "properties": { "name": 7 }, "geometry": { "type": "LineString", "coordinates": [[0, 0.01], [0.05, 0.01]] } },
              { "type": "Feature", "properties": { "name": "zones" }, "geometry": { "type": "MultiLineString", "coordinates": [[[0, 0], [0.01, 0]], [[0, 0.02], [0.01, 0.02], [0.02, 0.02]]] } },
              { "type": "Feature", "properties": { "name": "lake" }, "geometry": { "type": "Polygon", "coordinates": [
                [[0, 0], [0.05, 0], [0.05, 0.05], [0, 0]], [[0.02, 0.01], [0.03, 0.01], [0.03, 0.02], [0.02, 0.01]]] } },
              { "type": "Feature", "properties": {}, "geometry": { "type": "MultiPolygon", "coordinates": [[[[0, 0], [0.05, 0], [0.05, 0.05], [0.01, 0.05], [0, 0]]]] } },
              { "type": "Feature", "properties": { "name": "both" }, "geometry": { "type": "GeometryCollection", "geometries": [
                { "type": "Point", "coordinates": [0, 0] }, { "type": "LineString", "coordinates": [[0, 0], [0, 0.01]] }] } },
              { "type": "Feature", "properties": { "name": "nowhere" }, "geometry": null }] }
            """);
        Assert.Equal(["buoy", "", "", "both"], overlay.Points.Select(p => p.Name));
        Assert.Equal([("", 2, false), ("zones", 2, false), ("zones", 3, false), ("lake", 3, true), ("lake", 3, true), ("", 4, true), ("both", 2, false)], overlay.Lines.Select(l => (l.Name, l.Vertices.Length, l.Closed)));
        Assert.Equal(0, overlay.LeftOut);
        Assert.Equal(default, overlay.Points[^1].Place);
    }

    [Fact]
    public void A_bare_geometry_and_a_bare_feature_are_overlays_too()
    {
        Assert.Single(Load("""{ "type": "LineString", "coordinates": [[0, 0], [0.1, 0.1]] }""").Lines);
        Assert.Equal("x", Assert.Single(Load("\uFEFF{ \"type\": \"Feature\", \"properties\": { \"name\": \"x\" }, \"geometry\": { \"type\": \"Point\", \"coordinates\": [1, 1] } }").Points).Name);
        Assert.Single(Load("""{ "type": "Point", "crs": { "type": "name", "properties": { "name": "urn:ogc:def:crs:OGC:1.3:CRS84" } }, "coordinates": [1, 1] }""").Points);
    }

    [Fact]
    public void A_long_segment_follows_its_parallel_within_ten_metres()
    {
        var site = Site(60, 5);
        var line = Assert.Single(Load("""{ "type": "LineString", "coordinates": [[4, 60.5], [8, 60.5]] }""", site).Lines);
        Assert.Equal(41, line.Vertices.Length);
        for (var i = 1; i < line.Vertices.Length; i++)
        {
            // Half-way between two vertices the chord must be close to the place with the middle longitude.
            var (a, b) = (line.Vertices[i - 1], line.Vertices[i]);
            var lonRad = (4 + 0.1 * (i - 0.5)) * RadPerDeg;
            var truly = Geodesic.Inverse(site.LatitudeRad, site.LongitudeRad, 60.5 * RadPerDeg, lonRad);
            var offM = Math.Sqrt(Math.Pow((a.EastM + b.EastM) / 2 - truly.DistanceM * Math.Sin(truly.Azimuth12Rad), 2) + Math.Pow((a.NorthM + b.NorthM) / 2 - truly.DistanceM * Math.Cos(truly.Azimuth12Rad), 2));
            Assert.True(offM < 10, $"{offM} m at vertex {i}");
        }
    }

    [Fact]
    public void What_is_farther_than_2000_km_is_left_out_and_a_line_falls_into_its_near_parts()
    {
        // 2000 km are 17.97° along the equator.
        var overlay = Load("""
            { "type": "FeatureCollection", "features": [
            { "type": "Feature", "properties": { "name": "out and back" }, "geometry": { "type": "LineString", "coordinates": [[17, 0], [19, 0], [19, 1], [17, 1]] } },
            { "type": "Feature", "properties": { "name": "ring" }, "geometry": { "type": "Polygon", "coordinates": [[[0, 0], [170, 0], [170, 60], [0, 0]]] } },
            { "type": "Feature", "properties": {}, "geometry": { "type": "Point", "coordinates": [-179, 5] } }] }
            """);
        Assert.Equal(2 + 2 + 1, overlay.LeftOut);
        Assert.Empty(overlay.Points);
        Assert.Equal(["out and back", "out and back", "ring", "ring"], overlay.Lines.Select(l => l.Name));
        Assert.All(overlay.Lines, l => Assert.False(l.Closed));
        Assert.All(overlay.Lines.SelectMany(l => l.Vertices), v => Assert.True(Math.Sqrt((double)v.EastM * v.EastM + (double)v.NorthM * v.NorthM) <= Overlay.FarthestM + 1));
        Assert.Equal(1_992_500, overlay.Lines[0].Vertices[^1].EastM, 11_132.0 / 2 + 5_000);
    }

    [Fact]
    public void A_line_across_the_date_line_is_near_a_site_there()
    {
        var overlay = Load("""{ "type": "MultiPoint", "coordinates": [[179.9, 10], [-179.9, 10]] }""", Site(10, 180));
        Assert.Equal(-overlay.Points[0].Place.EastM, overlay.Points[1].Place.EastM, 0.01f);
        Assert.Equal(10_964, overlay.Points[1].Place.EastM, 2f);
    }

    [Theory]
    [InlineData("{ \"type\": \"Point\", \"coordinates\": [1, 2", ":1:", "not JSON")]
    [InlineData("", "not JSON", "GeoJSON")]
    [InlineData("[1, 2]", "$: read [1, 2]", "\"type\"")]
    [InlineData("{ \"coordinates\": [1, 2] }", "$: read an object without \"type\"", "FeatureCollection")]
    [InlineData("{ \"type\": \"Topology\" }", "$.type: read \"Topology\"", "FeatureCollection")]
    [InlineData("{ \"type\": 5 }", "$.type: read 5", "FeatureCollection")]
    [InlineData("{ \"type\": \"FeatureCollection\" }", "without \"features\"", "list of features")]
    [InlineData("{ \"type\": \"FeatureCollection\", \"features\": {} }", "$.features: read {}", "list of features")]
    [InlineData("{ \"type\": \"FeatureCollection\", \"features\": [{ \"type\": \"Point\", \"coordinates\": [1, 2] }] }", "$.features[0].type: read \"Point\"", "\"Feature\"")]
    [InlineData("{ \"type\": \"Feature\" }", "$: read a Feature without \"geometry\"", "or null")]
    [InlineData("{ \"type\": \"Point\" }", "$: read an object without \"coordinates\"", "coordinates")]
    [InlineData("{ \"type\": \"Point\", \"coordinates\": [] }", "$.coordinates: read []", "[longitude, latitude]")]
    [InlineData("{ \"type\": \"Point\", \"coordinates\": [\"1\", 2] }", "$.coordinates[0]: read \"1\"", "longitude in degrees")]
    [InlineData("{ \"type\": \"Point\", \"coordinates\": [1, 1e999] }", "$.coordinates[1]: read 1e999", "latitude in degrees")]
    [InlineData("{ \"type\": \"Point\", \"coordinates\": [500000, 5300000] }", "looks like metres", "RFC 7946 wants")]
    [InlineData("{ \"type\": \"Point\", \"coordinates\": [12, 95] }", "$.coordinates[1]", "are the two exchanged?")]
    [InlineData("{ \"type\": \"Point\", \"coordinates\": [200, 5] }", "$.coordinates: read [200, 5]", "longitude from -180 to 180")]
    [InlineData("{ \"type\": \"LineString\", \"coordinates\": [[1, 2]] }", "$.coordinates: read 1 positions", "at least 2")]
    [InlineData("{ \"type\": \"LineString\", \"coordinates\": [1, 2] }", "$.coordinates[0]: read 1", "a position")]
    [InlineData("{ \"type\": \"MultiLineString\", \"coordinates\": [[[1, 2], [3]]] }", "$.coordinates[0][1]: read [3]", "a position")]
    [InlineData("{ \"type\": \"Polygon\", \"coordinates\": [[[0, 0], [1, 0], [1, 1]]] }", "$.coordinates[0]: read 3 positions", "at least 4")]
    [InlineData("{ \"type\": \"Polygon\", \"coordinates\": [[[0, 0], [1, 0], [1, 1], [0, 1]]] }", "begins at [0, 0] and ends at [0, 1]", "closed ring")]
    [InlineData("{ \"type\": \"MultiPolygon\", \"coordinates\": [7] }", "$.coordinates[0]: read 7", "a list")]
    [InlineData("{ \"type\": \"GeometryCollection\", \"geometries\": [{ \"type\": \"Feature\" }] }", "$.geometries[0].type: read \"Feature\"", "Point")]
    [InlineData("{ \"type\": \"FeatureCollection\", \"crs\": { \"properties\": { \"name\": \"EPSG:25832\" } }, \"features\": [] }", "$.crs", "WGS 84")]
    [InlineData("{ \"type\": \"MultiLineString\", \"coordinates\": [[[-180, -90], [180, -90], [x]]] }", ":1:", "not JSON")]
    public void A_fault_says_where_what_was_read_and_what_would_be_right(string text, string where, string right)
    {
        var fault = Assert.Throws<OverlayException>(() => Load(text));
        Assert.Contains("coast.geojson", fault.Message, StringComparison.Ordinal);
        Assert.Contains(where, fault.Message, StringComparison.Ordinal);
        Assert.Contains(right, fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_is_not_there_or_is_nested_without_end_is_an_error()
    {
        Assert.Contains("none.geojson", Assert.Throws<OverlayException>(() => Overlay.Load(folder.In("none.geojson"), Site(0, 0))).Message, StringComparison.Ordinal);
        Assert.Throws<OverlayException>(() => Overlay.Load(folder.In("."), Site(0, 0)));
        Assert.Throws<OverlayException>(() => Load(string.Concat(Enumerable.Repeat("{\"type\":\"GeometryCollection\",\"geometries\":[", 200))));
    }

    [Fact]
    public void An_overlay_that_would_become_too_large_is_an_error()
    {
        // Each round takes 2 · 3,600 pieces.
        var rounds = string.Join(", ", Enumerable.Repeat("[-180, 0], [180, 0]", 600));
        Assert.Contains("four million", Assert.Throws<OverlayException>(() => Load($$"""{ "type": "LineString", "coordinates": [{{rounds}}] }""")).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_shipped_coast_fits_the_shipped_harbour()
    {
        var scenarios = Path.Combine(RepositoryRoot.Find(), "scenarios");
        var scenario = ScenarioFile.Load(Path.Combine(scenarios, "harbour.json"));
        var overlay = Overlay.Load(Path.Combine(scenarios, "harbour-coast.geojson"), scenario.Site);
        Assert.Equal(0, overlay.LeftOut);
        var land = Assert.Single(overlay.Lines, l => l.Name == "Quillhaven");
        Assert.True(land.Closed);
        Assert.True(Holds(land, 0, 0), "the lookout stands on land");
        foreach (var azimuthRad in scenario.Radar.Blanked.SelectMany(s => new[] { s.FromRad, s.FromRad + s.WidthRad / 2, s.ToRad }))
        {
            Assert.True(Holds(land, 3000 * Math.Sin(azimuthRad), 3000 * Math.Cos(azimuthRad)), $"the town at {azimuthRad} rad is on land");
        }

        foreach (var target in scenario.Targets.Where(t => t.Track.Pieces[0].HeightM < 20 && t.Id != "drone"))
        {
            for (double timeS = 0; timeS <= scenario.Run.DurationS; timeS += 5)
            {
                var state = target.Track.At(timeS);
                Assert.False(Holds(land, state.EastM, state.NorthM), $"{target.Id} runs aground at {timeS} s");
            }
        }

        var boat = scenario.Targets.Single(t => t.Id == "open-boat").Track;
        var breakwater = overlay.Lines.Single(l => l.Name == "North breakwater");
        Assert.All(Enumerable.Range(0, 120).Select(s => boat.At(s)), s => Assert.InRange(Distance(breakwater, s.EastM, s.NorthM), 30, 300));
    }

    private Overlay Load(string text, Site? site = null)
    {
        File.WriteAllText(folder.In("coast.geojson"), text);
        return Overlay.Load(folder.In("coast.geojson"), site ?? Site(0, 0));
    }

    private static Site Site(double latitudeDeg, double longitudeDeg) =>
        new() { Name = "here", LatitudeRad = latitudeDeg * RadPerDeg, LongitudeRad = longitudeDeg * RadPerDeg, GroundHeightM = 0, AntennaHeightM = 10 };

    /// <summary>By counting crossings to the north.</summary>
    private static bool Holds(OverlayLine ring, double eastM, double northM)
    {
        var inside = false;
        for (var (i, j) = (0, ring.Vertices.Length - 1); i < ring.Vertices.Length; j = i++)
        {
            var (a, b) = (ring.Vertices[i], ring.Vertices[j]);
            if (a.EastM > eastM != b.EastM > eastM && northM < a.NorthM + (b.NorthM - a.NorthM) * (eastM - a.EastM) / (b.EastM - a.EastM))
            {
                inside = !inside;
            }
        }

        return inside;
    }

    private static double Distance(OverlayLine line, double eastM, double northM) => line.Vertices.Zip(line.Vertices.Skip(1), (a, b) =>
    {
        double dx = b.EastM - a.EastM, dy = b.NorthM - a.NorthM;
        var along = Math.Clamp(((eastM - a.EastM) * dx + (northM - a.NorthM) * dy) / (dx * dx + dy * dy), 0, 1);
        return Math.Sqrt(Math.Pow(eastM - a.EastM - along * dx, 2) + Math.Pow(northM - a.NorthM - along * dy, 2));
    }).Min();
}
