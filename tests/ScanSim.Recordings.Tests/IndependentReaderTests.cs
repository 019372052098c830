using ParquetSharp;

namespace ScanSim.Recordings.Tests;

/// <summary>The Parquet files as another implementation reads them.</summary>
public sealed class IndependentReaderTests
{
    [Fact]
    public void Another_Parquet_reader_finds_the_same_names_types_and_values()
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet, blockRows: 256);
        Compare(folder, "scans", Samples.Rows.Scans);
        Compare(folder, "looks", Samples.Rows.Looks);
        Compare(folder, "hits", Samples.Rows.Hits);
        Compare(folder, "plots", Samples.Rows.Plots);
        Compare(folder, "truth", Samples.Rows.Truth);
    }

    [Fact]
    public void An_empty_table_is_a_readable_file_with_its_columns()
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, new RowSet([], [], [], [], []), TableFormat.Parquet);
        using var reader = new ParquetFileReader(Path.Combine(folder.Recording, "looks.parquet"));
        Assert.Equal(0, reader.FileMetaData.NumRows);
        Assert.Equal(typeof(LookRow).GetProperties().Length, reader.FileMetaData.NumColumns);
    }

    [Fact]
    public void Row_groups_state_the_least_and_greatest_time()
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet, blockRows: 256);
        using var reader = new ParquetFileReader(Path.Combine(folder.Recording, "looks.parquet"));
        for (var group = 0; group < reader.FileMetaData.NumRowGroups; group++)
        {
            using var groupReader = reader.RowGroup(group);
            var times = Samples.Rows.Looks.Skip(256 * group).Take(256).Select(row => row.TimeS).ToArray();
            var statistics = Assert.IsType<Statistics<double>>(groupReader.MetaData.GetColumnChunkMetaData(0).Statistics);
            Assert.Equal(times.Min(), statistics.Min);
            Assert.Equal(times.Max(), statistics.Max);
        }
    }

    private static void Compare<TRow>(TemporaryFolder folder, string table, TRow[] rows)
    {
        using var reader = new ParquetFileReader(Path.Combine(folder.Recording, table + ".parquet"));
        var properties = typeof(TRow).GetProperties();
        var names = Enumerable.Range(0, reader.FileMetaData.NumColumns).Select(i => reader.FileMetaData.Schema.Column(i).Name);
        Assert.Equal(properties.Select(property => SnakeCase(property.Name)), names, StringComparer.Ordinal);
        for (var column = 0; column < properties.Length; column++)
        {
            var expected = rows.Select(row => Stored(properties[column].GetValue(row))).ToArray();
            Assert.Equal(expected, Values(reader, column));
        }
    }

    private static object?[] Values(ParquetFileReader reader, int column)
    {
        var values = new List<object?>();
        for (var group = 0; group < reader.FileMetaData.NumRowGroups; group++)
        {
            using var groupReader = reader.RowGroup(group);
            using var columnReader = groupReader.Column(column).LogicalReader();
            values.AddRange(columnReader.Apply(new AllValues()));
        }

        return [.. values];
    }

    /// <summary>Doubles by their bits, enumerations by the words that files hold for them.</summary>
    private static object? Stored(object? value) =>
        value switch
        {
            double number => BitConverter.DoubleToInt64Bits(number).ToString("x16"),
            LossReason.None => "",
            Enum word => SnakeCase(word.ToString()).Replace('_', ' '),
            _ => value,
        };

    private static string SnakeCase(string name) => string.Concat(name.Select((letter, i) => char.IsUpper(letter) ? (i > 0 ? "_" : "") + char.ToLowerInvariant(letter) : letter.ToString()));

    private sealed class AllValues : ILogicalColumnReaderVisitor<IEnumerable<object?>>
    {
        public IEnumerable<object?> OnLogicalColumnReader<TValue>(LogicalColumnReader<TValue> columnReader) =>
            columnReader.Select(value => Stored(value)).ToArray();
    }
}
