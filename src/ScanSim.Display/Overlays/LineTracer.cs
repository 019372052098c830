using System.Collections.Immutable;

namespace ScanSim.Display.Overlays;

/// <summary>Brings a line of longitudes and latitudes into the site's plane.</summary>
/// <remarks>
/// RFC 7946 section 3.1.1: between two positions a line runs straight in longitude and latitude. In the plane that is a curve, so long
/// segments are divided: at 0.1° the chord is within (0.1°·cos φ)²·R·tan φ/8 of it, 5 m at 60° of latitude.
/// </remarks>
internal sealed class LineTracer(SitePlane plane)
{
    private const double LongestPieceDeg = 0.1;

    /// <summary>A million vertices are half a second's work and more than can be told apart on a screen.</summary>
    private const int MostVertices = 4_000_000;

    private readonly List<OverlayVertex> part = [];
    private int traced;

    public int LeftOut { get; private set; }

    /// <summary>False when the overlay becomes too large.</summary>
    public bool TryTrace(IReadOnlyList<(double LongitudeDeg, double LatitudeDeg)> positions, bool closed, string name, ImmutableArray<OverlayLine>.Builder lines)
    {
        var firstLine = lines.Count;
        var whole = true;
        Add(positions[0], name, lines, ref whole);
        for (var i = 1; i < positions.Count; i++)
        {
            var (from, to) = (positions[i - 1], positions[i]);
            var (lonDeg, latDeg) = (to.LongitudeDeg - from.LongitudeDeg, to.LatitudeDeg - from.LatitudeDeg);
            var pieces = Math.Max(1, (int)Math.Ceiling(Math.Max(Math.Abs(lonDeg), Math.Abs(latDeg)) / LongestPieceDeg));
            traced += pieces;
            if (traced > MostVertices)
            {
                return false;
            }

            for (var piece = 1; piece < pieces; piece++)
            {
                var share = (double)piece / pieces;
                Between((from.LongitudeDeg + share * lonDeg, from.LatitudeDeg + share * latDeg), name, lines, ref whole);
            }

            Add(to, name, lines, ref whole);
        }

        End(name, lines);
        if (closed && whole && lines.Count == firstLine + 1)
        {
            // The ring's last vertex repeats its first one.
            var ring = lines[firstLine];
            lines[firstLine] = ring with { Closed = true, Vertices = ring.Vertices[..^1] };
        }

        return true;
    }

    private void Add((double LongitudeDeg, double LatitudeDeg) position, string name, ImmutableArray<OverlayLine>.Builder lines, ref bool whole)
    {
        var kept = Between(position, name, lines, ref whole);
        LeftOut += kept ? 0 : 1;
    }

    private bool Between((double LongitudeDeg, double LatitudeDeg) position, string name, ImmutableArray<OverlayLine>.Builder lines, ref bool whole)
    {
        if (plane.Place(position.LongitudeDeg, position.LatitudeDeg) is { } vertex)
        {
            part.Add(vertex);
            return true;
        }

        whole = false;
        End(name, lines);
        return false;
    }

    private void End(string name, ImmutableArray<OverlayLine>.Builder lines)
    {
        if (part.Count > 1)
        {
            lines.Add(new OverlayLine { Vertices = [.. part], Closed = false, Name = name });
        }

        part.Clear();
    }
}
