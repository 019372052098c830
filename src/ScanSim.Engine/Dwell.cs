namespace ScanSim.Engine;

/// <summary>A group of pulses that are processed together, and where the beam is meanwhile.</summary>
/// <remarks>default(Dwell) has no pulses and is never looked at.</remarks>
public readonly record struct Dwell
{
    /// <summary>Counts from the start of the run, over all scans.</summary>
    public required long Index { get; init; }

    public required int Scan { get; init; }

    /// <summary>Which of the waveform's PRFs it uses.</summary>
    public required int PrfIndex { get; init; }

    public required int Pulses { get; init; }

    /// <summary>Half-way between the first and the last pulse.</summary>
    public required double MiddleS { get; init; }

    /// <summary>Pulse repetition interval.</summary>
    public required double PriS { get; init; }

    /// <summary>Beam azimuth at <see cref="MiddleS"/>, in [0, 2π) from true north.</summary>
    public required double BeamAzimuthRad { get; init; }

    /// <summary>Positive clockwise.</summary>
    public required double BeamRateRadPerS { get; init; }
}
