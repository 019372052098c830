using ScanSim.Physics.Earth;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>Where a target was when the beam passed it, once a scan.</summary>
internal static class TruthRows
{
    /// <summary>The beam is far faster than any target's azimuth: two or three steps do. At the cap the last one counts.</summary>
    private const int MostSteps = 12;
    private const double CloseEnoughS = 1e-9;

    /// <summary>Adds the row of one target in one scan; none when the target does not exist as the beam passes.</summary>
    public static void Add(RunSetup setup, RunTarget target, int scan, List<TruthRow> rows)
    {
        var timeline = setup.Timeline;
        var life = target.Life.Within(new TimeSpanS(timeline.ScanStartS(scan), timeline.ScanEndS(scan)));
        if (life.ToS < life.FromS)
        {
            return;
        }

        var timeS = life.MiddleS;
        var inSector = true;
        for (var step = 0; step < MostSteps; step++)
        {
            var azimuthRad = setup.Model.SightOf(target.Track.At(timeS)).AzimuthRad;
            if (timeline.TimeOfAzimuthS(scan, azimuthRad) is not { } passedS)
            {
                inSector = false;
                timeS = life.MiddleS;
                break;
            }

            if (passedS < life.FromS || passedS > life.ToS)
            {
                return;
            }

            var shiftS = Math.Abs(passedS - timeS);
            timeS = passedS;
            if (shiftS < CloseEnoughS)
            {
                break;
            }
        }

        rows.Add(RowOf(setup, target, scan, timeS, inSector));
    }

    private static TruthRow RowOf(RunSetup setup, RunTarget target, int scan, double timeS, bool inSector)
    {
        var state = target.Track.At(timeS);
        var sight = setup.Model.SightOf(state);
        var site = setup.Scenario.Site;
        var place = Geodesic.Direct(site.LatitudeRad, site.LongitudeRad, sight.AzimuthRad, sight.GroundM);
        return new TruthRow
        {
            TimeS = timeS,
            Scan = scan,
            Target = target.Id,
            LatitudeDeg = place.LatitudeRad * Angles.DegPerRad,
            LongitudeDeg = place.LongitudeRad * Angles.DegPerRad,
            HeightM = state.HeightM,
            EastM = state.EastM,
            NorthM = state.NorthM,
            EastMps = state.EastMps,
            NorthMps = state.NorthMps,
            UpMps = state.UpMps,
            RangeM = sight.RangeM,
            AzimuthDeg = sight.AzimuthRad * Angles.DegPerRad,
            ElevationDeg = sight.ElevationRad * Angles.DegPerRad,
            View = ViewOf(setup, sight, inSector),
        };
    }

    private static TargetView ViewOf(RunSetup setup, in Sight sight, bool inSector)
    {
        if (!inSector)
        {
            return TargetView.OutsideSector;
        }

        return setup.Timeline.IsBlanked(sight.AzimuthRad) ? TargetView.Blanked : setup.Model.ViewOf(sight, setup.ShortestPriS);
    }
}
