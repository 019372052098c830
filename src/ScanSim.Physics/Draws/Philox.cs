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
}
