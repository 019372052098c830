using System.Collections.Immutable;
using ScanSim.Physics;
using ScanSim.Physics.Antennas;
using ScanSim.Physics.Detection;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>Turns the looks of a scan into the rows that the looks table keeps, in order of dwell, range cell and target.</summary>
internal sealed class LookRows(RunSetup setup)
{
    private const int NoLook = -1;

    private readonly int[] best = new int[setup.Targets.Length];
    private readonly double[] pulseSnr = new double[setup.Timeline.Grid.Pulses.Max()];
    private readonly ImmutableArray<double> centredBeamRatio = 
    [
        .. setup.Timeline.Grid.Pulses.Zip(setup.Timeline.Grid.PriPs, (pulses, priPs) => CentredDwell.MeanTwoWayRatio(
            setup.Model.Patterns.Azimuth, setup.Timeline.BeamSpeedRadPerS * priPs / DwellGrid.PicosecondsPerSecond, pulses)),
    ];
    private readonly double radarDb = Decibels.FromRatio(setup.Model.RadarRatioM2);

    public void Add(FoundLook[] looks, ReadOnlySpan<int> order, Dwell[] dwells, List<LookRow> rows)
    {
        if (setup.Options.Looks == LooksKept.None)
        {
            return;
        }

        var all = setup.Options.Looks == LooksKept.All;
        if (!all)
        {
            FindBest(looks, order);
        }

        foreach (var index in order)
        {
            if (all || best[looks[index].TargetIndex] == index)
            {
                rows.Add(RowOf(looks[index], dwells[looks[index].DwellInScan]));
            }
        }
    }

    private void FindBest(FoundLook[] looks, ReadOnlySpan<int> order)
    {
        Array.Fill(best, NoLook);
        foreach (var index in order)
        {
            ref var leader = ref best[looks[index].TargetIndex];
            if (leader == NoLook || IsBetter(looks[index], looks[leader]))
            {
                leader = index;
            }
        }
    }

    /// <summary>Detected first, then by SNR; on the side-lobe floor, where all dwells are alike, the one that points nearest.</summary>
    private static bool IsBetter(in FoundLook a, in FoundLook b)
    {
        if (a.Detected != b.Detected)
        {
            return a.Detected;
        }

        return a.Look.SnrRatio != b.Look.SnrRatio
            ? a.Look.SnrRatio > b.Look.SnrRatio
            : Math.Abs(a.Look.OffsetRad) < Math.Abs(b.Look.OffsetRad);
    }

    private LookRow RowOf(in FoundLook found, in Dwell dwell)
    {
        var target = setup.Targets[found.TargetIndex];
        var detector = setup.Detectors[dwell.PrfIndex];
        var state = target.Track.At(dwell.MiddleS);
        ref readonly var look = ref found.Look;
        var azimuthDb = Decibels.FromRatio(look.AzimuthBeamRatio);
        var elevationDb = Decibels.FromRatio(look.ElevationBeamRatio);
        var eclipsingDb = Decibels.FromRatio(look.EclipsingRatio);
        var spreadingDb = -4 * Decibels.FromRatio(look.RangeM);
        var pd = ProbabilityOf(target, detector, found, dwell, state);
        var perPulse = target.Fluctuation is FluctuationCase.Case2 or FluctuationCase.Case4;
        return new LookRow
        {
            TimeS = dwell.MiddleS,
            Scan = dwell.Scan,
            Dwell = dwell.Index,
            Target = target.Id,
            RangeM = look.RangeM,
            AzimuthDeg = look.AzimuthRad * Angles.DegPerRad,
            ElevationDeg = look.ElevationRad * Angles.DegPerRad,
            RadialSpeedMps = setup.Model.RangeRateMps(setup.Model.SightOf(state), state),
            BeamAzimuthDeg = dwell.BeamAzimuthRad * Angles.DegPerRad,
            Pulses = dwell.Pulses,
            RadarDb = radarDb,
            RcsDb = target.RcsDb,
            SpreadingDb = spreadingDb,
            AzimuthBeamDb = azimuthDb,
            ElevationBeamDb = elevationDb,
            EclipsingDb = eclipsingDb,
            SnrDb = radarDb + target.RcsDb + spreadingDb + azimuthDb + elevationDb + eclipsingDb,
            Pd = pd,
            FluctuationDb = perPulse ? null : Decibels.FromRatio(found.FluctuationRatio),
            StatisticDb = Decibels.FromRatio(found.Statistic / detector.Threshold),
            Detected = found.Detected,
            LostTo = ReasonOf(found, pd, detector.EvenOddsSnrRatio(target.Fluctuation), centredBeamRatio[dwell.PrfIndex]),
            TargetsInCell = found.TargetsInCell,
        };
    }

    /// <summary>Computed only for looks that are kept; the pulses of unequal SNR are then worked out once more.</summary>
    private double ProbabilityOf(RunTarget target, Detector detector, in FoundLook found, in Dwell dwell, in TrackState state)
    {
        var pulses = pulseSnr.AsSpan(0, dwell.Pulses);
        if (target.Fluctuation is FluctuationCase.Case2 or FluctuationCase.Case4)
        {
            setup.Model.TryLook(target.RcsM2, state, dwell, pulses, out _);
        }

        return detector.Probability(target.Fluctuation, found.Look.SnrRatio, pulses);
    }

    private static LossReason ReasonOf(in FoundLook found, double pd, double needed, double centredRatio)
    {
        if (found.Detected)
        {
            return LossReason.None;
        }

        ref readonly var look = ref found.Look;
        if (pd >= 0.5)
        {
            return found.TargetsInCell > 1 ? LossReason.SharedCell : LossReason.Fluctuation;
        }

        // What the same dwell would give with the beam's centre on the target, in azimuth and elevation, and all of the echo heard.
        var offAzimuthRatio = Math.Min(1, look.AzimuthBeamRatio / centredRatio);
        if (look.SnrRatio / (offAzimuthRatio * look.ElevationBeamRatio * look.EclipsingRatio) < needed)
        {
            return LossReason.Range;
        }

        if (look.EclipsingRatio <= offAzimuthRatio && look.EclipsingRatio <= look.ElevationBeamRatio)
        {
            return LossReason.Eclipsing;
        }

        return look.ElevationBeamRatio < offAzimuthRatio ? LossReason.ElevationBeam : LossReason.AzimuthBeam;
    }
}
