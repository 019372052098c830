using ScanSim.Physics;
using ScanSim.Physics.Antennas;
using ScanSim.Scenarios;

namespace ScanSim.Display.Explaining;

/// <summary>What a dwell loses to the beam's shape even when its middle points at the target: part of the expectation, not of the reasons.</summary>
internal sealed class BeamShape(Radar radar)
{
    private readonly SampledPattern azimuth = new(radar.Antenna.Azimuth.ToPattern(radar.Antenna.TiltRad), radar.Antenna.SideLobeFloorRatio);
    private readonly Dictionary<int, double> levels = [];

    /// <summary>Two-way level of a centred dwell of so many pulses, ≤ 0; with several PRFs of as many pulses their mean interval.</summary>
    public double CentredDb(int pulses)
    {
        if (!levels.TryGetValue(pulses, out var levelDb))
        {
            var prfs = radar.Waveform.PrfHz.Where(prfHz => radar.PulsesPerDwell(prfHz) == pulses).DefaultIfEmpty(radar.Waveform.PrfHz[0]);
            var stepRad = radar.Scan.BeamSpeedRadPerS * prfs.Average(prfHz => 1 / prfHz);
            levels[pulses] = levelDb = Decibels.FromRatio(CentredDwell.MeanTwoWayRatio(azimuth, stepRad, pulses));
        }

        return levelDb;
    }
}
