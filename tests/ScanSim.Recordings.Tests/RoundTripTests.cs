using CsCheck;

namespace ScanSim.Recordings.Tests;

public sealed class RoundTripTests
{
    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void Every_row_reads_back_bit_for_bit(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        foreach (var rows in RowGenerators.Fixed(RowGenerators.All.Array[60]))
        {
            Assert.True(RowSet.Of(Samples.Write(folder.Recording, rows, format, blockRows: 16)).HasSameBits(rows));
        }
    }
}
