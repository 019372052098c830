namespace ScanSim.Display.Films;

/// <summary>A canonical Huffman code for symbols that occur so often, and how WebP writes it down.</summary>
/// <remarks>Source: RFC 9649, WebP Image Format (2024), section 3.7.2.1, Decoding and Building the Prefix Codes.</remarks>
internal sealed class PrefixCode
{
    private const int MostBits = 15;

    /// <summary>Codes of code lengths have three bits for their own length.</summary>
    private const int MostBitsOfLengths = 7;
    private const int LengthSymbols = 19;
    private const int RepeatZeros = 17;
    private const int RepeatManyZeros = 18;

    private readonly byte[] lengths;
    private readonly ushort[] codes;
    private readonly int[] used;

    public PrefixCode(ReadOnlySpan<int> counts)
        : this(counts, MostBits)
    {
    }

    private PrefixCode(ReadOnlySpan<int> counts, int mostBits)
    {
        var symbols = new List<int>();
        for (var symbol = 0; symbol < counts.Length; symbol++)
        {
            if (counts[symbol] > 0)
            {
                symbols.Add(symbol);
            }
        }

        used = [.. symbols];
        // A code of one symbol takes no bits.
        lengths = used.Length < 2 ? new byte[counts.Length] : HuffmanLengths.Of(counts, mostBits);
        codes = Canonical(lengths);
    }

    /// <summary>The order in which RFC 9649 lists the lengths of the code of lengths.</summary>
    private static ReadOnlySpan<byte> OrderOfLengths => [17, 18, 0, 1, 2, 3, 4, 5, 16, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15];

    public void Emit(int symbol, BitWriter into) => into.Write(codes[symbol], lengths[symbol]);

    /// <summary>Writes the code itself, as it stands before the data.</summary>
    public void WriteTo(BitWriter into)
    {
        var isSimple = used.Length <= 2 && used.All(s => s < 256);
        into.Write(isSimple);
        if (isSimple)
        {
            into.Write(used.Length == 2);
            // The first symbol has eight bits.
            into.Write(true);
            into.Write(used.Length > 0 ? (uint)used[0] : 0, 8);
            if (used.Length == 2)
            {
                into.Write((uint)used[1], 8);
            }

            return;
        }

        WriteLengths(into);
    }

    private void WriteLengths(BitWriter into)
    {
        var tokens = RunsOfLengths();
        var counts = new int[LengthSymbols];
        foreach (var (symbol, _, _) in tokens)
        {
            counts[symbol]++;
        }

        // Two at least, so that each has a length.
        counts[0] = Math.Max(counts[0], 1);
        counts[1] = Math.Max(counts[1], 1);
        var code = new PrefixCode(counts, MostBitsOfLengths);
        var written = LengthSymbols;
        while (written > 4 && code.lengths[OrderOfLengths[written - 1]] == 0)
        {
            written--;
        }

        into.Write((uint)written - 4, 4);
        foreach (var symbol in OrderOfLengths[..written])
        {
            into.Write(code.lengths[symbol], 3);
        }

        // All symbols of the alphabet follow.
        into.Write(false);
        foreach (var (symbol, extra, extraBits) in tokens)
        {
            code.Emit(symbol, into);
            into.Write((uint)extra, extraBits);
        }
    }

    /// <summary>The lengths one by one, and runs of zeros as such.</summary>
    private List<(int Symbol, int Extra, int ExtraBits)> RunsOfLengths()
    {
        var tokens = new List<(int, int, int)>();
        for (var at = 0; at < lengths.Length;)
        {
            var run = lengths.AsSpan(at).IndexOfAnyExcept((byte)0);
            run = Math.Min(run < 0 ? lengths.Length - at : run, 138);
            tokens.Add(run switch
            {
                >= 11 => (RepeatManyZeros, run - 11, 7),
                >= 3 => (RepeatZeros, run - 3, 3),
                _ => (lengths[at], 0, 0),
            });
            at += run >= 3 ? run : 1;
        }

        return tokens;
    }

    /// <summary>Codes in order of length and symbol, turned round because their highest bit is read first.</summary>
    private static ushort[] Canonical(byte[] lengths)
    {
        var canonical = new ushort[lengths.Length];
        var next = 0;
        for (var length = 1; length <= MostBits; length++)
        {
            next <<= 1;
            for (var symbol = 0; symbol < lengths.Length; symbol++)
            {
                if (lengths[symbol] == length)
                {
                    canonical[symbol] = (ushort)(Reversed((uint)next++) >> (32 - length));
                }
            }
        }

        return canonical;
    }

    private static uint Reversed(uint bits)
    {
        bits = (bits & 0x5555_5555) << 1 | (bits >> 1 & 0x5555_5555);
        bits = (bits & 0x3333_3333) << 2 | (bits >> 2 & 0x3333_3333);
        bits = (bits & 0x0F0F_0F0F) << 4 | (bits >> 4 & 0x0F0F_0F0F);
        return System.Buffers.Binary.BinaryPrimitives.ReverseEndianness(bits);
    }
}
