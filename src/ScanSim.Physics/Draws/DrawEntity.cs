using System.Text;

namespace ScanSim.Physics.Draws;

/// <summary>The number under which a named thing draws, so that added or reordered targets leave the others' draws alone.</summary>
public static class DrawEntity
{
    /// <summary>The radar itself; no name ever gets it.</summary>
    public const uint Radar = 0;

    private const uint OffsetBasis = 2166136261;
    private const uint Prime = 16777619;

    /// <summary>32-bit FNV-1a of the UTF-8 bytes of the name; the one value 0 becomes 1.</summary>
    /// <remarks>
    /// Source: G. Fowler, L. C. Noll, K.-P. Vo, D. Eastlake and T. Hansen, The FNV non-cryptographic hash algorithm,
    /// draft-eastlake-fnv (basis and prime from memory; test vectors checked). Two of n names share a number with probability about n²/2³³ (1,000 names: 1.2e-4), and would
    /// then share their draws: whoever collects the names must check for it.
    /// </remarks>
    public static uint Of(string id)
    {
        uint hash = OffsetBasis;
        foreach (byte value in Encoding.UTF8.GetBytes(id))
        {
            hash = (hash ^ value) * Prime;
        }

        return hash == Radar ? 1 : hash;
    }
}
