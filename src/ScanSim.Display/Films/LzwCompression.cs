namespace ScanSim.Display.Films;

/// <summary>Variable-length-code LZW as GIF has it, for bytes.</summary>
/// <remarks>Source: CompuServe, Graphics Interchange Format, Version 89a (1990), appendix F.</remarks>
internal ref struct LzwCompression
{
    private const int ByteBits = 8;
    private const int Clear = 1 << ByteBits;
    private const int End = Clear + 1;
    private const int MostBits = 12;

    /// <summary>Twice the number of codes, so that the open addressing stays short.</summary>
    private const int Slots = 2 << MostBits;

    private readonly Stream into;
    private readonly int[] keys = new int[Slots];
    private readonly short[] codes = new short[Slots];
    private readonly byte[] block = new byte[255];
    private int blockLength;
    private uint pending;
    private int pendingBits;
    private int codeBits;
    private int nextCode;

    private LzwCompression(Stream into) => this.into = into;

    /// <summary>Writes the code size, the codes in blocks, and the end mark; there must be at least one byte.</summary>
    public static void Write(ReadOnlySpan<byte> bytes, Stream into)
    {
        into.WriteByte(ByteBits);
        var compression = new LzwCompression(into);
        compression.Compress(bytes);
        into.WriteByte(0);
    }

    private void Compress(ReadOnlySpan<byte> bytes)
    {
        codeBits = ByteBits + 1;
        Emit(Clear);
        Forget();
        int prefix = bytes[0];
        foreach (var next in bytes[1..])
        {
            var key = (prefix << ByteBits) | next;
            var slot = SlotOf(key);
            if (keys[slot] == key)
            {
                prefix = codes[slot];
                continue;
            }

            EmitAndWiden(prefix);
            if (nextCode < 1 << MostBits)
            {
                keys[slot] = key;
                codes[slot] = (short)nextCode++;
            }
            else
            {
                Emit(Clear);
                Forget();
            }

            prefix = next;
        }

        EmitAndWiden(prefix);
        Emit(End);
        Flush();
    }

    private void Forget()
    {
        Array.Fill(keys, -1);
        codeBits = ByteBits + 1;
        nextCode = End + 1;
    }

    /// <summary>Where the key stands, or the free slot where it belongs.</summary>
    private readonly int SlotOf(int key)
    {
        // Fibonacci hashing: 2^32 over the golden ratio, as in Knuth, The Art of Computer Programming, vol. 3, section 6.4.
        var slot = (int)((uint)key * 2654435769u >> (32 - MostBits - 1));
        while (keys[slot] != key && keys[slot] >= 0)
        {
            slot = (slot + 1) & (Slots - 1);
        }

        return slot;
    }

    private void EmitAndWiden(int code)
    {
        Emit(code);
        // The reader is one entry behind: it widens when it has read this code.
        if (nextCode == 1 << codeBits && codeBits < MostBits)
        {
            codeBits++;
        }
    }

    private void Emit(int code)
    {
        pending |= (uint)code << pendingBits;
        pendingBits += codeBits;
        while (pendingBits >= 8)
        {
            EmitByte((byte)pending);
            pending >>= 8;
            pendingBits -= 8;
        }
    }

    private void EmitByte(byte value)
    {
        block[blockLength++] = value;
        if (blockLength == block.Length)
        {
            FlushBlock();
        }
    }

    private void Flush()
    {
        if (pendingBits > 0)
        {
            EmitByte((byte)pending);
        }

        if (blockLength > 0)
        {
            FlushBlock();
        }
    }

    private void FlushBlock()
    {
        into.WriteByte((byte)blockLength);
        into.Write(block, 0, blockLength);
        blockLength = 0;
    }
}
