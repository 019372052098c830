using System.Globalization;
using ScanSim.Physics.Waveforms;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>What the engine can count: addresses of draws are 32 bits wide, range cells and dwells of a scan are counted in buffers.</summary>
public static class RunLimits
{
    public const long MostDwells = uint.MaxValue;
    public const int MostDwellsInScan = 1 << 20;
    public const int MostCells = 1 << 24;
    public const int MostTargets = 1 << 20;

    /// <summary>One less than the largest draw index, which stands for the pass before the first turn.</summary>
    public const int MostScans = int.MaxValue - 1;

    /// <summary>The first limit that a scenario breaks, in words for the user; null when it can be run.</summary>
    public static string? Broken(Scenario scenario)
    {
        var radar = scenario.Radar;
        var scanS = radar.Scan.ScanS;
        var scans = scenario.Run.DurationS / scanS;
        if (scans > MostScans || scenario.Run.DurationS * DwellGrid.PicosecondsPerSecond > long.MaxValue / 2)
        {
            return Text($"a run of {scenario.Run.DurationS:0.###} s has {scans:0} scans; at most {MostScans} scans and 53 days can be run");
        }

        var timeline = ScanTimeline.Of(scenario);
        var dwellsInScan = scanS / timeline.Grid.MeanDwellS;
        if (dwellsInScan * scans > MostDwells || dwellsInScan > MostDwellsInScan)
        {
            return Text($"a run of {scenario.Run.DurationS:0.###} s has {dwellsInScan * scans:0} dwells, {dwellsInScan:0} a scan; at most {MostDwells} and {MostDwellsInScan} can be run");
        }

        var cells = radar.InstrumentedRangeM / RangeResolution.CellM(radar.Waveform.CompressedWidthS);
        if (cells > MostCells || scenario.Targets.Length > MostTargets)
        {
            return Text($"{cells:0} range cells and {scenario.Targets.Length} targets; at most {MostCells} and {MostTargets} can be run");
        }

        return null;
    }

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
