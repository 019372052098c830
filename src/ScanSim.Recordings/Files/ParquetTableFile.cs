using System.Collections.Immutable;
using System.IO.Compression;
using Parquet;
using Parquet.Schema;
using ScanSim.Recordings.Columns;

namespace ScanSim.Recordings.Files;

/// <summary>Parquet: one row group a block, zstd.</summary>
internal sealed class ParquetTableFile : ITableFile
{
    private readonly ImmutableArray<DataField> fields;
    private readonly ParquetWriter writer;

    public ParquetTableFile(Stream stream, ColumnBlock block)
    {
        fields = [.. block.Columns.Select(values => values.Field)];
        writer = ParquetWriter.CreateAsync(new ParquetSchema(fields), stream, Options(block)).GetAwaiter().GetResult();
    }

    public void Write(ColumnBlock block)
    {
        using var group = writer.CreateRowGroup();
        for (var i = 0; i < fields.Length; i++)
        {
            block[i].WriteAsync(group, fields[i]).GetAwaiter().GetResult();
        }

        group.CompleteValidate();
    }

    public void Finish() => writer.DisposeAsync().AsTask().GetAwaiter().GetResult();

    // Every level but Fastest makes the library's zstd write about 1 MB a second (measured).
    private static ParquetOptions Options(ColumnBlock block)
    {
        var options = new ParquetOptions { CompressionMethod = CompressionMethod.Zstd, CompressionLevel = CompressionLevel.Fastest };
        foreach (var values in block.Columns)
        {
            options.ColumnEncodingHints[values.Column.Name] = values.Encoding;
        }

        return options;
    }
}
