using System.Buffers.Binary;
using System.Security.Cryptography;
using System.Text;

namespace ScanSim.Recordings.Tests;

public sealed class DigestTests
{
    [Fact]
    public void Digests_are_the_same_in_every_format_and_for_every_block_size()
    {
        using var folder = new TemporaryFolder();
        var first = Digests(Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet));
        foreach (var format in Enum.GetValues<TableFormat>())
        {
            foreach (var blockRows in new[] { 1, 7, 256, 1000 })
            {
                Assert.Equal(first, Digests(Samples.Write(folder.Recording, Samples.Rows, format, blockRows)));
            }
        }
    }

    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void A_recording_as_it_was_written_is_verified(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, format, blockRows: 100).Verify();
    }

    [Fact]
    public void A_changed_value_changes_the_digest_of_its_column_and_table_alone()
    {
        using var folder = new TemporaryFolder();
        var before = Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet);
        var rows = Samples.Rows with { Looks = [.. Samples.Rows.Looks] };
        rows.Looks[699] = rows.Looks[699] with { RcsDb = rows.Looks[699].RcsDb is double.MaxValue ? 0 : double.BitIncrement(rows.Looks[699].RcsDb) };
        var after = Samples.Write(folder.Recording, rows, TableFormat.Parquet);

        var changed = before.Tables.Keys.Where(table => before.Tables[table].Digest != after.Tables[table].Digest);
        Assert.Equal(["looks"], changed, StringComparer.Ordinal);
        var (old, renewed) = (before.Tables["looks"].ColumnDigests, after.Tables["looks"].ColumnDigests);
        Assert.Equal(["rcs_db"], old.Keys.Where(column => old[column] != renewed[column]), StringComparer.Ordinal);
    }

    [Fact]
    public void Negative_zero_has_another_digest_than_zero()
    {
        var scan = new ScanRow { Scan = 0, StartS = 0.0, EndS = 4, Looks = 0, Hits = 0, FalseHits = 0, Plots = 0, FalsePlots = 0 };
        Assert.NotEqual(DigestOf(scan), DigestOf(scan with { StartS = -0.0 }), StringComparer.Ordinal);
    }

    /// <summary>An independent reading of the definition in docs/recording.md, written from the page and not from the program.</summary>
    [Fact]
    public void Digests_follow_the_documented_definition()
    {
        using var folder = new TemporaryFolder();
        var table = Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet).Tables["looks"];
        var looks = Samples.Rows.Looks;
        Assert.Equal(Sha(looks.SelectMany(row => Eight(BitConverter.DoubleToInt64Bits(row.SnrDb)))), table.ColumnDigests["snr_db"]);
        Assert.Equal(Sha(looks.SelectMany(row => Four(row.Pulses))), table.ColumnDigests["pulses"]);
        Assert.Equal(Sha(looks.SelectMany(row => Eight(row.Dwell))), table.ColumnDigests["dwell"]);
        Assert.Equal(Sha(looks.Select(row => row.Detected ? (byte)1 : (byte)0)), table.ColumnDigests["detected"]);
        Assert.Equal(Sha(looks.SelectMany(row => Text(row.Target))), table.ColumnDigests["target"]);
        Assert.Equal(
            Sha(looks.SelectMany(row => row.FluctuationDb is { } drawn ? [1, .. Eight(BitConverter.DoubleToInt64Bits(drawn))] : new byte[] { 0 })),
            table.ColumnDigests["fluctuation_db"]
        );
        var columns = LookColumns.Select(column => (IEnumerable<byte>)[.. Text(column), .. Convert.FromHexString(table.ColumnDigests[column])]);
        Assert.Equal(Sha(columns.SelectMany(bytes => bytes)), table.Digest);
    }

    private static readonly string[] LookColumns =
    [
        "time_s", "scan", "dwell", "target", "range_m", "azimuth_deg", "elevation_deg", "radial_speed_mps", "beam_azimuth_deg", "pulses",
        "radar_db", "rcs_db", "spreading_db", "azimuth_beam_db", "elevation_beam_db", "eclipsing_db", "snr_db", "pd", "fluctuation_db",
        "statistic_db", "detected", "lost_to", "targets_in_cell",
    ];

    private static string DigestOf(ScanRow scan)
    {
        using var folder = new TemporaryFolder();
        return Samples.Write(folder.Recording, new RowSet([scan], [], [], [], []), TableFormat.Parquet).Tables["scans"].Digest;
    }

    private static Dictionary<string, string> Digests(Recording recording) =>
        recording.Tables.OrderBy(table => table.Key, StringComparer.Ordinal).ToDictionary(table => table.Key, table => table.Value.Digest, StringComparer.Ordinal);

    private static string Sha(IEnumerable<byte> bytes) => Convert.ToHexStringLower(SHA256.HashData(bytes.ToArray()));

    private static byte[] Eight(long value)
    {
        var bytes = new byte[8];
        BinaryPrimitives.WriteInt64LittleEndian(bytes, value);
        return bytes;
    }

    private static byte[] Four(int value) => Eight(value)[..4];

    private static byte[] Text(string text) => [.. Four(Encoding.UTF8.GetByteCount(text)), .. Encoding.UTF8.GetBytes(text)];
}
