namespace ScanSim.Recordings;

/// <summary>Where a run puts its rows, in the order of the tables: by scan, then by time.</summary>
/// <remarks>Spans are only valid during the call. Implementations: the recording writer for files, and counting or collecting sinks in tests and studies.</remarks>
public interface IRecordingSink
{
    void AddScan(in ScanRow row);

    void AddLooks(ReadOnlySpan<LookRow> rows);

    void AddHits(ReadOnlySpan<HitRow> rows);

    void AddPlots(ReadOnlySpan<PlotRow> rows);

    void AddTruth(ReadOnlySpan<TruthRow> rows);
}
