using System.Collections.Immutable;

namespace ScanSim.Scenarios;

/// <summary>The pulse and its repetition.</summary>
public sealed record Waveform
{
    /// <summary>Transmitted pulse length.</summary>
    public required double PulseWidthS { get; init; }

    /// <summary>Length after compression; equal to <see cref="PulseWidthS"/> for a plain pulse. Noise bandwidth is 1 / this, energy gain pulse / compressed.</summary>
    public required double CompressedWidthS { get; init; }

    /// <summary>Pulse repetition frequencies; more than one: each dwell uses the next one in turn.</summary>
    public required ImmutableArray<double> PrfHz { get; init; }
}
