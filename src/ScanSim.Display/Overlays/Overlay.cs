using System.Collections.Immutable;
using ScanSim.Scenarios;

namespace ScanSim.Display.Overlays;

/// <summary>Lines and places to draw under the plan: a coastline, zones, buoys. In metres east and north of the site.</summary>
/// <remarks>
/// Source of the format: RFC 7946, The GeoJSON Format (2016): WGS-84 longitude and latitude in degrees, in this order. Distance and
/// bearing from the site are those of the geodesic, laid off in the plane as tracks are. What is more than <see cref="FarthestM"/>
/// away is left out: points wholly, of lines the far vertices, so that such a line falls into the parts that are near enough.
/// </remarks>
public sealed record Overlay
{
    /// <summary>The same limit as for tracks.</summary>
    public const double FarthestM = 2_000_000;

    public required ImmutableArray<OverlayLine> Lines { get; init; }

    public required ImmutableArray<OverlayPoint> Points { get; init; }

    /// <summary>Positions of the file that are too far away.</summary>
    public required int LeftOut { get; init; }

    /// <summary>Reads a GeoJSON file.</summary>
    /// <exception cref="OverlayException">It cannot be read, or is not valid.</exception>
    public static Overlay Load(string path, Site site)
    {
        try
        {
            var file = new FileInfo(path);
            if (file.Exists && file.Length > GeoJsonReader.LargestBytes)
            {
                throw new OverlayException($"{path}: the file has {file.Length} bytes, expected at most {GeoJsonReader.LargestBytes}: cut it to the site's surroundings");
            }

            return GeoJsonReader.Read(File.ReadAllBytes(path), path, site);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            throw new OverlayException($"{path}: the overlay cannot be read: {fault.Message}", fault);
        }
    }
}
