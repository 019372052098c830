using ScanSim.Physics.Waveforms;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>The range cells in which the receiver listens during a dwell: from the end of the transmitted pulse to the instrumented range.</summary>
internal readonly record struct RangeCells(int First, int Count, double CellM)
{
    public static RangeCells Of(Radar radar, double priS)
    {
        var cellM = RangeResolution.CellM(radar.Waveform.CompressedWidthS);
        var farthestM = Math.Min(radar.InstrumentedRangeM, RangeAmbiguity.UnambiguousRangeM(priS));
        var first = (int)Math.Ceiling(RangeResolution.CellM(radar.Waveform.PulseWidthS) / cellM);
        return new RangeCells(first, Math.Max(0, (int)Math.Floor(farthestM / cellM) - first), cellM);
    }
}
