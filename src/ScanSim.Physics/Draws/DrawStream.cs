using System.Runtime.CompilerServices;

namespace ScanSim.Physics.Draws;

/// <summary>The draws of one address, one after the other. A mutable value: keep it in a local and pass it by reference.</summary>
/// <remarks>
/// Counter words: purpose · 2²⁴ + block number, entity, run, index; key: the seed's low and high word. So a stream has 2²⁴ blocks
/// of four words; a rejection loop runs on inside its own address and disturbs no other. No allocation.
/// The default value is the stream of seed 0 and the default address. A copy repeats the draws that follow the copying.
/// Distributions are exact but for the rounding of doubles and the 2⁻⁵² steps of the uniform numbers. Their bits are the same
/// for the same platform; Exp and Log may differ in the last bit between systems.
/// </remarks>
public struct DrawStream
{
    private const int WordCount = 8;

    private const uint MostBlocks = 1u << 24;

    /// <summary>2⁻⁵².</summary>
    private const double UniformStep = 1.0 / (1L << 52);

    private readonly uint purpose;
    private readonly uint entity;
    private readonly uint run;
    private readonly uint index;
    private readonly uint key0;
    private readonly uint key1;
    private uint nextBlock;
    private int wordsLeft;
    private Words words;

    public DrawStream(ulong seed, DrawAddress address)
    {
        purpose = (uint)address.Purpose << 24;
        entity = address.Entity;
        run = address.Run;
        index = address.Index;
        key0 = (uint)seed;
        key1 = (uint)(seed >> 32);
    }

    /// <summary>32 even bits.</summary>
    public uint NextUInt32()
    {
        if (wordsLeft == 0)
        {
            Refill();
        }

        uint word = words[WordCount - wordsLeft];
        wordsLeft--;
        return word;
    }

    /// <summary>64 even bits: two words, the first one high.</summary>
    public ulong NextUInt64()
    {
        if (wordsLeft < 2)
        {
            ulong high = NextUInt32();
            return (high << 32) | NextUInt32();
        }

        int next = WordCount - wordsLeft;
        wordsLeft -= 2;
        return ((ulong)words[next] << 32) | words[next + 1];
    }

    /// <summary>Uniform in the open interval (0, 1): one of the 2⁵² midpoints (i + ½) 2⁻⁵².</summary>
    public double NextUniform() => ((NextUInt64() >> 12) + 0.5) * UniformStep;

    /// <summary>Normal with mean 0 and variance 1. Method: <see cref="NormalDraw"/>.</summary>
    public double NextNormal() => NormalDraw.Next(ref this);

    /// <summary>Exponential with mean 1: −ln of a uniform number. At most 36.8.</summary>
    public double NextExponential() => -Math.Log(NextUniform());

    /// <summary>Gamma with the given shape and scale 1 (mean = shape). Shape 0 gives 0. Methods: <see cref="GammaDraw"/>.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The shape is negative, infinite or NaN.</exception>
    public double NextGamma(double shape) => GammaDraw.Next(ref this, shape);

    /// <summary>Poisson with the given mean. Methods: <see cref="PoissonDraw"/>.</summary>
    /// <exception cref="ArgumentOutOfRangeException">The mean is negative, NaN or above 2³⁰.</exception>
    public int NextPoisson(double mean) => PoissonDraw.Next(ref this, mean);

    /// <summary>Two blocks at a time: their rounds overlap in the processor, so the second costs next to nothing.</summary>
    private void Refill()
    {
        if (nextBlock == MostBlocks)
        {
            throw new InvalidOperationException($"one draw address holds {4L * MostBlocks} words, and all are used");
        }

        Philox.TwoBlocks(purpose | nextBlock, entity, run, index, key0, key1, words);
        nextBlock += 2;
        wordsLeft = WordCount;
    }

    [InlineArray(WordCount)]
    private struct Words
    {
        private uint first;
    }
}
