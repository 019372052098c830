using System.Collections.Immutable;
using ScanSim.Physics;
using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>Builds the radar's records from its sound block.</summary>
internal static class RadarBuilder
{
    /// <summary>Default of plots.maximumWidth: beyond four beamwidths it is two targets, or clutter.</summary>
    private const double PlotWidthBeamwidths = 4;

    public static Radar Build(CheckedBlock radar, PatternCut azimuth, PatternCut elevation)
    {
        var (antenna, losses, accuracy, processing) = (radar.Block("antenna"), radar.Block("losses"), radar.Block("accuracy"), radar.Block("processing"));
        return new Radar
        {
            CarrierHz = radar.Si("carrier"),
            PeakPowerW = radar.Si("peakPower"),
            Antenna = new Antenna
            {
                GainRatio = antenna.Si("gain"),
                Azimuth = azimuth,
                Elevation = elevation,
                TiltRad = antenna.Si("tilt"),
                SideLobeFloorRatio = antenna.Si("sideLobeFloor"),
            },
            Scan = Scan(radar),
            Blanked = radar.Blocks("blanked").Select(SectorRules.Limits).ToImmutableArray(),
            Waveform = Waveform(radar.Block("waveform")),
            Receiver = Receiver(radar.Block("receiver")),
            Losses = new Losses { TransmitRatio = losses.Si("transmit"), ProcessingRatio = losses.Si("processing") },
            Processing = new Processing
            {
                PulsesPerDwell = processing.Values["pulsesPerDwell"] is CheckedValue.OfWhole whole ? (int)whole.Number : null,
                FalseAlarmProbability = processing.Number("falseAlarmProbability"),
            },
            InstrumentedRangeM = radar.Si("instrumentedRange"),
            Plots = Plots(radar.Block("plots"), azimuth.BeamwidthRad),
            Accuracy = new InstrumentErrors { RangeSigmaM = accuracy.Si("range"), AzimuthSigmaRad = accuracy.Si("azimuth") },
        };
    }

    private static Scan Scan(CheckedBlock radar)
    {
        if (radar.Has("rotation"))
        {
            return new Scan.Rotation { PeriodS = PeriodS((CheckedValue.OfQuantity)radar.Values["rotation"]) };
        }

        var sector = radar.Block("sector");
        return new Scan.Sector { Limits = SectorRules.Limits(sector), RateRadPerS = sector.Si("rate"), TurnaroundS = sector.Si("turnaround") };
    }

    /// <summary>60 / rpm and 360 / (deg/s) without the detour over π: 24 rpm are 2.5 s to the last bit.</summary>
    private static double PeriodS(CheckedValue.OfQuantity rotation) => rotation.Quantity.Unit.Symbol switch
    {
        "rpm" => 60 / rotation.Quantity.Number,
        "deg/s" => 360 / rotation.Quantity.Number,
        _ => Angles.TurnRad / rotation.Quantity.Si,
    };

    private static Waveform Waveform(CheckedBlock waveform) => new()
    {
        PulseWidthS = waveform.Si("pulseWidth"),
        CompressedWidthS = waveform.Si(waveform.Has("compressedWidth") ? "compressedWidth" : "pulseWidth"),
        PrfHz = RadarRules.Prfs(waveform).Select(prf => prf.Quantity.Si).ToImmutableArray(),
    };

    private static Receiver Receiver(CheckedBlock receiver)
    {
        if (receiver.Has("systemTemperature"))
        {
            return new Receiver { SystemTemperatureK = receiver.Si("systemTemperature") };
        }

        var parts = new ReceiverParts
        {
            AntennaTemperatureK = receiver.Si("antennaTemperature"),
            LineLossRatio = receiver.Si("lineLoss"),
            LineTemperatureK = receiver.Si("lineTemperature"),
            NoiseFigureRatio = receiver.Si("noiseFigure"),
        };
        return new Receiver
        {
            SystemTemperatureK = Noise.SystemTemperatureK(parts.AntennaTemperatureK, parts.LineLossRatio, parts.LineTemperatureK, parts.NoiseFigureRatio),
            Parts = parts,
        };
    }

    private static PlotRules Plots(CheckedBlock plots, double beamwidthRad) => new()
    {
        RangeGapCells = (int)plots.Whole("rangeGap"),
        AzimuthGapDwells = (int)plots.Whole("azimuthGap"),
        MinimumHits = (int)plots.Whole("minimumHits"),
        MaximumWidthRad = plots.Has("maximumWidth") ? plots.Si("maximumWidth") : PlotWidthBeamwidths * beamwidthRad,
    };
}
