using System.Buffers.Binary;
using System.Security.Cryptography;
using System.Text;

namespace ScanSim.Recordings.Columns;

/// <summary>Running SHA-256 over the values of a column in row order. The byte form of each type is defined in docs/recording.md.</summary>
internal sealed class ColumnDigest : IDisposable
{
    private const int StagingBytes = 1 << 14;
    private const int MostBytesPerChar = 3;

    /// <summary>Throws on half of a surrogate pair, which no store could give back.</summary>
    private static readonly UTF8Encoding Utf8 = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    private readonly IncrementalHash hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
    private byte[] staging = new byte[StagingBytes];
    private int staged;

    /// <summary>Values that lie in memory as they are hashed: little-endian machines only, see <see cref="Tables.TableWriter{TRow}"/>.</summary>
    public void Append(ReadOnlySpan<byte> values)
    {
        Flush();
        hash.AppendData(values);
    }

    public void Append(double? value)
    {
        var target = Reserve(1 + sizeof(double));
        target[0] = value is null ? (byte)0 : (byte)1;
        if (value is { } number)
        {
            BinaryPrimitives.WriteDoubleLittleEndian(target[1..], number);
        }

        staged += value is null ? 1 : 1 + sizeof(double);
    }

    public void Append(string text)
    {
        var target = Reserve(sizeof(int) + MostBytesPerChar * text.Length);
        var bytes = Utf8.GetBytes(text, target[sizeof(int)..]);
        BinaryPrimitives.WriteInt32LittleEndian(target, bytes);
        staged += sizeof(int) + bytes;
    }

    /// <summary>Digest of all values so far, as 32 bytes; further values may follow.</summary>
    public byte[] Current()
    {
        Flush();
        return hash.GetCurrentHash();
    }

    public void Dispose() => hash.Dispose();

    private Span<byte> Reserve(int bytes)
    {
        if (staged + bytes > staging.Length)
        {
            Flush();
            if (bytes > staging.Length)
            {
                staging = new byte[bytes];
            }
        }

        return staging.AsSpan(staged);
    }

    private void Flush()
    {
        hash.AppendData(staging, 0, staged);
        staged = 0;
    }
}
