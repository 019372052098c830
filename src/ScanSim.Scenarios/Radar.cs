using System.Collections.Immutable;
using ScanSim.Physics;
using ScanSim.Physics.Waveforms;

namespace ScanSim.Scenarios;

/// <summary>The radar as its data sheet gives it.</summary>
public sealed record Radar
{
    public required double CarrierHz { get; init; }

    public required double PeakPowerW { get; init; }

    public required Antenna Antenna { get; init; }

    public required Scan Scan { get; init; }

    /// <summary>Azimuth sectors in which the transmitter is off; clockwise from From to To. Empty by default.</summary>
    public required ImmutableArray<AzimuthSector> Blanked { get; init; }

    public required Waveform Waveform { get; init; }

    public required Receiver Receiver { get; init; }

    public required Losses Losses { get; init; }

    public required Processing Processing { get; init; }

    /// <summary>Slant range up to which the receiver looks for targets.</summary>
    public required double InstrumentedRangeM { get; init; }

    public required PlotRules Plots { get; init; }

    public required InstrumentErrors Accuracy { get; init; }

    /// <summary>The radar equation with a target of 1 m² at 1 m, at the peak of the beam: all that no target changes.</summary>
    public RadarEquationTerms EquationTerms() => new()
    {
        PeakPowerW = PeakPowerW,
        TransmitGainRatio = Antenna.GainRatio,
        ReceiveGainRatio = Antenna.GainRatio,
        WavelengthM = Constants.SpeedOfLightMps / CarrierHz,
        RcsM2 = 1,
        RangeM = 1,
        LossRatio = Losses.TotalRatio,
        NoiseTemperatureK = Receiver.SystemTemperatureK,
        NoiseBandwidthHz = 1 / Waveform.CompressedWidthS,
        EnergyGainRatio = Waveform.PulseWidthS / Waveform.CompressedWidthS,
    };

    /// <summary>Time the beam takes over half the widest plot: a plot belongs to the pass over its target that is no further away in time.</summary>
    public double PlotReachS => 0.5 * Plots.MaximumWidthRad / Scan.BeamSpeedRadPerS;

    /// <summary>Pulses of a dwell at one of the PRFs: the number given, or those within one half-power beamwidth, rounded, at least 1.</summary>
    public int PulsesPerDwell(double prfHz) =>
        Processing.PulsesPerDwell ?? Math.Max(1, (int)Math.Round(BeamwidthPulses.Count(Antenna.Azimuth.BeamwidthRad, prfHz, Scan.BeamSpeedRadPerS)));
}
