namespace ScanSim.Recordings;

/// <summary>What the manifest says of one table.</summary>
public sealed record TableInfo
{
    /// <summary>Name of the file in the recording's folder.</summary>
    public required string File { get; init; }

    public required long Rows { get; init; }

    /// <summary>Length of the file.</summary>
    public required long Bytes { get; init; }

    /// <summary>SHA-256 over names and digests of the columns, 64 hexadecimal digits: the same in every store.</summary>
    public required string Digest { get; init; }

    /// <summary>Digest of each column by its name, 64 hexadecimal digits.</summary>
    public required IReadOnlyDictionary<string, string> ColumnDigests { get; init; }
}
