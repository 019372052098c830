using System.Collections.Immutable;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Tests;

/// <summary>Scenes as a coastal radar would give them, made from a few lines of physics and a fixed generator: for the painter's tests only.</summary>
internal static class SceneMaking
{
    public const double RangeM = 46_300;
    private const double Degree = Math.PI / 180;

    public static Scenario Scenario(int targets, double durationS, Scan? scan = null, ImmutableArray<AzimuthSector>? blanked = null, string name = "Harbour approach, morning traffic") => new()
    {
        Name = name,
        Site = new Site { Name = "Cape North", LatitudeRad = 54 * Degree, LongitudeRad = 8 * Degree, GroundHeightM = 20, AntennaHeightM = 25 },
        Radar = new Radar
        {
            CarrierHz = 9.41e9,
            PeakPowerW = 25e3,
            Antenna = new Antenna
            {
                GainRatio = 1995,
                Azimuth = new PatternCut.Gaussian { BeamwidthRad = 1.2 * Degree },
                Elevation = new PatternCut.Gaussian { BeamwidthRad = 20 * Degree },
                TiltRad = 0,
                SideLobeFloorRatio = 1e-4,
            },
            Scan = scan ?? new Scan.Rotation { PeriodS = 2.5 },
            Blanked = blanked ?? [],
            Waveform = new Waveform { PulseWidthS = 2.5e-7, CompressedWidthS = 2.5e-7, PrfHz = [2000] },
            Receiver = new Receiver { SystemTemperatureK = 900 },
            Losses = new Losses { TransmitRatio = 1.5, ProcessingRatio = 2 },
            Processing = new Processing { PulsesPerDwell = null, FalseAlarmProbability = 1e-6 },
            InstrumentedRangeM = RangeM,
            Plots = new PlotRules { RangeGapCells = 1, AzimuthGapDwells = 1, MinimumHits = 1, MaximumWidthRad = 5 * Degree },
            Accuracy = new InstrumentErrors { RangeSigmaM = 10, AzimuthSigmaRad = 0.1 * Degree },
        },
        Environment = new Surroundings { EffectiveEarthFactor = 4.0 / 3 },
        Targets = [.. Enumerable.Range(0, targets).Select(i => TargetOf(i, durationS))],
        Run = new RunPlan { Start = new DateTimeOffset(2026, 5, 12, 6, 10, 0, TimeSpan.Zero), DurationS = durationS, Seed = 7 },
        Digest = "",
        SourceText = "",
    };

    /// <summary>A scene with traffic from all sides, clusters in a fairway, one target below the horizon at first, and false plots.</summary>
    public static Scene Scene(int targets, double durationS = 300, LooksKept looks = LooksKept.Best, Scan? scan = null, ImmutableArray<AzimuthSector>? blanked = null, string? name = null)
    {
        var scenario = name is null ? Scenario(targets, durationS, scan, blanked) : Scenario(targets, durationS, scan, blanked, name);
        return Gather(scenario, looks).Build();
    }

    public static SceneBuilder Gather(Scenario scenario, LooksKept looks = LooksKept.Best)
    {
        var builder = new SceneBuilder(scenario);
        Feed(builder, scenario, looks);
        return builder;
    }

    /// <summary>The rows of a run, scan by scan.</summary>
    public static void Feed(IRecordingSink sink, Scenario scenario, LooksKept looks = LooksKept.Best)
    {
        var draws = new Random(20260512);
        var beam = new BeamMotion(scenario.Radar.Scan);
        var scans = (int)Math.Ceiling(scenario.Run.DurationS / beam.PeriodS);
        for (var scan = 0; scan < scans; scan++)
        {
            Turn(sink, scenario, beam, scan, looks, draws);
        }
    }

