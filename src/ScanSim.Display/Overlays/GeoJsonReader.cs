using System.Collections.Immutable;
using System.Text.Json;
using ScanSim.Scenarios;

namespace ScanSim.Display.Overlays;

/// <summary>Walks through a GeoJSON text (RFC 7946), strictly; the first fault ends the reading.</summary>
internal sealed class GeoJsonReader
{
    /// <summary>The coast of a continent at full detail has about this size.</summary>
    public const int LargestBytes = 256 * 1024 * 1024;

    private const int DeepestNesting = 32;

    private readonly GeoJsonFault fault;
    private readonly GeoJsonPositions positions;
    private readonly SitePlane plane;
    private readonly LineTracer tracer;
    private readonly ImmutableArray<OverlayLine>.Builder lines = ImmutableArray.CreateBuilder<OverlayLine>();
    private readonly ImmutableArray<OverlayPoint>.Builder points = ImmutableArray.CreateBuilder<OverlayPoint>();
    private int farPoints;

    private GeoJsonReader(string fileName, Site site)
    {
        fault = new GeoJsonFault(fileName);
        positions = new GeoJsonPositions(fault);
        plane = new SitePlane(site);
        tracer = new LineTracer(plane);
    }

    public static Overlay Read(ReadOnlyMemory<byte> utf8, string fileName, Site site)
    {
        var reader = new GeoJsonReader(fileName, site);
        try
        {
            var text = utf8.Span.StartsWith("\uFEFF"u8) ? utf8[3..] : utf8;
            using var document = JsonDocument.Parse(text, new JsonDocumentOptions { MaxDepth = DeepestNesting });
            reader.ReadObject(document.RootElement, "$", "");
        }
        catch (JsonException notJson)
        {
            throw new OverlayException(
                $"{fileName}:{notJson.LineNumber + 1}:{notJson.BytePositionInLine + 1}: read what is not JSON, expected GeoJSON (RFC 7946): {notJson.Message}", notJson);
        }

        return new Overlay
        {
            Lines = reader.lines.ToImmutable(),
            Points = reader.points.ToImmutable(),
            LeftOut = reader.farPoints + reader.tracer.LeftOut,
        };
    }

    /// <summary>A Feature, a FeatureCollection or a geometry.</summary>
    private void ReadObject(JsonElement json, string path, string name)
    {
        RefuseOtherReferenceSystem(json, path);
        switch (TypeOf(json, path, "a GeoJSON object"))
        {
            case "FeatureCollection":
                var features = Member(json, path, "features", JsonValueKind.Array, "a list of features");
                var index = 0;
                foreach (var feature in features.EnumerateArray())
                {
                    var place = $"{path}.features[{index++}]";
                    if (TypeOf(feature, place, "a Feature") is not "Feature" and var other)
                    {
                        throw fault.At($"{place}.type", $"\"{other}\"", "\"Feature\": a FeatureCollection holds nothing else");
                    }

                    ReadFeature(feature, place);
                }

                break;
            case "Feature":
                ReadFeature(json, path);
                break;
            default:
                ReadGeometry(json, path, name);
                break;
        }
    }

    private void ReadFeature(JsonElement json, string path)
    {
        if (!json.TryGetProperty("geometry", out var geometry))
        {
            throw fault.At(path, "a Feature without \"geometry\"", "a geometry, or null");
        }

        if (geometry.ValueKind != JsonValueKind.Null)
        {
            ReadGeometry(geometry, path + ".geometry", NameOf(json));
        }
    }

    private void ReadGeometry(JsonElement json, string path, string name)
    {
        var type = TypeOf(json, path, "a geometry");
        if (type == "GeometryCollection")
        {
            var index = 0;
            foreach (var part in Member(json, path, "geometries", JsonValueKind.Array, "a list of geometries").EnumerateArray())
            {
                ReadGeometry(part, $"{path}.geometries[{index++}]", name);
            }

            return;
        }

        if (type is not ("Point" or "MultiPoint" or "LineString" or "MultiLineString" or "Polygon" or "MultiPolygon"))
        {
            throw fault.At(
                path + ".type", $"\"{type}\"", "FeatureCollection, Feature, Point, MultiPoint, LineString, MultiLineString, Polygon, MultiPolygon or GeometryCollection");
        }

        ReadCoordinates(type, Member(json, path, "coordinates", JsonValueKind.Array, "a list of coordinates"), path + ".coordinates", name);
    }

