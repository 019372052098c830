namespace ScanSim.Scenarios;

/// <summary>Random errors of the instrument itself (encoder, timing, quantisation), one standard deviation, added to each plot beside the noise-made ones.</summary>
public sealed record InstrumentErrors
{
    public required double RangeSigmaM { get; init; }

    public required double AzimuthSigmaRad { get; init; }
}
