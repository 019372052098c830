using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

/// <summary>One store's way to read a table back, block by block, from a stream that the caller owns.</summary>
/// <remarks>Faults in the data come out as any exception; the caller makes them into one that names the file.</remarks>
internal interface ITableSource : IDisposable
{
    /// <summary>Fills the cleared block with the next rows; false at the end.</summary>
    bool Read(ColumnBlock block);
}
