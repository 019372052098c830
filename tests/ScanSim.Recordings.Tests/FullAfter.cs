namespace ScanSim.Recordings.Tests;

/// <summary>A file on a disk that is full after some bytes, with the words that Linux has for it.</summary>
internal sealed class FullAfter(string path, long bytes) : Stream
{
    private readonly FileStream file = new(path, FileMode.CreateNew, FileAccess.Write);

    public override bool CanRead => false;

    public override bool CanSeek => true;

    public override bool CanWrite => true;

    public override long Length => file.Length;

    public override long Position
    {
        get => file.Position;
        set => file.Position = value;
    }

    public override void Write(byte[] buffer, int offset, int count)
    {
        if (Position + count > bytes)
        {
            throw new IOException("No space left on device");
        }

        file.Write(buffer, offset, count);
    }

    public override void Flush() => file.Flush();

    public override int Read(byte[] buffer, int offset, int count) => throw new NotSupportedException();

    public override long Seek(long offset, SeekOrigin origin) => file.Seek(offset, origin);

    public override void SetLength(long value) => file.SetLength(value);

    protected override void Dispose(bool disposing)
    {
        file.Dispose();
        base.Dispose(disposing);
    }
}
