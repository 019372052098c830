using System.Collections.Immutable;

namespace ScanSim.Recordings.Columns;

/// <summary>A stretch of rows of one table, column by column; cleared and filled again for the next stretch.</summary>
internal sealed class ColumnBlock
{
    private readonly ImmutableArray<TextValues> texts;

    public ColumnBlock(IEnumerable<Column> columns)
    {
        Columns = [.. columns.Select(column => column.CreateValues())];
        texts = [.. Columns.OfType<TextValues>()];
    }

    public ImmutableArray<ColumnValues> Columns { get; }

    public int Count => Columns[0].Count;

    public ColumnValues this[int column] => Columns[column];

    public long Characters(int fromRow)
    {
        long characters = 0;
        foreach (var values in texts)
        {
            characters += values.Characters(fromRow);
        }

        return characters;
    }

    public void Clear()
    {
        foreach (var values in Columns)
        {
            values.Clear();
        }
    }
}
