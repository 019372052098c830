using System.Runtime.CompilerServices;

namespace ScanSim.Physics.Draws;

/// <summary>The draws of one address, one after the other. A mutable value: keep it in a local and pass it by reference.</summary>
/// <remarks>
/// Counter words: purpose · 2²⁴ + block number, entity, run, index; key: the seed's low and high word. So a stream has 2²⁴ blocks
/// of four words; a rejection loop runs on inside its own address and disturbs no other. No allocation.
/// The default value is the stream of seed 0 and the default address. A copy repeats the draws that follow the copying.
/// Distributions are exact but for the rounding of doubles and the 2⁻⁵² steps of the uniform numbers. Their bits are the same
/// for the same platform; Log and SinCos may differ in the last bit between systems.
/// </remarks>
public struct DrawStream
{
    private const int WordCount = 8;

    private const uint MostBlocks = 1u << 24;

    /// <summary>2⁻⁵².</summary>
    private const double UniformStep = 1.0 / (1L << 52);

    /// <summary>Above this shape Marsaglia and Tsang's method is quicker than a product of uniform numbers; measured.</summary>
    private const int LargestProductShape = 4;

    /// <summary>Below this mean the sequential search is quicker and the rejection's setup does not hold.</summary>
    private const double SmallestRejectionMean = 10.0;

    /// <summary>Greatest mean whose draws fit an int with certainty for practical purposes (2³⁰ is 32,000 standard deviations below 2³¹).</summary>
    private const double LargestMean = 1 << 30;

    private readonly uint purpose;
    private readonly uint entity;
    private readonly uint run;
    private readonly uint index;
    private readonly uint key0;
    private readonly uint key1;
    private uint nextBlock;
    private int wordsLeft;
    private bool hasNormal;
    private double secondNormal;
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

    /// <summary>Uniform in the open interval (0, 1): one of the 2⁵² midpoints (i + ½) 2⁻⁵².</summary>
    public double NextUniform()
    {
        ulong high;
        ulong low;
        if (wordsLeft >= 2)
        {
            int next = WordCount - wordsLeft;
            high = words[next];
            low = words[next + 1];
            wordsLeft -= 2;
        }
        else
        {
            high = NextUInt32();
            low = NextUInt32();
        }

        return ((((high << 32) | low) >> 12) + 0.5) * UniformStep;
    }

    /// <summary>Normal with mean 0 and variance 1.</summary>
    /// <remarks>Source: G. E. P. Box and M. E. Muller, Ann. Math. Stat. 29 (1958), p. 610. Of a pair the second is kept. |x| ≤ 8.6.</remarks>
    public double NextNormal()
    {
        if (hasNormal)
        {
            hasNormal = false;
            return secondNormal;
        }

        double radius = Math.Sqrt(-2.0 * Math.Log(NextUniform()));
        (double sine, double cosine) = Math.SinCos(2.0 * Math.PI * NextUniform());
        secondNormal = radius * sine;
        hasNormal = true;
        return radius * cosine;
    }

    /// <summary>Exponential with mean 1: −ln of a uniform number. At most 36.8.</summary>
    public double NextExponential() => -Math.Log(NextUniform());

    /// <summary>Gamma with the given shape and scale 1 (mean = shape). Shape 0 gives 0.</summary>
    /// <remarks>
    /// Shape 1 to 4 and whole: −ln of a product of that many uniform numbers. Else G. Marsaglia and W. W. Tsang, A simple method
    /// for generating gamma variables, ACM TOMS 26 (2000), pp. 363-372, with its power of a uniform number for shapes below 1.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">The shape is negative, infinite or NaN.</exception>
    public double NextGamma(double shape)
    {
        if (!(shape >= 0.0 && shape < double.PositiveInfinity))
        {
            throw new ArgumentOutOfRangeException(nameof(shape), shape, "the shape of a gamma distribution is finite and at least 0");
        }

        if (shape <= LargestProductShape && shape == Math.Floor(shape))
        {
            return GammaByProduct((int)shape);
        }

        return shape < 1.0
            ? GammaByRejection(shape + 1.0) * Math.Pow(NextUniform(), 1.0 / shape)
            : GammaByRejection(shape);
    }

    /// <summary>Poisson with the given mean.</summary>
    /// <remarks>
    /// Mean below 10: sequential search from 0. From 10: the transformed rejection PTRS of W. Hörmann, The transformed rejection
    /// method for generating Poisson random variables, Insurance: Mathematics and Economics 12 (1993), pp. 39-45.
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">The mean is negative, NaN or above 2³⁰.</exception>
    public int NextPoisson(double mean)
    {
        if (!(mean >= 0.0 && mean <= LargestMean))
        {
            throw new ArgumentOutOfRangeException(nameof(mean), mean, "the mean of a Poisson distribution lies from 0 to 2^30");
        }

        return mean < SmallestRejectionMean ? PoissonBySearch(mean) : PoissonByRejection(mean);
    }

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

    private double GammaByProduct(int shape)
    {
        double product = 1.0;
        for (int i = 0; i < shape; i++)
        {
            product *= NextUniform();
        }

        return shape == 0 ? 0.0 : -Math.Log(product);
    }

    private double GammaByRejection(double shape)
    {
        double d = shape - 1.0 / 3.0;
        double c = 1.0 / Math.Sqrt(9.0 * d);
        while (true)
        {
            double x = NextNormal();
            double root = 1.0 + c * x;
            if (root <= 0.0)
            {
                continue;
            }

            double v = root * root * root;
            double u = NextUniform();
            double square = x * x;
            if (u < 1.0 - 0.0331 * square * square || Math.Log(u) < 0.5 * square + d * (1.0 - v + Math.Log(v)))
            {
                return d * v;
            }
        }
    }

    private int PoissonBySearch(double mean)
    {
        double left = NextUniform();
        double mass = Math.Exp(-mean);
        int count = 0;
        // The masses are summed with rounding: past the point where they no longer change the sum the search ends.
        while (left > mass && (mass > UniformStep / 16.0 || count < mean))
        {
            left -= mass;
            count++;
            mass *= mean / count;
        }

        return count;
    }

    private int PoissonByRejection(double mean)
    {
        double b = 0.931 + 2.53 * Math.Sqrt(mean);
        double a = -0.059 + 0.02483 * b;
        double inverseAlpha = 1.1239 + 1.1328 / (b - 3.4);
        double squeeze = 0.9277 - 3.6224 / (b - 2.0);
        while (true)
        {
            double u = NextUniform() - 0.5;
            double v = NextUniform();
            double us = 0.5 - Math.Abs(u);
            double k = Math.Floor((2.0 * a / us + b) * u + mean + 0.43);
            if (us >= 0.07 && v <= squeeze)
            {
                return (int)k;
            }

            if (k < 0.0 || k > int.MaxValue || (us < 0.013 && v > us))
            {
                continue;
            }

            if (Math.Log(v * inverseAlpha / (a / (us * us) + b)) <= PoissonMass.Log((int)k, mean))
            {
                return (int)k;
            }
        }
    }

    [InlineArray(WordCount)]
    private struct Words
    {
        private uint first;
    }
}
