using System.Text.Json;
using CsvHelper;
using Parquet;
using Parquet.Schema;

namespace ScanSim.Recordings.Columns;

/// <summary>The values of one column over a stretch of rows, in one array that is used again for the next stretch.</summary>
/// <remarks>A derived class says for one type how values look in each store and in the digest.</remarks>
internal abstract class ColumnValues(Column column)
{
    public Column Column { get; } = column;

    public int Count { get; protected set; }

    /// <summary>The column as a Parquet schema declares it.</summary>
    public abstract DataField Field { get; }

    /// <summary>Encoding in Parquet: what measured smallest for this type with zstd at its fastest level.</summary>
    public abstract EncodingHint Encoding { get; }

    public virtual void Clear() => Count = 0;

    /// <summary>Refuses values that no store can hold; <paramref name="firstRow"/> is the table's row number of the first value.</summary>
    public abstract void Check(string table, long firstRow);

    public abstract void AppendTo(ColumnDigest digest);

    public abstract Task WriteAsync(ParquetRowGroupWriter group, DataField field);

    public abstract ValueTask ReadAsync(ParquetRowGroupReader group, DataField field, int rows);

    public abstract void WriteCsv(CsvWriter writer, int row);

    /// <summary>Appends field <see cref="Columns.Column.Index"/> of the record at hand; FormatException if it is none of this type.</summary>
    public abstract void ReadCsv(CsvReader reader);

    /// <summary>Writes name and value.</summary>
    public abstract void WriteJson(Utf8JsonWriter writer, int row);

    /// <summary>Appends the value token that the reader stands on; FormatException or InvalidOperationException if it is none of this type.</summary>
    public abstract void ReadJson(ref Utf8JsonReader reader);
}

internal abstract class ColumnValues<TValue>(Column column) : ColumnValues(column)
{
    private TValue[] values = [];

    public TValue this[int row] => values[row];

    protected ReadOnlySpan<TValue> Values => values.AsSpan(0, Count);

    protected ReadOnlyMemory<TValue> Memory => values.AsMemory(0, Count);

    protected ArraySegment<TValue> Segment => new(values, 0, Count);

    /// <summary>Makes room for <paramref name="rows"/> more values and counts them in; the caller sets them all.</summary>
    public Span<TValue> Extend(int rows)
    {
        var start = Count;
        if (start + rows > values.Length)
        {
            Array.Resize(ref values, Math.Max(start + rows, Math.Max(256, 2 * values.Length)));
        }

        Count = start + rows;
        return values.AsSpan(start, rows);
    }

    public void Append(TValue value) => Extend(1)[0] = value;

    protected Memory<TValue> Renew(int rows)
    {
        Clear();
        Extend(rows);
        return values.AsMemory(0, rows);
    }

    protected InvalidOperationException Refusal(string table, long row, string reason) =>
        new($"{table}.{Column.Name}, row {row}: {reason}");
}
