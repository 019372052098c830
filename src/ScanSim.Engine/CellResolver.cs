using ScanSim.Physics.Accuracy;
using ScanSim.Physics.Detection;
using ScanSim.Physics.Draws;
using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>Draws the detection statistic of range cells: one target alone, or several whose echoes add with drawn phases.</summary>
internal sealed class CellResolver(RunSetup setup)
{
    private readonly double[] pulseSnr = new double[setup.Timeline.Grid.Pulses.Max()];
    private readonly double[] inPhase = new double[setup.Timeline.Grid.Pulses.Max()];
    private readonly double[] quadrature = new double[setup.Timeline.Grid.Pulses.Max()];
    private readonly Dictionary<string, string> labels = new(StringComparer.Ordinal);

    /// <summary>The looks of a pass come one after the other: its draw is kept.</summary>
    private long lastPass = -1;
    private uint lastEntity;
    private double lastFluctuation;

    private readonly double compressedWidthS = setup.Scenario.Radar.Waveform.CompressedWidthS;

    /// <summary>Fills in fluctuation, statistic and decision of a look as if it had its cell to itself.</summary>
    public void DrawAlone(ref FoundLook found, in Dwell dwell, ReadOnlySpan<double> pulseSnrRatio)
    {
        var target = setup.Targets[found.TargetIndex];
        found.FluctuationRatio = PassFluctuation(target, found, dwell);
        var draws = Stream(DrawPurpose.CellStatistic, target, dwell.Index);
        found.Statistic = target.Fluctuation is FluctuationCase.Case2 or FluctuationCase.Case4
            ? StatisticDraw.OfPulseFluctuation(target.Fluctuation, pulseSnrRatio, ref draws)
            : StatisticDraw.OfKnownSignal(dwell.Pulses, found.Look.SnrRatio * dwell.Pulses * found.FluctuationRatio, ref draws);
        found.Detected = found.Statistic > setup.Detectors[dwell.PrfIndex].Threshold;
    }

    /// <summary>Decides a cell: <paramref name="members"/> are the indices of its looks, in target order. Adds the hit, if there is one.</summary>
    public void Resolve(FoundLook[] looks, Span<int> members, in Dwell dwell, List<Hit> hits)
    {
        if (members.Length > 1)
        {
            DrawTogether(looks, members, dwell);
        }

        ref var strongest = ref looks[members[0]];
        var detector = setup.Detectors[dwell.PrfIndex];
        if (strongest.Detected)
        {
            hits.Add(HitOf(looks, members, dwell, detector));
        }

        members.Sort();
    }

    /// <summary>One drawn RCS for a pass of the beam (cases 1 and 3); 1 for the other cases.</summary>
    private double PassFluctuation(RunTarget target, in FoundLook found, in Dwell dwell)
    {
        if (target.Fluctuation is not (FluctuationCase.Case1 or FluctuationCase.Case3))
        {
            return 1;
        }

        var pass = PassOf(found, dwell);
        if (pass != lastPass || target.Entity != lastEntity)
        {
            var draws = Stream(DrawPurpose.PassFluctuation, target, pass);
            (lastPass, lastEntity, lastFluctuation) = (pass, target.Entity, StatisticDraw.Fluctuation(target.Fluctuation, ref draws));
        }

        return lastFluctuation;
    }

    /// <summary>
    /// The pass a look belongs to: the turn in which the beam's centre crosses the target. Near the north mark that may be the turn
    /// before or after the dwell's own scan, so that one passage of the beam has one fluctuation.
    /// </summary>
    private long PassOf(in FoundLook found, in Dwell dwell)
    {
        if (setup.Timeline is not RotationTimeline)
        {
            return dwell.Scan;
        }

        var crossingRad = dwell.BeamAzimuthRad + found.Look.OffsetRad;
        var turn = crossingRad < 0 ? -1 : crossingRad >= Angles.TurnRad ? 1 : 0;

        // The pass before the first turn gets the largest number, which no run reaches.
        return (uint)(dwell.Scan + turn);
    }

