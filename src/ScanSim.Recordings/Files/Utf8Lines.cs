namespace ScanSim.Recordings.Files;

/// <summary>Splits a stream at line feeds without making strings.</summary>
internal sealed class Utf8Lines(Stream stream)
{
    /// <summary>A line beyond this is no row of ours; a broken file shall not ask for all memory.</summary>
    private const int MostBytes = 1 << 26;

    private byte[] buffer = new byte[1 << 16];
    private int start;
    private int end;

    public long LineNumber { get; private set; }

    /// <summary>The next line without its line feed, valid until the next call; false at the end.</summary>
    public bool Next(out ReadOnlySpan<byte> line)
    {
        var searched = 0;
        while (true)
        {
            var length = buffer.AsSpan(start + searched, end - start - searched).IndexOf((byte)'\n');
            if (length >= 0)
            {
                return Take(searched + length, 1, out line);
            }

            searched = end - start;
            if (!Fill())
            {
                return Take(searched, 0, out line) && searched > 0;
            }
        }
    }

    private bool Take(int length, int separator, out ReadOnlySpan<byte> line)
    {
        line = buffer.AsSpan(start, length);
        start += length + separator;
        LineNumber++;
        return true;
    }

    private bool Fill()
    {
        if (start > 0)
        {
            buffer.AsSpan(start, end - start).CopyTo(buffer);
            end -= start;
            start = 0;
        }
        else if (end == buffer.Length)
        {
            Grow();
        }

        var read = stream.Read(buffer, end, buffer.Length - end);
        end += read;
        return read > 0;
    }

    private void Grow()
    {
        if (buffer.Length >= MostBytes)
        {
            throw new FormatException($"line {LineNumber + 1} is longer than {MostBytes} bytes");
        }

        Array.Resize(ref buffer, 2 * buffer.Length);
    }
}
