using ScanSim.Physics;
using ScanSim.Physics.Waveforms;
using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>What must hold between several properties of the radar. Each rule is tried when the blocks that it needs are sound.</summary>
internal sealed class RadarRules(FaultList faults)
{
    public void Check(CheckedBlock radar)
    {
        var waveform = radar.BlockOrNull("waveform");
        if (waveform is { Sound: true })
        {
            Pulse(waveform);
            if (radar.Has("instrumentedRange"))
            {
                Range(waveform, radar);
            }
        }

        if (radar.BlockOrNull("antenna") is { Sound: true } antenna && antenna.Block("elevation") is var elevation && elevation.Has("upTo"))
        {
            ShapedBeam(antenna.Si("tilt"), elevation);
        }

        SectorRules.Check(radar, faults);
    }

    /// <summary>The frequencies of "prf", one or a list.</summary>
    public static IEnumerable<CheckedValue.OfQuantity> Prfs(CheckedBlock waveform) =>
        waveform.Values["prf"] is CheckedValue.OfQuantity one ? [one] : waveform.Items("prf").OfType<CheckedValue.OfQuantity>();

    private void Pulse(CheckedBlock waveform)
    {
        var pulseS = waveform.Si("pulseWidth");
        if (waveform.Has("compressedWidth") && waveform.Si("compressedWidth") > pulseS)
        {
            var compressed = waveform.Values["compressedWidth"];
            faults.Add(compressed, $"{compressed.Json.Shown()}, longer than the pulse", $"at most pulseWidth, {waveform.Values["pulseWidth"].Json.Shown()}");
        }

        foreach (var prf in Prfs(waveform).Where(prf => prf.Quantity.Si * pulseS >= 1))
        {
            faults.Add(
                prf,
                $"{prf.Json.Shown()}, too high for the pulse width {waveform.Values["pulseWidth"].Json.Shown()}: one pulse would run into the next",
                $"a PRF below 1 / pulseWidth = {QuantityText.Plain(1 / pulseS, 6)} Hz");
        }
    }

    private void Range(CheckedBlock waveform, CheckedBlock radar)
    {
        var rangeM = radar.Si("instrumentedRange");
        var highest = Prfs(waveform).MaxBy(prf => prf.Quantity.Si)!;
        var unambiguousM = RangeAmbiguity.UnambiguousRangeM(1 / highest.Quantity.Si);
        if (rangeM > unambiguousM)
        {
            var fittingHz = Math.Floor(Constants.SpeedOfLightMps / (2 * rangeM));
            faults.Add(
                radar.Values["instrumentedRange"],
                $"{radar.Values["instrumentedRange"].Json.Shown()}, beyond the unambiguous range of prf {highest.Json.Shown()}",
                $"at most {QuantityText.Plain(Math.Floor(unambiguousM) / 1000, 9)} km, or no PRF above {QuantityText.Plain(fittingHz, 9)} Hz");
        }
    }

    private void ShapedBeam(double tiltRad, CheckedBlock elevation)
    {
        var startRad = tiltRad + elevation.Si("beamwidth") / 2;
        var startText = QuantityText.Format(startRad, Dimension.Angle, "deg");
        if (startRad <= 0)
        {
            faults.Add(elevation, $"a cosecant-squared part that begins at {startText} (tilt + beamwidth / 2)", "a beginning above the horizontal: more tilt or a wider beam");
        }
        else if (elevation.Si("upTo") <= startRad)
        {
            var end = elevation.Values["upTo"];
            faults.Add(end, $"{end.Json.Shown()}, not above the cosecant-squared part's beginning", $"more than {startText} (tilt + beamwidth / 2)");
        }
    }
}