    private void ReadCoordinates(string type, JsonElement coordinates, string path, string name)
    {
        switch (type)
        {
            case "Point":
                AddPoint(positions.One(coordinates, path), name);
                break;
            case "MultiPoint":
                positions.Many(coordinates, path, 0).ForEach(p => AddPoint(p, name));
                break;
            case "LineString":
                AddLine(positions.Many(coordinates, path, 2), closed: false, path, name);
                break;
            case "Polygon":
                ForEach(coordinates, path, (ring, place) => AddLine(positions.Ring(ring, place), closed: true, place, name));
                break;
            default:
                // The Multi types are lists of what the plain ones hold.
                ForEach(coordinates, path, (part, place) => ReadCoordinates(type["Multi".Length..], part, place, name));
                break;
        }
    }

    private void ForEach(JsonElement list, string path, Action<JsonElement, string> read)
    {
        if (list.ValueKind != JsonValueKind.Array)
        {
            throw fault.At(path, GeoJsonFault.Short(list), "a list");
        }

        var index = 0;
        foreach (var item in list.EnumerateArray())
        {
            read(item, $"{path}[{index++}]");
        }
    }

    private void AddPoint((double LongitudeDeg, double LatitudeDeg) position, string name)
    {
        if (plane.Place(position.LongitudeDeg, position.LatitudeDeg) is { } place)
        {
            points.Add(new OverlayPoint(place, name));
        }
        else
        {
            farPoints++;
        }
    }

    private void AddLine(List<(double LongitudeDeg, double LatitudeDeg)> line, bool closed, string path, string name)
    {
        if (!tracer.TryTrace(line, closed, name, lines))
        {
            throw fault.At(path, "more than four million vertices", "an overlay cut to the site's surroundings, or with less detail");
        }
    }

    private string TypeOf(JsonElement json, string path, string expected)
    {
        if (json.ValueKind != JsonValueKind.Object)
        {
            throw fault.At(path, GeoJsonFault.Short(json), $"{expected} in braces, with a \"type\"");
        }

        return Member(json, path, "type", JsonValueKind.String, "a GeoJSON type such as \"FeatureCollection\"").GetString()!;
    }

    private JsonElement Member(JsonElement json, string path, string name, JsonValueKind kind, string expected)
    {
        if (!json.TryGetProperty(name, out var value))
        {
            throw fault.At(path, $"an object without \"{name}\"", $"{expected} in \"{name}\"");
        }

        return value.ValueKind == kind ? value : throw fault.At($"{path}.{name}", GeoJsonFault.Short(value), expected);
    }

    private static string NameOf(JsonElement feature) =>
        feature.TryGetProperty("properties", out var properties) && properties.ValueKind == JsonValueKind.Object
        && properties.TryGetProperty("name", out var name) && name.ValueKind == JsonValueKind.String ? name.GetString()! : "";

    /// <summary>The format before RFC 7946 could name another reference system; such coordinates would be drawn in the wrong place.</summary>
    private void RefuseOtherReferenceSystem(JsonElement json, string path)
    {
        if (json.ValueKind == JsonValueKind.Object && json.TryGetProperty("crs", out var system) && system.ValueKind == JsonValueKind.Object)
        {
            var text = system.GetRawText();
            if (!text.Contains("CRS84", StringComparison.OrdinalIgnoreCase) && !text.Contains("4326", StringComparison.Ordinal))
            {
                throw fault.At(path + ".crs", GeoJsonFault.Short(system), "WGS 84 longitude and latitude (RFC 7946), without \"crs\": convert the file");
            }
        }
    }
}
