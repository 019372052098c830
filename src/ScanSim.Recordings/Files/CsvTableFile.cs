using CsvHelper;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

/// <summary>Comma-separated values after RFC 4180, but with line feeds alone; numbers read back to the same bits.</summary>
internal sealed class CsvTableFile : ITableFile
{
    private readonly CsvWriter writer;

    public CsvTableFile(Stream stream, ColumnBlock block)
    {
        var options = new CsvWriterOptions { NewLine = "\n", TrueValue = "true", FalseValue = "false" };
        writer = CsvWriter.Create(stream, options, leaveOpen: true);
        writer.WriteRecord([.. block.Columns.Select(values => values.Column.Name)]);
    }

    public void Write(ColumnBlock block)
    {
        for (var row = 0; row < block.Count; row++)
        {
            foreach (var values in block.Columns)
            {
                values.WriteCsv(writer, row);
            }

            writer.EndRecord();
        }
    }

    public void Finish() => writer.Flush();
}
