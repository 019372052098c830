using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

/// <summary>One store's way to write a table, block by block, to a stream that the caller owns.</summary>
internal interface ITableFile
{
    void Write(ColumnBlock block);

    /// <summary>Writes what must stand at the end. A table without it is not whole.</summary>
    void Finish();
}
