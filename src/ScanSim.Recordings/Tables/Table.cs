using System.Collections.Immutable;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Tables;

/// <summary>The one declaration of a table, from which every store, the digests and the page docs/recording.md are made.</summary>
internal abstract class Table(string name, string rowMeaning)
{
    public string Name { get; } = name;

    public string RowMeaning { get; } = rowMeaning;

    public abstract ImmutableArray<Column> Columns { get; }

    /// <summary>Column by which a time span is selected; null if the table has none.</summary>
    public Column? TimeColumn => Columns.FirstOrDefault(column => column.IsTime);

    public ColumnBlock CreateBlock() => new(Columns);
}

/// <summary>Declares columns in its constructor and builds a row back from their values.</summary>
internal abstract class Table<TRow>(string name, string rowMeaning) : Table(name, rowMeaning)
{
    private ImmutableArray<Column<TRow>> columns = [];

    public override ImmutableArray<Column> Columns => ImmutableArray<Column>.CastUp(columns);

    public abstract TRow Build(ColumnBlock block, int row);

    public void Fill(ReadOnlySpan<TRow> rows, ColumnBlock block)
    {
        foreach (var column in columns)
        {
            column.Fill(rows, block[column.Index]);
        }
    }

    protected Column<TRow, double> Number(string column, string? unit, string description, RowValue<TRow, double> value) =>
        Declare(column, unit, description, ColumnTypes.Number, value);

    protected Column<TRow, double?> NumberOrNull(string column, string? unit, string description, RowValue<TRow, double?> value) =>
        Declare(column, unit, description, ColumnTypes.NumberOrNull, value);

    protected Column<TRow, int> Count(string column, string description, RowValue<TRow, int> value) =>
        Declare(column, null, description, ColumnTypes.Count, value);

    protected Column<TRow, long> LongCount(string column, string description, RowValue<TRow, long> value) =>
        Declare(column, null, description, ColumnTypes.LongCount, value);

    protected Column<TRow, bool> Flag(string column, string description, RowValue<TRow, bool> value) =>
        Declare(column, null, description, ColumnTypes.Flag, value);

    protected Column<TRow, string> Text(string column, string description, RowValue<TRow, string> value) =>
        Declare(column, null, description, ColumnTypes.Text, value);

    private Column<TRow, TValue> Declare<TValue>(
        string column,
        string? unit,
        string description,
        ColumnType<TValue> type,
        RowValue<TRow, TValue> value
    )
    {
        var declared = new Column<TRow, TValue>(columns.Length, column, unit, description, type, value);
        columns = columns.Add(declared);
        return declared;
    }
}
