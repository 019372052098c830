using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>A threshold crossing on its way to the plot extractor.</summary>
internal readonly record struct Hit
{
    public required double TimeS { get; init; }

    public required int Scan { get; init; }

    public required long Dwell { get; init; }

    public required int Cell { get; init; }

    public required double BeamAzimuthRad { get; init; }

    /// <summary>Measured, perhaps folded.</summary>
    public required double RangeM { get; init; }

    /// <summary>Statistic minus number of pulses: the signal-to-noise ratio summed over the dwell, as measured.</summary>
    public required double SummedSnrRatio { get; init; }

    public required int Pulses { get; init; }

    public required EchoKind Kind { get; init; }

    /// <summary>Id, or ids joined by '+', the strongest first; empty for noise.</summary>
    public required string Target { get; init; }

    /// <summary>Draw address of the strongest target; 0 for noise.</summary>
    public required uint Entity { get; init; }
}
