using ScanSim.Recordings.Columns;
using ScanSim.Recordings.Files;

namespace ScanSim.Recordings.Tables;

/// <summary>Gathers rows into blocks, digests each block and hands it to the store.</summary>
/// <remarks>Where a block ends depends on the rows alone, not on how they come in portions: equal rows give equal bytes.</remarks>
internal sealed class TableWriter<TRow> : IDisposable
{
    /// <summary>Rows taken into the columns at a time, small enough for the first cache; blocks end at multiples of it.</summary>
    private const int StrideRows = 256;

    /// <summary>A block with more characters than this is closed early, so that long texts do not make memory grow.</summary>
    private const long MostCharacters = 1 << 22;

    private readonly Table<TRow> table;
    private readonly string path;
    private readonly int blockRows;
    private readonly ColumnBlock block;
    private readonly TableDigest digest;
    private readonly Stream stream;
    private readonly ITableFile file;
    private long written;
    private long characters;

    public TableWriter(Table<TRow> table, string path, TableFormat format, WriterSettings settings)
    {
        if (!BitConverter.IsLittleEndian)
        {
            throw new PlatformNotSupportedException("Digests take the values as they lie in memory, little-endian.");
        }

        this.table = table;
        this.path = path;
        blockRows = settings.BlockRows;
        block = table.CreateBlock();
        digest = new TableDigest(table.Columns);
        stream = settings.OpenFile(path);
        file = TableStores.Create(format, stream, block);
    }

    public void Add(ReadOnlySpan<TRow> rows)
    {
        while (rows.Length > 0)
        {
            var taken = Math.Min(rows.Length, Math.Min(StrideRows - block.Count % StrideRows, blockRows - block.Count));
            table.Fill(rows[..taken], block);
            characters += block.Characters(block.Count - taken);
            rows = rows[taken..];
            if (block.Count == blockRows || (block.Count % StrideRows == 0 && characters > MostCharacters))
            {
                Store();
            }
        }
    }

    /// <summary>Writes out what is left and closes the file, on the disk and not only in the system's memory.</summary>
    public TableInfo Finish(string name)
    {
        if (block.Count > 0)
        {
            Store();
        }

        long bytes = 0;
        FileFault.Writing(path, () =>
        {
            file.Finish();
            stream.Flush();
            bytes = stream.Length;
            (stream as FileStream)?.Flush(flushToDisk: true);
            stream.Dispose();
        });
        return new TableInfo { File = name, Rows = written, Bytes = bytes, Digest = digest.Whole(), ColumnDigests = digest.ByColumn() };
    }

    /// <summary>Closes the file as it is; harmless after <see cref="Finish"/>.</summary>
    public void Dispose()
    {
        digest.Dispose();
        (file as IDisposable)?.Dispose();
        try
        {
            stream.Dispose();
        }
        catch (IOException)
        {
            // A disk that was full is full still: the file is given up anyway.
        }
    }

    private void Store()
    {
        foreach (var values in block.Columns)
        {
            values.Check(table.Name, written);
        }

        digest.Append(block);
        FileFault.Writing(path, () => file.Write(block));
        written += block.Count;
        characters = 0;
        block.Clear();
    }
}
