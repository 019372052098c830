using System.Collections.Immutable;
using ScanSim.Recordings.Columns;
using ScanSim.Recordings.Files;

namespace ScanSim.Recordings.Tables;

/// <summary>Reads a table block by block; whatever goes wrong comes out as a <see cref="RecordingException"/> that names the file.</summary>
internal sealed class TableReader : IDisposable
{
    private readonly string path;
    private readonly ColumnBlock block;
    private readonly long expectedRows;
    private readonly TimeSpanS span;
    private readonly Column? time;
    private readonly Stream stream;
    private readonly ITableSource source;
    private long rows;

    /// <summary>Opens a table's file.</summary>
    /// <param name="path">The file.</param>
    /// <param name="table">What it holds.</param>
    /// <param name="format">Its store.</param>
    /// <param name="expectedRows">As the manifest says.</param>
    /// <param name="span">Times wanted.</param>
    /// <param name="columns">Those that are needed, the first one among them; a store may leave the others empty. Default: all.</param>
    public TableReader(string path, Table table, TableFormat format, long expectedRows, TimeSpanS span, ImmutableArray<Column> columns = default)
    {
        this.path = path;
        this.expectedRows = expectedRows;
        this.span = span;
        time = span.IsEverything ? null : table.TimeColumn;
        block = table.CreateBlock();
        stream = FileFault.Reading(path, () => new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read, 1 << 16));
        try
        {
            source = Guard(() => TableStores.Open(format, stream, table, columns.IsDefault ? table.Columns : columns, span, expectedRows));
        }
        catch
        {
            stream.Dispose();
            throw;
        }
    }

    /// <summary>The next rows, valid until the next call; null at the end.</summary>
    public ColumnBlock? Next()
    {
        block.Clear();
        var found = Guard(() => source.Read(block));
        rows += block.Count;
        if (rows > expectedRows || (!found && span.IsEverything && rows != expectedRows))
        {
            throw new RecordingException($"{path} has {(found ? "more than " : "")}{(found ? expectedRows : rows)} rows, recording.json says {expectedRows}");
        }

        return found ? block : null;
    }

    public bool IsWithin(ColumnBlock from, int row) => time is null || span.Contains(((ColumnValues<double>)from[time.Index])[row]);

    public TRow Build<TRow>(Table<TRow> table, ColumnBlock from, int row) => Build(table.Build, from, row);

    public TRow Build<TRow>(Func<ColumnBlock, int, TRow> build, ColumnBlock from, int row)
    {
        try
        {
            return build(from, row);
        }
        catch (FormatException fault)
        {
            throw Damaged(fault);
        }
    }

    public void Dispose()
    {
        source.Dispose();
        stream.Dispose();
    }

    // Every exception, because a damaged file makes the libraries throw nearly anything: index, overflow, memory, argument.
    private T Guard<T>(Func<T> read)
    {
        try
        {
            return read();
        }
        catch (Exception fault) when (fault is not RecordingException)
        {
            throw Damaged(fault);
        }
    }

    private RecordingException Damaged(Exception fault) => new($"{path} cannot be read, it is damaged or was changed: {fault.Message}", fault);
}
