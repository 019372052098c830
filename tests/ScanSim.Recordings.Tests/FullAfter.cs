namespace ScanSim.Recordings.Tests;

/// <summary>A file on a disk that is full after some bytes, with the words that Linux has for it.</summary>
internal sealed class FullAfter(string path, long bytes) : FileStream(path, FileMode.CreateNew, FileAccess.Write)
{
    public override void Write(byte[] buffer, int offset, int count)
    {
        Spend(count);
        base.Write(buffer, offset, count);
    }

    public override void Write(ReadOnlySpan<byte> buffer)
    {
        Spend(buffer.Length);
        base.Write(buffer);
    }

    public override async ValueTask WriteAsync(ReadOnlyMemory<byte> buffer, CancellationToken cancellationToken = default)
    {
        Spend(buffer.Length);
        await base.WriteAsync(buffer, cancellationToken);
    }

    public override Task WriteAsync(byte[] buffer, int offset, int count, CancellationToken cancellationToken) =>
        WriteAsync(buffer.AsMemory(offset, count), cancellationToken).AsTask();

    private void Spend(int count)
    {
        if (Position + count > bytes)
        {
            throw new IOException("No space left on device");
        }
    }
}
