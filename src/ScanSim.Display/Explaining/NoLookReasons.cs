using ScanSim.Display.Painting;
using ScanSim.Physics;
using ScanSim.Physics.Earth;
using ScanSim.Physics.Waveforms;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Display.Explaining;

/// <summary>Why a scan has no look at a target: geometry, timeline, or too little signal.</summary>
internal sealed class NoLookReasons(Scenario scenario, RangeUnit unit)
{
    private const double DegPerRad = 180 / Math.PI;

    public NoLookExplanation Explain(in TruthRow row, Target target)
    {
        var (outcome, reason) = row.View switch
        {
            TargetView.BelowHorizon => (PassOutcome.BelowHorizon, Horizon(row)),
            TargetView.BeyondInstrumentedRange => (PassOutcome.BeyondInstrumentedRange, Beyond(row)),
            TargetView.Blanked => (PassOutcome.Blanked, Blanked(row)),
            TargetView.OutsideSector => (PassOutcome.OutsideSector, Outside(row)),
            _ => InView(row, target),
        };
        return new NoLookExplanation { Row = row, Outcome = outcome, Reason = reason };
    }

    private string Horizon(in TruthRow row)
    {
        var earth = scenario.EffectiveEarth();
        var antennaM = scenario.Site.AntennaAltitudeM;
        var groundM = Math.Sqrt(row.EastM * row.EastM + row.NorthM * row.NorthM);
        var seenM = earth.HorizonDistanceM(antennaM) + earth.HorizonDistanceM(row.HeightM);
        return $"below the horizon by {Range(groundM - seenM)}: {Range(groundM)} away over ground, in sight to {Range(seenM)} (antenna {antennaM:0.#} m, target {row.HeightM:0.#} m above sea level)";
    }

    private string Beyond(in TruthRow row)
    {
        var reachM = scenario.Radar.InstrumentedRangeM;
        var apparentM = RangeAmbiguity.ApparentRangeM(row.RangeM, 1 / scenario.Radar.Waveform.PrfHz.Max());
        return apparentM < row.RangeM
            ? $"beyond the instrumented range of {Range(reachM)}: its echo comes in the next interval, as if from {Range(apparentM)}"
            : $"beyond the instrumented range of {Range(reachM)} by {Range(row.RangeM - reachM)}";
    }

    private string Blanked(in TruthRow row)
    {
        var azimuthRad = row.AzimuthDeg / DegPerRad;
        var sector = scenario.Radar.Blanked.FirstOrDefault(s => s.Contains(azimuthRad));
        return sector == default ? $"in a blanked sector (bearing {row.AzimuthDeg:000.0}°)" : $"in the blanked sector {Sector(sector)} (bearing {row.AzimuthDeg:000.0}°)";
    }

    private string Outside(in TruthRow row) => scenario.Radar.Scan is Scan.Sector scan
        ? $"outside the sector scan {Sector(scan.Limits)} (bearing {row.AzimuthDeg:000.0}°)"
        : $"outside the scan (bearing {row.AzimuthDeg:000.0}°)";

    /// <summary>In view without a look: too little signal even at the beam's peak, or the beam did not bring it.</summary>
    private (PassOutcome Outcome, string Reason) InView(in TruthRow row, Target target)
    {
        // The dwells' own repetition intervals and lengths are the engine's affair: the best of them decides here.
        var waveform = scenario.Radar.Waveform;
        var rangeM = row.RangeM;
        var openRatio = waveform.PrfHz.Max(prfHz => Eclipsing.PowerRatio(rangeM, waveform.PulseWidthS, 1 / prfHz));
        if (openRatio == 0)
        {
            return (PassOutcome.TooWeakForLook, "no look: the whole echo came while the receiver was shut");
        }

        var snrDb = Decibels.FromRatio(scenario.Radar.EquationTerms().SnrRatio()) + Decibels.FromRatio(target.RcsM2) - 4 * Decibels.FromRatio(rangeM) + Decibels.FromRatio(openRatio);
        var summedDb = snrDb + Decibels.FromRatio(waveform.PrfHz.Max(scenario.Radar.PulsesPerDwell));
        if (summedDb < LookExplainer.SummedSnrFloorDb)
        {
            return (PassOutcome.TooWeakForLook, $"signal too weak for a look: {snrDb:0.0} dB per pulse at the beam's peak, summed more than 20 dB below one pulse's noise");
        }

        var antenna = scenario.Radar.Antenna;
        var offsetDeg = Math.Abs(row.ElevationDeg - antenna.TiltRad * DegPerRad);
        return offsetDeg * 2 > antenna.Elevation.BeamwidthRad * DegPerRad
            ? (PassOutcome.TooWeakForLook, $"signal too weak for a look: {offsetDeg:0.0}° off the beam's elevation, summed more than 20 dB below one pulse's noise")
            : (PassOutcome.NoDwell, $"no look: {snrDb:0.0} dB per pulse at the beam's peak, but no dwell of this scan met it there");
    }

    private string Range(double rangeM) => RangeText.Precise(rangeM, unit);

    private static string Sector(AzimuthSector sector) => $"{sector.FromRad * DegPerRad:000}° to {sector.ToRad * DegPerRad:000}°";
}
