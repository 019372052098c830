namespace ScanSim.Recordings.Tables;

/// <summary>What a test may vary in writing. None of it changes a digest.</summary>
internal sealed record WriterSettings
{
    /// <summary>64 Ki rows: a block of looks takes 11 MB of columns, and a picture that needs ten seconds of an hour reads little more.</summary>
    public int BlockRows { get; init; } = 1 << 16;

    public Func<string, Stream> OpenFile { get; init; } = path => new FileStream(path, FileMode.CreateNew, FileAccess.Write, FileShare.Read, 1 << 16);
}
