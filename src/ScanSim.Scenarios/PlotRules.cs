namespace ScanSim.Scenarios;

/// <summary>How neighbouring hits become one plot.</summary>
public sealed record PlotRules
{
    /// <summary>Hits join when their range cells differ by at most this many.</summary>
    public required int RangeGapCells { get; init; }

    /// <summary>Dwells without a hit that a plot may bridge.</summary>
    public required int AzimuthGapDwells { get; init; }

    /// <summary>Fewer hits make no plot.</summary>
    public required int MinimumHits { get; init; }

    /// <summary>A plot wider than this in azimuth is closed and a new one begun.</summary>
    public required double MaximumWidthRad { get; init; }
}
