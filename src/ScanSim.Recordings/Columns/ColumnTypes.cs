namespace ScanSim.Recordings.Columns;

internal static class ColumnTypes
{
    public static readonly ColumnType<double> Number = new("double", column => new NumberValues(column));

    public static readonly ColumnType<double?> NumberOrNull = new("double?", column => new NumberOrNullValues(column));

    public static readonly ColumnType<int> Count = new("int32", column => new CountValues(column));

    public static readonly ColumnType<long> LongCount = new("int64", column => new LongCountValues(column));

    public static readonly ColumnType<bool> Flag = new("bool", column => new FlagValues(column));

    public static readonly ColumnType<string> Text = new("text", column => new TextValues(column));
}
