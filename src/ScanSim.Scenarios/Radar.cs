using System.Collections.Immutable;

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
}
