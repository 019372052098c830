using CsCheck;
using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings.Tests;

/// <summary>Heads and rows that tests write when any will do.</summary>
internal static class Samples
{
    public static readonly RecordingHead Head = new()
    {
        ScenarioName = "Breakwater",
        ScenarioDigest = "3f0a",
        ScenarioText = "{\n  // a comment, ü\n  \"site\": {}\n}\n",
        ProgramVersion = "0.1.0",
        Seed = ulong.MaxValue,
        StartUtc = new DateTimeOffset(2026, 5, 1, 8, 0, 0, 250, TimeSpan.FromHours(2)),
        DurationS = 600.5,
        Looks = LooksKept.All,
        Format = TableFormat.Parquet,
    };

    public static TheoryData<TableFormat> Formats => [.. Enum.GetValues<TableFormat>()];

    /// <summary>The same rows on each call.</summary>
    public static RowSet Rows { get; } =
        new(
            RowGenerators.Fixed(RowGenerators.Scan.Array[40]),
            RowGenerators.Fixed(RowGenerators.Look.Array[700]),
            RowGenerators.Fixed(RowGenerators.Hit.Array[300]),
            RowGenerators.Fixed(RowGenerators.Plot.Array[200]),
            RowGenerators.Fixed(RowGenerators.Truth.Array[200])
        );

    public static Recording Write(string folder, RowSet rows, TableFormat format, int blockRows = 1 << 16)
    {
        using (var writer = RecordingWriter.Create(folder, Head with { Format = format }, force: true, new WriterSettings { BlockRows = blockRows }))
        {
            rows.AddTo(writer);
            writer.Complete();
        }

        return Recording.Open(folder);
    }
}
