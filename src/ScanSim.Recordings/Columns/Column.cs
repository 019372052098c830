using System.Text.Json;

namespace ScanSim.Recordings.Columns;

/// <summary>What a column of a table is called and means, whatever the store.</summary>
internal abstract class Column(int index, string name, string? unit, string description)
{
    /// <summary>Place in the table, from 0.</summary>
    public int Index { get; } = index;

    public string Name { get; } = name;

    /// <summary>Unit of the values; null for counts, texts and flags.</summary>
    public string? Unit { get; } = unit;

    public string Description { get; } = description;

    public JsonEncodedText JsonName { get; } = JsonEncodedText.Encode(name);

    /// <summary>Whether time spans are selected by this column.</summary>
    public bool IsTime { get; } = string.Equals(name, "time_s", StringComparison.Ordinal);

    /// <summary>Type as the manifest names it.</summary>
    public abstract string Type { get; }

    public abstract ColumnValues CreateValues();
}

/// <summary>A column that can be filled from the rows of its table.</summary>
internal abstract class Column<TRow>(int index, string name, string? unit, string description)
    : Column(index, name, unit, description)
{
    public abstract void Fill(ReadOnlySpan<TRow> rows, ColumnValues values);
}

/// <summary>The full declaration: how a row gives the value and where a row being built finds it again.</summary>
internal sealed class Column<TRow, TValue>(
    int index,
    string name,
    string? unit,
    string description,
    ColumnType<TValue> type,
    RowValue<TRow, TValue> value
) : Column<TRow>(index, name, unit, description)
{
    public override string Type => type.Name;

    public TValue this[ColumnBlock block, int row] => ((ColumnValues<TValue>)block[Index])[row];

    public override ColumnValues CreateValues() => type.Create(this);

    public override void Fill(ReadOnlySpan<TRow> rows, ColumnValues values)
    {
        var target = ((ColumnValues<TValue>)values).Extend(rows.Length);
        for (var i = 0; i < rows.Length; i++)
        {
            target[i] = value(in rows[i]);
        }
    }
}
