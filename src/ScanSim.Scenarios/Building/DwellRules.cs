using ScanSim.Physics.Waveforms;
using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>Rules that tie pulses, scan and run together.</summary>
internal sealed class DwellRules(FaultList faults)
{
    /// <summary>Dwells are counted in 32 bits, as the addresses of random draws are.</summary>
    private const double MostDwells = 4_294_967_296;

    /// <summary>Gaps in the sum of blanked and scanned azimuths smaller than this are rounding.</summary>
    private const double RoundingRatio = 1 + 1e-12;

    /// <summary>For sound blocks; the azimuth beamwidth is that of the built pattern.</summary>
    public void Check(CheckedBlock radar, double azimuthBeamwidthRad, CheckedBlock? run)
    {
        var (rateRadPerS, sweepRad) = Sweep(radar);
        var prfs = RadarRules.Prfs(radar.Block("waveform")).Select(prf => prf.Quantity.Si).ToList();
        if (radar.Has("sector") && azimuthBeamwidthRad > sweepRad)
        {
            faults.Add(
                radar.Values["sector"],
                $"a sector of {QuantityText.Format(sweepRad, Dimension.Angle, "deg")}, narrower than the beam",
                $"at least the azimuth beamwidth, {QuantityText.Format(azimuthBeamwidthRad, Dimension.Angle, "deg")}");
        }

        var pulses = radar.Block("processing").Values["pulsesPerDwell"];
        var count = pulses is CheckedValue.OfWhole whole
            ? whole.Number
            : BeamwidthPulses.Count(azimuthBeamwidthRad, prfs.Min(), rateRadPerS);
        if (pulses is CheckedValue.OfText && !InBeam(pulses, count, BeamwidthPulses.Count(azimuthBeamwidthRad, prfs.Max(), rateRadPerS)))
        {
            return;
        }

        var dwellS = count / prfs.Min();
        var scanS = sweepRad / rateRadPerS;
        if (dwellS > scanS * RoundingRatio)
        {
            faults.Add(
                pulses,
                $"{pulses.Json.Shown()}: a dwell of {QuantityText.Plain(dwellS, 4)} s in a scan of {QuantityText.Plain(scanS, 4)} s",
                $"at most {QuantityText.Plain(Math.Floor(scanS * prfs.Min()), 9)} pulses");
        }

        if (run is { Sound: true } && run.Si("duration") / (count / prfs.Max()) >= MostDwells)
        {
            faults.Add(run.Values["duration"], $"{run.Values["duration"].Json.Shown()}: more than 2^32 dwells", $"less than {QuantityText.Plain(MostDwells * count / prfs.Max(), 6)} s");
        }
    }

    private static (double RateRadPerS, double SweepRad) Sweep(CheckedBlock radar) => radar.Has("rotation")
        ? (radar.Si("rotation"), Angles.TurnRad)
        : (radar.Block("sector").Si("rate"), SectorRules.Limits(radar.Block("sector")).WidthRad);

    /// <summary>"beamwidth" must give a number of pulses that could be written out as well.</summary>
    private bool InBeam(CheckedValue pulses, double fewest, double most)
    {
        if (fewest >= 1 && most <= RadarFormat.MostPulsesPerDwell)
        {
            return true;
        }

        faults.Add(
            pulses,
            $"{pulses.Json.Shown()}: {QuantityText.Plain(fewest < 1 ? fewest : most, 4)} pulses in a beamwidth",
            fewest < 1 ? "at least one: a slower scan, a wider beam or a higher PRF" : $"at most {RadarFormat.MostPulsesPerDwell}");
        return false;
    }
}