    private static void Turn(IRecordingSink sink, Scenario scenario, BeamMotion beam, int scan, LooksKept looks, Random draws)
    {
        var startS = scan * beam.PeriodS;
        var rows = new List<LookRow>();
        var plots = new List<PlotRow>();
        var truth = new List<TruthRow>();
        foreach (var target in scenario.Targets)
        {
            if (startS < target.Track.StartS || startS + beam.PeriodS > target.Track.EndS)
            {
                continue;
            }

            var row = Truth(target, scan, startS, beam.PeriodS, scenario);
            if (row.TimeS > scenario.Run.DurationS)
            {
                continue;
            }

            truth.Add(row);
            if (row.View == TargetView.InView)
            {
                var look = Look(target, row, draws);
                rows.Add(look);
                if (look.Detected)
                {
                    plots.Add(PlotOf(row, look.SnrDb, draws));
                }
            }
        }

        for (var n = draws.Next(0, 5); n > 0; n--)
        {
            plots.Add(FalsePlot(scan, startS, beam.PeriodS, draws));
        }

        rows.Sort((a, b) => a.TimeS.CompareTo(b.TimeS));
        sink.AddScan(new ScanRow { Scan = scan, StartS = startS, EndS = startS + beam.PeriodS, Looks = rows.Count, Hits = plots.Count, FalseHits = plots.Count(p => p.Kind == EchoKind.Noise), Plots = plots.Count, FalsePlots = plots.Count(p => p.Kind == EchoKind.Noise) });
        sink.AddLooks(looks == LooksKept.None ? [] : rows.ToArray());
        sink.AddPlots(plots.OrderBy(p => p.TimeS).ToArray());
        sink.AddTruth(truth.OrderBy(t => t.TimeS).ToArray());
    }

    public static TruthRow TruthRow(string target, int scan, double timeS, double eastM, double northM, double eastMps = 0, double northMps = 0, TargetView view = TargetView.InView) => new()
    {
        TimeS = timeS,
        Scan = scan,
        Target = target,
        LatitudeDeg = 54,
        LongitudeDeg = 8,
        HeightM = 5,
        EastM = eastM,
        NorthM = northM,
        EastMps = eastMps,
        NorthMps = northMps,
        UpMps = 0,
        RangeM = Math.Sqrt(eastM * eastM + northM * northM),
        AzimuthDeg = (Math.Atan2(eastM, northM) / Degree + 360) % 360,
        ElevationDeg = 0,
        View = view,
    };

    public static PlotRow PlotRow(string target, int scan, double timeS, double rangeM, double azimuthDeg) => new()
    {
        TimeS = timeS,
        Scan = scan,
        RangeM = rangeM,
        AzimuthDeg = azimuthDeg,
        SnrDb = 15,
        Hits = 3,
        SigmaRangeM = 15,
        SigmaAzimuthDeg = 0.2,
        Kind = target.Length == 0 ? EchoKind.Noise : EchoKind.Target,
        Target = target,
    };

    public static LookRow LookRow(string target, int scan, double timeS, double snrDb, bool detected, LossReason lostTo) => new()
    {
        TimeS = timeS,
        Scan = scan,
        Dwell = 0,
        Target = target,
        RangeM = 10_000,
        AzimuthDeg = 90,
        ElevationDeg = 0,
        RadialSpeedMps = 0,
        BeamAzimuthDeg = 90,
        Pulses = 16,
        RadarDb = 0,
        RcsDb = 0,
        SpreadingDb = 0,
        AzimuthBeamDb = 0,
        ElevationBeamDb = 0,
        EclipsingDb = 0,
        SnrDb = snrDb,
        Pd = 0.5,
        FluctuationDb = 0,
        StatisticDb = 0,
        Detected = detected,
        LostTo = detected ? LossReason.None : lostTo,
        TargetsInCell = 1,
    };

