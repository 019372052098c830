using System.Text.Json;

namespace ScanSim.Display.Overlays;

/// <summary>Reads positions: longitude and latitude in degrees, a height after them is passed over.</summary>
internal sealed class GeoJsonPositions(GeoJsonFault fault)
{
    /// <summary>No mistake in degrees is as large; projected coordinates in metres nearly always are.</summary>
    private const double LooksLikeMetres = 1000;

    private const int LeastOfRing = 4;

    public (double LongitudeDeg, double LatitudeDeg) One(JsonElement json, string path)
    {
        if (json.ValueKind != JsonValueKind.Array || json.GetArrayLength() < 2)
        {
            throw fault.At(path, GeoJsonFault.Short(json), "a position: [longitude, latitude] in degrees");
        }

        var position = (Number(json[0], path + "[0]", "longitude"), Number(json[1], path + "[1]", "latitude"));
        Check(position, json, path);
        return position;
    }

    public List<(double LongitudeDeg, double LatitudeDeg)> Many(JsonElement json, string path, int least)
    {
        if (json.ValueKind != JsonValueKind.Array)
        {
            throw fault.At(path, GeoJsonFault.Short(json), "a list of positions");
        }

        if (json.GetArrayLength() < least)
        {
            throw fault.At(path, $"{json.GetArrayLength()} positions", $"at least {least}");
        }

        var index = 0;
        var positions = new List<(double LongitudeDeg, double LatitudeDeg)>(json.GetArrayLength());
        foreach (var item in json.EnumerateArray())
        {
            positions.Add(One(item, $"{path}[{index++}]"));
        }

        return positions;
    }

    public List<(double LongitudeDeg, double LatitudeDeg)> Ring(JsonElement json, string path)
    {
        var ring = Many(json, path, LeastOfRing);
        return ring[0].Equals(ring[^1])
            ? ring
            : throw fault.At(path, $"a ring that begins at {Text(ring[0])} and ends at {Text(ring[^1])}", "a closed ring: the last position repeats the first");
    }

    private static string Text((double LongitudeDeg, double LatitudeDeg) position) => $"[{position.LongitudeDeg}, {position.LatitudeDeg}]";

    private double Number(JsonElement json, string path, string what) =>
        json.ValueKind == JsonValueKind.Number && json.TryGetDouble(out var number) && double.IsFinite(number)
            ? number
            : throw fault.At(path, GeoJsonFault.Short(json), $"the {what} in degrees, as a number");

    private void Check((double LongitudeDeg, double LatitudeDeg) position, JsonElement json, string path)
    {
        var (lonDeg, latDeg) = (Math.Abs(position.LongitudeDeg), Math.Abs(position.LatitudeDeg));
        if (lonDeg <= 180 && latDeg <= 90)
        {
            return;
        }

        var read = GeoJsonFault.Short(json);
        throw lonDeg > LooksLikeMetres || latDeg > LooksLikeMetres
            ? fault.At(path, $"{read}, which looks like metres of a map projection", "degrees: RFC 7946 wants WGS 84 longitude and latitude; convert the file")
            : latDeg > 90 && latDeg <= 180 && lonDeg <= 90
                ? fault.At(path + "[1]", $"{read}, a latitude beyond 90°", "[longitude, latitude] in this order, latitude from -90 to 90: are the two exchanged?")
                : fault.At(path, read, "longitude from -180 to 180 and latitude from -90 to 90, in degrees");
    }
}
