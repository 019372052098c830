namespace ScanSim.Display.Films;

/// <summary>Bits into bytes, the lowest bit first.</summary>
internal sealed class BitWriter
{
    private readonly List<byte> bytes = [];
    private ulong pending;
    private int pendingBits;

    /// <summary>Appends at most 32 bits.</summary>
    public void Write(uint value, int bits)
    {
        pending |= (ulong)value << pendingBits;
        pendingBits += bits;
        while (pendingBits >= 8)
        {
            bytes.Add((byte)pending);
            pending >>= 8;
            pendingBits -= 8;
        }
    }

    public void Write(bool value) => Write(value ? 1u : 0, 1);

    /// <summary>All that was written, the last byte filled with zeros.</summary>
    public byte[] ToBytes()
    {
        if (pendingBits > 0)
        {
            Write(0, 8 - pendingBits);
        }

        return [.. bytes];
    }
}