    private static TruthRow Truth(Target target, int scan, double startS, double periodS, Scenario scenario)
    {
        var state = target.Track.At(startS + periodS / 2);
        var azimuthRad = (Math.Atan2(state.EastM, state.NorthM) + Math.Tau) % Math.Tau;
        var timeS = startS + azimuthRad / Math.Tau * periodS;
        state = target.Track.At(timeS);
        var rangeM = Math.Sqrt(state.EastM * state.EastM + state.NorthM * state.NorthM);
        var view = rangeM > RangeM ? TargetView.BeyondInstrumentedRange
            : scenario.Radar.Blanked.Any(s => s.Contains(azimuthRad)) ? TargetView.Blanked
            : rangeM > 32_000 && target.RcsM2 < 10 ? TargetView.BelowHorizon : TargetView.InView;
        return TruthRow(target.Id, scan, timeS, state.EastM, state.NorthM, state.EastMps, state.NorthMps, view);
    }

    private static LookRow Look(Target target, in TruthRow truth, Random draws)
    {
        var meanDb = 5 + 10 * Math.Log10(target.RcsM2) - 40 * Math.Log10(truth.RangeM / 20_000);
        var drawnDb = meanDb + 10 * Math.Log10(-Math.Log(1 - draws.NextDouble()));
        var reason = meanDb > 4.6 ? LossReason.Fluctuation : draws.Next(10) switch { 0 => LossReason.ElevationBeam, 1 => LossReason.SharedCell, _ => LossReason.Range };
        return LookRow(target.Id, truth.Scan, truth.TimeS, drawnDb, drawnDb > 3, reason);
    }

    private static PlotRow PlotOf(in TruthRow truth, double snrDb, Random draws) =>
        PlotRow(truth.Target, truth.Scan, truth.TimeS, truth.RangeM + 40 * (draws.NextDouble() - 0.5), truth.AzimuthDeg + 0.5 * (draws.NextDouble() - 0.5)) with { SnrDb = snrDb };

    private static PlotRow FalsePlot(int scan, double startS, double periodS, Random draws)
    {
        var azimuthDeg = 360 * draws.NextDouble();
        return PlotRow("", scan, startS + azimuthDeg / 360 * periodS, RangeM * draws.NextDouble(), azimuthDeg);
    }

    private static Target TargetOf(int index, double durationS)
    {
        string[] kinds = ["ferry", "fishing boat", "pilot boat", "yacht", "light aircraft", "tanker"];
        double[] areasM2 = [300, 8, 5, 2, 3, 2000];
        double[] speedsMps = [9, 4, 11, 3, 55, 6];
        var kind = index % kinds.Length;
        var draws = new Random(1000 + index);
        // Every fourth one is in a fairway to the south-east.
        var inFairway = index % 4 == 3;
        var azimuthRad = inFairway ? 2.3 + 0.05 * (draws.NextDouble() - 0.5) : Math.Tau * draws.NextDouble();
        var rangeM = inFairway ? 8_000 + 30_000 * draws.NextDouble() : 45_000 * Math.Sqrt(0.01 + 0.99 * draws.NextDouble());
        var headingRad = azimuthRad + Math.PI + 0.6 * Math.Sin(index);
        var piece = new TrackPiece
        {
            StartS = 0,
            EndS = durationS + 60,
            EastM = rangeM * Math.Sin(azimuthRad),
            NorthM = rangeM * Math.Cos(azimuthRad),
            HeightM = kind == 4 ? 300 : 5,
            HeadingRad = headingRad,
            SpeedMps = speedsMps[kind],
            AccelerationMps2 = 0,
            TurnRateRadPerS = index % 5 == 2 ? 0.01 : 0,
            ClimbMps = 0,
        };
        return new Target
        {
            Id = $"{kinds[kind].Split(' ')[0]}-{index + 1:00}",
            Class = kinds[kind],
            RcsM2 = areasM2[kind],
            FluctuationCase = 1,
            Track = new Track { Pieces = [piece], MaximumSpeedMps = speedsMps[kind] },
        };
    }
}
