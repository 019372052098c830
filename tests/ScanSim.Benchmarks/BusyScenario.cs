using System.Collections.Immutable;
using ScanSim.Scenarios;

namespace ScanSim.Benchmarks;

/// <summary>An S-band radar at 15 rpm with dwells of 15 pulses, and any number of targets of all kinds within 100 km.</summary>
internal static class BusyScenario
{
    private const double DegRad = Math.PI / 180;

    public static Scenario Of(int targets, double hours) => new()
    {
        Name = "benchmark",
        Site = new Site { Name = "benchmark", LatitudeRad = 50 * DegRad, LongitudeRad = 0, GroundHeightM = 20, AntennaHeightM = 20 },
        Radar = new Radar
        {
            CarrierHz = 2.8e9,
            PeakPowerW = 1e6,
            Antenna = new Antenna
            {
                GainRatio = 2200,
                Azimuth = new PatternCut.Cosine { BeamwidthRad = 1.4 * DegRad },
                Elevation = new PatternCut.CosecantSquared { BeamwidthRad = 4.8 * DegRad, UpToRad = 30 * DegRad },
                TiltRad = 3 * DegRad,
                SideLobeFloorRatio = 1e-4,
            },
            Scan = new Scan.Rotation { PeriodS = 4 },
            Blanked = [],
            Waveform = new Waveform { PulseWidthS = 0.6e-6, CompressedWidthS = 0.6e-6, PrfHz = [964] },
            Receiver = new Receiver { SystemTemperatureK = 900 },
            Losses = new Losses { TransmitRatio = 1.3, ProcessingRatio = 2 },
            Processing = new Processing { PulsesPerDwell = 15, FalseAlarmProbability = 1e-6 },
            InstrumentedRangeM = 111e3,
            Plots = new PlotRules { RangeGapCells = 1, AzimuthGapDwells = 1, MinimumHits = 1, MaximumWidthRad = 5.6 * DegRad },
            Accuracy = new InstrumentErrors { RangeSigmaM = 10, AzimuthSigmaRad = 1e-3 },
        },
        Environment = new Surroundings { EffectiveEarthFactor = 4.0 / 3 },
        Targets = [.. Enumerable.Range(0, targets).Select(i => Target(i, 3600 * hours))],
        Run = new RunPlan { Start = DateTimeOffset.UnixEpoch, DurationS = 3600 * hours, Seed = 1 },
        Digest = "",
        SourceText = "{}",
    };

    /// <summary>Aircraft on wide circles, spread over range and bearing by multiples of irrational numbers.</summary>
    private static Target Target(int i, double durationS)
    {
        var azimuthRad = 2 * Math.PI * (i * 0.618033988749895 % 1);
        var rangeM = 5_000 + 90_000 * (i * 0.754877666246693 % 1);
        var speedMps = 60 + 180 * (i * 0.569840290998053 % 1);
        var piece = new TrackPiece
        {
            StartS = 0,
            EndS = durationS,
            EastM = rangeM * Math.Sin(azimuthRad),
            NorthM = rangeM * Math.Cos(azimuthRad),
            HeightM = 500 + 8_000 * (i * 0.324717957244746 % 1),
            HeadingRad = azimuthRad + 1,
            SpeedMps = speedMps,
            AccelerationMps2 = 0,
            TurnRateRadPerS = 0.5 * DegRad,
            ClimbMps = 0,
        };
        return new Target
        {
            Id = $"t{i:0000}",
            Class = "aircraft",
            RcsM2 = Math.Pow(10, i % 7 / 3.0),
            FluctuationCase = i % 5,
            Track = new Track { Pieces = [piece], MaximumSpeedMps = speedMps },
        };
    }
}
