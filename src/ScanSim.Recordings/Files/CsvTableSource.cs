using System.Collections.Immutable;
using CsvHelper;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

internal sealed class CsvTableSource : ITableSource
{
    private const int BlockRows = 4096;

    private readonly CsvReader reader;

    public CsvTableSource(Stream stream, ImmutableArray<Column> columns)
    {
        var options = new CsvReaderOptions
        {
            Separator = ',',
            MalformedData = CsvMalformedDataHandling.Throw,
            FieldCountMismatch = CsvFieldCountHandling.Throw,
            PoolStrings = true,
        };
        reader = CsvReader.Create(stream, options, leaveOpen: true);
        reader.ReadHeader();
        if (!reader.Headers.SequenceEqual(columns.Select(column => column.Name), StringComparer.Ordinal))
        {
            throw new FormatException($"its columns are {string.Join(',', reader.Headers)}, expected {string.Join(',', columns.Select(column => column.Name))}");
        }
    }

    public bool Read(ColumnBlock block)
    {
        while (block.Count < BlockRows && reader.Read())
        {
            foreach (var values in block.Columns)
            {
                Read(values);
            }
        }

        return block.Count > 0;
    }

    public void Dispose() => reader.Dispose();

    private void Read(ColumnValues values)
    {
        try
        {
            values.ReadCsv(reader);
        }
        catch (FormatException fault)
        {
            throw new FormatException($"row {reader.RowNumber}, {values.Column.Name}: {fault.Message}", fault);
        }
    }
}