    /// <summary>Adds the members' echoes pulse by pulse, each with its phase, and draws the cell's statistic. Members come back strongest first.</summary>
    private void DrawTogether(FoundLook[] looks, Span<int> members, in Dwell dwell)
    {
        SortByStrength(looks, members);
        var re = inPhase.AsSpan(0, dwell.Pulses);
        var im = quadrature.AsSpan(0, dwell.Pulses);
        re.Clear();
        im.Clear();
        foreach (var member in members)
        {
            AddEcho(looks[member], dwell, re, im);
        }

        double energy = 0;
        for (var pulse = 0; pulse < re.Length; pulse++)
        {
            energy += re[pulse] * re[pulse] + im[pulse] * im[pulse];
        }

        var draws = Stream(DrawPurpose.CellStatistic, setup.Targets[looks[members[0]].TargetIndex], dwell.Index);
        var statistic = StatisticDraw.OfKnownSignal(dwell.Pulses, energy, ref draws);
        var detected = statistic > setup.Detectors[dwell.PrfIndex].Threshold;
        foreach (var member in members)
        {
            looks[member].Statistic = statistic;
            looks[member].Detected = detected;
            looks[member].TargetsInCell = members.Length;
        }
    }

    private void AddEcho(in FoundLook found, in Dwell dwell, Span<double> re, Span<double> im)
    {
        var target = setup.Targets[found.TargetIndex];
        setup.Model.TryLook(target.RcsM2, target.Track.At(dwell.MiddleS), dwell, pulseSnr, out _);
        var phases = Stream(DrawPurpose.CellPhase, target, dwell.Index);
        var (sin, cos) = Math.SinCos(Angles.TurnRad * phases.NextUniform());
        var perPulse = target.Fluctuation is FluctuationCase.Case2 or FluctuationCase.Case4;
        var draws = Stream(DrawPurpose.CellFluctuation, target, dwell.Index);
        for (var pulse = 0; pulse < re.Length; pulse++)
        {
            var fluctuation = perPulse ? StatisticDraw.Fluctuation(target.Fluctuation, ref draws) : found.FluctuationRatio;
            var amplitude = Math.Sqrt(pulseSnr[pulse] * fluctuation);
            re[pulse] += amplitude * cos;
            im[pulse] += amplitude * sin;
        }
    }

    private Hit HitOf(FoundLook[] looks, ReadOnlySpan<int> members, in Dwell dwell, Detector detector)
    {
        ref var strongest = ref looks[members[0]];
        var target = setup.Targets[strongest.TargetIndex];
        var summedSnr = strongest.Statistic - detector.Pulses;
        var draws = Stream(DrawPurpose.HitRange, target, dwell.Index);
        var errorM = draws.NextNormal() * MeasurementAccuracy.RangeSigmaM(compressedWidthS, summedSnr);
        return new Hit
        {
            TimeS = dwell.MiddleS,
            Scan = dwell.Scan,
            Dwell = dwell.Index,
            Cell = strongest.Cell,
            BeamAzimuthRad = dwell.BeamAzimuthRad,
            RangeM = Math.Max(0, MeanRangeM(looks, members) + errorM),
            SummedSnrRatio = summedSnr,
            Pulses = detector.Pulses,
            Kind = EchoKind.Target,
            Target = members.Length == 1 ? target.Id : Label(looks, members),
            Entity = target.Entity,
        };
    }

    private static double MeanRangeM(FoundLook[] looks, ReadOnlySpan<int> members)
    {
        double sum = 0;
        double weight = 0;
        foreach (var member in members)
        {
            ref var look = ref looks[member].Look;
            sum += look.SnrRatio * look.ApparentRangeM;
            weight += look.SnrRatio;
        }

        return sum / weight;
    }

    private string Label(FoundLook[] looks, ReadOnlySpan<int> members)
    {
        var ids = new string[members.Length];
        for (var i = 0; i < ids.Length; i++)
        {
            ids[i] = setup.Targets[looks[members[i]].TargetIndex].Id;
        }

        var label = string.Join('+', ids);
        return labels.TryGetValue(label, out var known) ? known : labels[label] = label;
    }

    /// <summary>Strongest first. By insertion: there are two or three, and a delegate for a library sort would be allocated each time.</summary>
    private void SortByStrength(FoundLook[] looks, Span<int> members)
    {
        for (var i = 1; i < members.Length; i++)
        {
            var moved = members[i];
            var place = i;
            while (place > 0 && CompareStrength(looks, members[place - 1], moved) > 0)
            {
                members[place] = members[place - 1];
                place--;
            }

            members[place] = moved;
        }
    }

    private int CompareStrength(FoundLook[] looks, int a, int b)
    {
        var bySnr = looks[b].Look.SnrRatio.CompareTo(looks[a].Look.SnrRatio);
        return bySnr != 0 ? bySnr : string.CompareOrdinal(setup.Targets[looks[a].TargetIndex].Id, setup.Targets[looks[b].TargetIndex].Id);
    }

    private DrawStream Stream(byte purpose, RunTarget target, long index) =>
        new(setup.Seed, new DrawAddress(purpose, target.Entity, setup.Run, (uint)index));
}
