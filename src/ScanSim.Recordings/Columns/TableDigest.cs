using System.Collections.Immutable;

namespace ScanSim.Recordings.Columns;

/// <summary>Running digests of all columns of a table.</summary>
internal sealed class TableDigest(ImmutableArray<Column> columns) : IDisposable
{
    private readonly ImmutableArray<ColumnDigest> digests = [.. columns.Select(_ => new ColumnDigest())];

    public void Append(ColumnBlock block)
    {
        for (var i = 0; i < digests.Length; i++)
        {
            block[i].AppendTo(digests[i]);
        }
    }

    public ImmutableDictionary<string, string> ByColumn() =>
        columns.ToImmutableDictionary(column => column.Name, column => Hex(digests[column.Index].Current()), StringComparer.Ordinal);

    /// <summary>SHA-256 over name (as a text value) and digest (32 bytes) of each column in order.</summary>
    public string Whole()
    {
        using var whole = new ColumnDigest();
        foreach (var column in columns)
        {
            whole.Append(column.Name);
            whole.Append(digests[column.Index].Current());
        }

        return Hex(whole.Current());
    }

    public void Dispose()
    {
        foreach (var digest in digests)
        {
            digest.Dispose();
        }
    }

    private static string Hex(byte[] digest) => Convert.ToHexStringLower(digest);
}
