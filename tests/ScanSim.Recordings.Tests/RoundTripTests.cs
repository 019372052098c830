using CsCheck;

namespace ScanSim.Recordings.Tests;

public sealed class RoundTripTests
{
    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void Every_row_reads_back_bit_for_bit(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        RowGenerators.All.Sample(
            rows => RowSet.Of(Samples.Write(folder.Recording, rows, format, blockRows: 16)).HasSameBits(rows),
            iter: 60,
            threads: 1,
            seed: "0000KOIPe303"
        );
    }
}
