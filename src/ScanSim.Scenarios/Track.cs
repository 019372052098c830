using System.Collections.Immutable;

namespace ScanSim.Scenarios;

/// <summary>
/// Where a target is at any time: pieces of motion that follow one another without gaps, in the site's local plane.
/// </summary>
/// <remarks>
/// The local plane is the azimuthal-equidistant map of the ellipsoid about the site: a point at geodesic distance s and
/// azimuth α (clockwise from true north) has east = s·sin α, north = s·cos α. Distances and bearings from the site are true;
/// a straight leg in this plane differs from the geodesic between its ends by metres at 100 km (see docs/physics).
/// </remarks>
public sealed record Track
{
    /// <summary>At least one piece; each starts where and when the one before it ended.</summary>
    public required ImmutableArray<TrackPiece> Pieces { get; init; }

    public double StartS => Pieces[0].StartS;

    public double EndS => Pieces[^1].EndS;

    /// <summary>Greatest speed on the track, horizontal and vertical together.</summary>
    public required double MaximumSpeedMps { get; init; }

    /// <summary>State at <paramref name="timeS"/>, which must lie in [StartS, EndS].</summary>
    public TrackState At(double timeS)
    {
        var low = 0;
        var high = Pieces.Length - 1;
        while (low < high)
        {
            var middle = (low + high + 1) >> 1;
            if (Pieces.ItemRef(middle).StartS <= timeS)
            {
                low = middle;
            }
            else
            {
                high = middle - 1;
            }
        }

        return Pieces.ItemRef(low).At(timeS);
    }
}
