using System.Collections.Immutable;
using ScanSim.Scenarios;

namespace ScanSim.Engine.Tests;

/// <summary>A small X-band radar to vary in tests: 24 rpm, 1.2° Gaussian beam, 1,800 Hz, dwells of one beamwidth.</summary>
internal static class TestScenario
{
    public const double DegRad = Math.PI / 180;

    public static Scenario With(params Target[] targets) => new()
    {
        Name = "test",
        Site = new Site { Name = "test site", LatitudeRad = 50 * DegRad, LongitudeRad = 0, GroundHeightM = 10, AntennaHeightM = 20 },
        Radar = new Radar
        {
            CarrierHz = 9.41e9,
            PeakPowerW = 25e3,
            Antenna = new Antenna
            {
                GainRatio = 1000,
                Azimuth = new PatternCut.Gaussian { BeamwidthRad = 1.2 * DegRad },
                Elevation = new PatternCut.Gaussian { BeamwidthRad = 20 * DegRad },
                TiltRad = 0,
                SideLobeFloorRatio = 1e-4,
            },
            Scan = new Scan.Rotation { PeriodS = 2.5 },
            Blanked = [],
            Waveform = new Waveform { PulseWidthS = 0.25e-6, CompressedWidthS = 0.25e-6, PrfHz = [1800] },
            Receiver = new Receiver { SystemTemperatureK = 1000 },
            Losses = new Losses { TransmitRatio = 1.2, ProcessingRatio = 1.5 },
            Processing = new Processing { PulsesPerDwell = null, FalseAlarmProbability = 1e-6 },
            InstrumentedRangeM = 45e3,
            Plots = new PlotRules { RangeGapCells = 1, AzimuthGapDwells = 1, MinimumHits = 1, MaximumWidthRad = 4.8 * DegRad },
            Accuracy = new InstrumentErrors { RangeSigmaM = 0, AzimuthSigmaRad = 0 },
        },
        Environment = new Surroundings { EffectiveEarthFactor = 4.0 / 3 },
        Targets = [.. targets],
        Run = new RunPlan { Start = DateTimeOffset.UnixEpoch, DurationS = 60, Seed = 7 },
        Digest = "",
        SourceText = "",
    };

    /// <summary>A target that stays where it is for the whole run.</summary>
    public static Target Still(string id, double azimuthDeg, double rangeM, double rcsM2, int fluctuation, double heightM = 5) =>
        Moving(id, azimuthDeg, rangeM, 0, 0, rcsM2, fluctuation, heightM);

    /// <summary>A target on a straight course.</summary>
    public static Target Moving(
        string id, double azimuthDeg, double rangeM, double headingDeg, double speedMps, double rcsM2, int fluctuation, double heightM = 5) => new()
    {
        Id = id,
        Class = "test target",
        RcsM2 = rcsM2,
        FluctuationCase = fluctuation,
        Track = new Track
        {
            MaximumSpeedMps = speedMps,
            Pieces = [Piece(rangeM * Math.Sin(azimuthDeg * DegRad), rangeM * Math.Cos(azimuthDeg * DegRad), headingDeg, speedMps, 0, heightM)],
        },
    };

    /// <summary>A target that circles: its bearing and range change all the time.</summary>
    public static Target Circling(string id, double azimuthDeg, double rangeM, double speedMps, double turnDegPerS, double rcsM2, int fluctuation, double heightM = 300) => new()
    {
        Id = id,
        Class = "test target",
        RcsM2 = rcsM2,
        FluctuationCase = fluctuation,
        Track = new Track
        {
            MaximumSpeedMps = speedMps,
            Pieces = [Piece(rangeM * Math.Sin(azimuthDeg * DegRad), rangeM * Math.Cos(azimuthDeg * DegRad), 40, speedMps, turnDegPerS, heightM)],
        },
    };

    /// <summary>
    /// One dwell a scan and a beam that is the same in all directions: every dwell looks at the target with the same SNR, and every
    /// look is a pass of its own.
    /// </summary>
    public static Scenario ConstantSnr(int pulses, double snrRatio, int fluctuation, int dwells, double falseAlarmProbability, ulong seed)
    {
        const double PrfHz = 2000;
        var flat = new PatternCut.Table { BeamwidthRad = 1, OffsetsRad = [-Math.PI, Math.PI], LevelsDb = [0, 0] };
        var scenario = With();
        scenario = scenario with
        {
            Radar = scenario.Radar with
            {
                Antenna = scenario.Radar.Antenna with { Azimuth = flat, Elevation = flat },
                Scan = new Scan.Rotation { PeriodS = pulses / PrfHz },
                Waveform = scenario.Radar.Waveform with { PrfHz = [PrfHz] },
                Processing = new Processing { PulsesPerDwell = pulses, FalseAlarmProbability = falseAlarmProbability },
            },
            Run = scenario.Run with { DurationS = dwells * pulses / PrfHz, Seed = seed },
        };
        var probe = Still("still", 45, 10_000, 1, fluctuation);
        var model = new LookModel(scenario);
        var rangeM = model.SightOf(probe.Track.At(0)).RangeM;
        var rcsM2 = snrRatio * Math.Pow(rangeM, 4) / model.RadarRatioM2;
        return scenario with { Targets = [probe with { RcsM2 = rcsM2 }] };
    }

    private static TrackPiece Piece(double eastM, double northM, double headingDeg, double speedMps, double turnDegPerS, double heightM) => new()
    {
        StartS = 0,
        EndS = 1e6,
        EastM = eastM,
        NorthM = northM,
        HeightM = heightM,
        HeadingRad = headingDeg * DegRad,
        SpeedMps = speedMps,
        AccelerationMps2 = 0,
        TurnRateRadPerS = turnDegPerS * DegRad,
        ClimbMps = 0,
    };
}
