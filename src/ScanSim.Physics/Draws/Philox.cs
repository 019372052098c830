namespace ScanSim.Physics.Draws;

/// <summary>The counter-based generator Philox4x32-10: a keyed bijection of 128-bit counters.</summary>
/// <remarks>
/// Source: J. K. Salmon, M. A. Moraes, R. O. Dror and D. E. Shaw, Parallel random numbers: as easy as 1, 2, 3, Proc. SC11,
/// ACM 2011, section 3.3 and table 2; the known answers of its reference implementation are a test. Integer arithmetic: exact, same
/// bits on every system.
/// </remarks>
public static class Philox
{
    private const int Rounds = 10;
    private const uint Multiplier0 = 0xD2511F53;
    private const uint Multiplier1 = 0xCD9E8D57;

    /// <summary>Golden ratio, the first key word's step.</summary>
    private const uint Weyl0 = 0x9E3779B9;

    /// <summary>√3 − 1, the second key word's step.</summary>
    private const uint Weyl1 = 0xBB67AE85;

    public static PhiloxBlock Block(uint c0, uint c1, uint c2, uint c3, uint k0, uint k1)
    {
        for (int round = 0; round < Rounds; round++)
        {
            ulong product0 = (ulong)Multiplier0 * c0;
            ulong product1 = (ulong)Multiplier1 * c2;
            c0 = (uint)(product1 >> 32) ^ c1 ^ k0;
            c1 = (uint)product1;
            c2 = (uint)(product0 >> 32) ^ c3 ^ k1;
            c3 = (uint)product0;
            k0 += Weyl0;
            k1 += Weyl1;
        }

        return new PhiloxBlock(c0, c1, c2, c3);
    }

    /// <summary>The blocks of a counter and of the next one (first word + 1), eight words in order.</summary>
    /// <remarks>The rounds of the two run side by side, so that the second costs next to nothing: one block waits for its own products.</remarks>
    internal static void TwoBlocks(uint c0, uint c1, uint c2, uint c3, uint k0, uint k1, Span<uint> words)
    {
        uint d0 = c0 + 1;
        uint d1 = c1;
        uint d2 = c2;
        uint d3 = c3;
        for (int round = 0; round < Rounds; round++)
        {
            ulong product0 = (ulong)Multiplier0 * c0;
            ulong product1 = (ulong)Multiplier1 * c2;
            ulong product2 = (ulong)Multiplier0 * d0;
            ulong product3 = (ulong)Multiplier1 * d2;
            c0 = (uint)(product1 >> 32) ^ c1 ^ k0;
            d0 = (uint)(product3 >> 32) ^ d1 ^ k0;
            c1 = (uint)product1;
            d1 = (uint)product3;
            c2 = (uint)(product0 >> 32) ^ c3 ^ k1;
            d2 = (uint)(product2 >> 32) ^ d3 ^ k1;
            c3 = (uint)product0;
            d3 = (uint)product2;
            k0 += Weyl0;
            k1 += Weyl1;
        }

        words[7] = d3;
        words[6] = d2;
        words[5] = d1;
        words[4] = d0;
        words[3] = c3;
        words[2] = c2;
        words[1] = c1;
        words[0] = c0;
    }
}
