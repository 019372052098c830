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
    private readonly double compressedWidthS = setup.Scenario.Radar.Waveform.CompressedWidthS;

    /// <summary>Fills in fluctuation and statistic of a look as if it had its cell to itself.</summary>
    public void DrawAlone(ref FoundLook found, ReadOnlySpan<double> pulseSnrRatio)
    {
        var target = setup.Targets[found.TargetIndex];
        found.FluctuationRatio = PassFluctuation(target, found);
        var draws = Stream(DrawPurpose.CellStatistic, target, found.Dwell.Index);
        found.Statistic = target.Fluctuation switch
        {
            FluctuationCase.Case2 => StatisticDraw.OfCase2(pulseSnrRatio, ref draws),
            FluctuationCase.Case4 => StatisticDraw.OfCase4(pulseSnrRatio, ref draws),
            _ => StatisticDraw.OfKnownSignal(found.Dwell.Pulses, found.Look.SnrRatio * found.Dwell.Pulses * found.FluctuationRatio, ref draws),
        };
    }

    /// <summary>Decides a cell: <paramref name="members"/> are the indices of its looks, in target order. Adds the hit, if there is one.</summary>
    public void Resolve(FoundLook[] looks, Span<int> members, List<Hit> hits)
    {
        if (members.Length > 1)
        {
            DrawTogether(looks, members);
        }

        ref var strongest = ref looks[members[0]];
        var detector = setup.Detectors[strongest.Dwell.PrfIndex];
        var detected = strongest.Statistic > detector.Threshold;
        foreach (var member in members)
        {
            looks[member].Detected = detected;
        }

        if (detected)
        {
            hits.Add(HitOf(looks, members, detector));
        }

        members.Sort();
    }

    /// <summary>One drawn RCS for a pass of the beam (cases 1 and 3); 1 for the other cases.</summary>
    private double PassFluctuation(RunTarget target, in FoundLook found)
    {
        if (target.Fluctuation is not (FluctuationCase.Case1 or FluctuationCase.Case3))
        {
            return 1;
        }

        var draws = Stream(DrawPurpose.PassFluctuation, target, PassOf(found));
        return StatisticDraw.Fluctuation(target.Fluctuation, ref draws);
    }

    /// <summary>
    /// The pass a look belongs to: the turn in which the beam's centre crosses the target. Near the north mark that may be the turn
    /// before or after the dwell's own scan, so that one passage of the beam has one fluctuation.
    /// </summary>
    private long PassOf(in FoundLook found)
    {
        if (setup.Timeline is not RotationTimeline)
        {
            return found.Dwell.Scan;
        }

        var crossingRad = found.Dwell.BeamAzimuthRad + found.Look.OffsetRad;
        var turn = crossingRad < 0 ? -1 : crossingRad >= Angles.TurnRad ? 1 : 0;

        // The pass before the first turn gets the largest number, which no run reaches.
        return (uint)(found.Dwell.Scan + turn);
    }

    /// <summary>Adds the members' echoes pulse by pulse, each with its phase, and draws the cell's statistic. Members come back strongest first.</summary>
    private void DrawTogether(FoundLook[] looks, Span<int> members)
    {
        members.Sort((a, b) => CompareStrength(looks, a, b));
        var dwell = looks[members[0]].Dwell;
        var re = inPhase.AsSpan(0, dwell.Pulses);
        var im = quadrature.AsSpan(0, dwell.Pulses);
        re.Clear();
        im.Clear();
        foreach (var member in members)
        {
            AddEcho(looks[member], re, im);
        }

        double energy = 0;
        for (var pulse = 0; pulse < re.Length; pulse++)
        {
            energy += re[pulse] * re[pulse] + im[pulse] * im[pulse];
        }

        var draws = Stream(DrawPurpose.CellStatistic, setup.Targets[looks[members[0]].TargetIndex], dwell.Index);
        var statistic = StatisticDraw.OfKnownSignal(dwell.Pulses, energy, ref draws);
        foreach (var member in members)
        {
            looks[member].Statistic = statistic;
            looks[member].TargetsInCell = members.Length;
        }
    }

    private void AddEcho(in FoundLook found, Span<double> re, Span<double> im)
    {
        var target = setup.Targets[found.TargetIndex];
        setup.Model.TryLook(target.RcsM2, target.Track.At(found.Dwell.MiddleS), found.Dwell, pulseSnr, out _);
        var phases = Stream(DrawPurpose.CellPhase, target, found.Dwell.Index);
        var (sin, cos) = Math.SinCos(Angles.TurnRad * phases.NextUniform());
        var perPulse = target.Fluctuation is FluctuationCase.Case2 or FluctuationCase.Case4;
        var draws = Stream(DrawPurpose.CellFluctuation, target, found.Dwell.Index);
        for (var pulse = 0; pulse < re.Length; pulse++)
        {
            var fluctuation = perPulse ? StatisticDraw.Fluctuation(target.Fluctuation, ref draws) : found.FluctuationRatio;
            var amplitude = Math.Sqrt(pulseSnr[pulse] * fluctuation);
            re[pulse] += amplitude * cos;
            im[pulse] += amplitude * sin;
        }
    }

    private Hit HitOf(FoundLook[] looks, ReadOnlySpan<int> members, Detector detector)
    {
        ref var strongest = ref looks[members[0]];
        var target = setup.Targets[strongest.TargetIndex];
        var summedSnr = strongest.Statistic - detector.Pulses;
        var draws = Stream(DrawPurpose.HitRange, target, strongest.Dwell.Index);
        var errorM = draws.NextNormal() * MeasurementAccuracy.RangeSigmaM(compressedWidthS, summedSnr);
        return new Hit
        {
            TimeS = strongest.Dwell.MiddleS,
            Scan = strongest.Dwell.Scan,
            Dwell = strongest.Dwell.Index,
            Cell = strongest.Cell,
            BeamAzimuthRad = strongest.Dwell.BeamAzimuthRad,
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

    private int CompareStrength(FoundLook[] looks, int a, int b)
    {
        var bySnr = looks[b].Look.SnrRatio.CompareTo(looks[a].Look.SnrRatio);
        return bySnr != 0 ? bySnr : string.CompareOrdinal(setup.Targets[looks[a].TargetIndex].Id, setup.Targets[looks[b].TargetIndex].Id);
    }

    private DrawStream Stream(byte purpose, RunTarget target, long index) =>
        new(setup.Seed, new DrawAddress(purpose, target.Entity, setup.Run, (uint)index));
}
