namespace ScanSim.Display.Films;

/// <summary>Lengths of the codes of a Huffman code.</summary>
/// <remarks>
/// Source: D. Huffman, A Method for the Construction of Minimum-Redundancy Codes, Proc. IRE 40 (9), 1952; with two queues, as the counts
/// are sorted. Where a code would be too long, rare symbols are counted as more frequent until it is not: not quite the shortest, but close.
/// </remarks>
internal static class HuffmanLengths
{
    /// <summary>0 for symbols that do not occur. At least two must occur, and no more than 2 to the power <paramref name="mostBits"/>.</summary>
    public static byte[] Of(ReadOnlySpan<int> counts, int mostBits)
    {
        var symbols = new List<int>();
        for (var symbol = 0; symbol < counts.Length; symbol++)
        {
            if (counts[symbol] > 0)
            {
                symbols.Add(symbol);
            }
        }

        for (var least = 1L; ; least *= 2)
        {
            var leaves = new (int Symbol, long Count)[symbols.Count];
            for (var i = 0; i < leaves.Length; i++)
            {
                leaves[i] = (symbols[i], Math.Max(counts[symbols[i]], least));
            }

            Array.Sort(leaves, static (a, b) => a.Count != b.Count ? a.Count.CompareTo(b.Count) : a.Symbol.CompareTo(b.Symbol));
            var depths = Depths(leaves);
            if (depths.AsSpan(0, leaves.Length).ContainsAnyInRange(mostBits + 1, int.MaxValue))
            {
                continue;
            }

            var lengths = new byte[counts.Length];
            for (var i = 0; i < leaves.Length; i++)
            {
                lengths[leaves[i].Symbol] = (byte)depths[i];
            }

            return lengths;
        }
    }

    /// <summary>How deep each leaf is in the tree; the nodes that join them follow.</summary>
    private static int[] Depths((int Symbol, long Count)[] leaves)
    {
        var nodes = 2 * leaves.Length - 1;
        var weights = new long[nodes];
        var parents = new int[nodes];
        for (var i = 0; i < leaves.Length; i++)
        {
            weights[i] = leaves[i].Count;
        }

        // Leaves and joined nodes are each in order of weight: the lightest is at the head of one of the two.
        var (leaf, joined) = (0, leaves.Length);
        for (var made = leaves.Length; made < nodes; made++)
        {
            for (var child = 0; child < 2; child++)
            {
                var lightest = leaf < leaves.Length && (joined == made || weights[leaf] <= weights[joined]) ? leaf++ : joined++;
                weights[made] += weights[lightest];
                parents[lightest] = made;
            }
        }

        var depths = new int[nodes];
        for (var i = nodes - 2; i >= 0; i--)
        {
            depths[i] = depths[parents[i]] + 1;
        }

        return depths;
    }
}
