using MathNet.Numerics;
using ScanSim.Physics.Draws;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Draws;

/// <summary>Sample sizes: an error of 0.5 % anywhere in a distribution function is found (see <see cref="GoodnessOfFit"/>).</summary>
public sealed class DistributionTests
{
    private static readonly int Size = GoodnessOfFit.SizeFor(0.005);

    [Fact]
    public void Bits_are_even_in_every_byte()
    {
        var counts = new long[1024];
        var stream = Stream(1);
        const int Words = 1_000_000;
        for (int i = 0; i < Words; i++)
        {
            uint word = stream.NextUInt32();
            for (int b = 0; b < 4; b++)
            {
                counts[256 * b + (int)((word >> (8 * b)) & 255)]++;
            }
        }

        for (int b = 0; b < 4; b++)
        {
            GoodnessOfFit.ChiSquare(Even(256, Words), counts[(256 * b)..(256 * b + 256)], $"byte {b}");
        }
    }

    [Fact]
    public void Neighbouring_addresses_are_independent()
    {
        const int Draws = 400_000;
        var byIndex = new long[256];
        var byEntity = new long[256];
        for (uint i = 0; i < Draws; i++)
        {
            int a = Sixteenth(new DrawAddress(1, 9, 3, i));
            byIndex[16 * a + Sixteenth(new DrawAddress(1, 9, 3, i + 1))]++;
            byEntity[16 * a + Sixteenth(new DrawAddress(1, 10, 3, i))]++;
        }

        GoodnessOfFit.ChiSquare(Even(256, Draws), byIndex, "pairs along the index");
        GoodnessOfFit.ChiSquare(Even(256, Draws), byEntity, "pairs across entities");

        static int Sixteenth(DrawAddress address) => (int)(16.0 * new DrawStream(77, address).NextUniform());
    }

    [Fact]
    public void Uniform_numbers_are_uniform() => Holds("uniform", s => s, (ref DrawStream s) => s.NextUniform(), 2);

    [Fact]
    public void Normal_numbers_are_normal() =>
        Holds("normal", x => 0.5 * SpecialFunctions.Erfc(-x / Math.Sqrt(2.0)), (ref DrawStream s) => s.NextNormal(), 3);

    [Fact]
    public void Exponential_numbers_are_exponential() =>
        Holds("exponential", x => -SpecialFunctions.Expm1(-x), (ref DrawStream s) => s.NextExponential(), 4);

    [Theory]
    [InlineData(0.05)]
    [InlineData(0.5)]
    [InlineData(0.95)]
    [InlineData(1.0)]
    [InlineData(1.5)]
    [InlineData(2.0)]
    [InlineData(3.0)]
    [InlineData(4.0)]
    [InlineData(5.0)]
    [InlineData(7.5)]
    [InlineData(29.0)]
    [InlineData(1000.0)]
    public void Gamma_numbers_have_their_distribution(double shape)
    {
        Holds($"gamma of shape {shape}", x => GammaDistribution(shape, x), (ref DrawStream s) => s.NextGamma(shape), 5);
    }

    /// <summary>MathNet takes arguments below some 1e-15 for 0, where small shapes still have a fifth of their draws: there the series' first term.</summary>
    private static double GammaDistribution(double shape, double x) => x < 1e-10
        ? Math.Pow(x, shape) / SpecialFunctions.Gamma(shape + 1.0)
        : SpecialFunctions.GammaLowerRegularized(shape, x);

    /// <summary>The two of a Box-Muller pair and neighbours across pairs: sums of squares of two are exponential with mean 2.</summary>
    [Fact]
    public void Consecutive_normal_numbers_are_independent()
    {
        Holds(
            "half the squares of two",
            x => -SpecialFunctions.Expm1(-x),
            (ref DrawStream s) =>
            {
                double a = s.NextNormal();
                double b = s.NextNormal();
                return 0.5 * (a * a + b * b);
            },
            6);
        Holds(
            "sum of two over √2, across pairs",
            x => 0.5 * SpecialFunctions.Erfc(-x / Math.Sqrt(2.0)),
            (ref DrawStream s) =>
            {
                s.NextNormal();
                double a = s.NextNormal();
                double b = s.NextNormal();
                s.NextNormal();
                return (a + b) / Math.Sqrt(2.0);
            },
            7);
    }

    /// <summary>Counts beyond a level against the binomial: 3.9 standard deviations is a chance of 1e-4.</summary>
    [Fact]
    public void Tails_hold_their_share()
    {
        const int Draws = 500_000;
        var comparison = new Comparison(
            "Tail shares of normal, exponential and gamma draws, in standard deviations", "Exact tail probabilities; 500,000 draws each", 3.9, 0.0, "standard deviations");
        Tail("normal beyond 3.5", 0.5 * SpecialFunctions.Erfc(3.5 / Math.Sqrt(2.0)), (ref DrawStream s) => s.NextNormal() > 3.5);
        Tail("exponential beyond ln 1e4", 1e-4, (ref DrawStream s) => s.NextExponential() > Math.Log(1e4));
        Tail("gamma 3 beyond 14", SpecialFunctions.GammaUpperRegularized(3.0, 14.0), (ref DrawStream s) => s.NextGamma(3.0) > 14.0);
        Tail("gamma 7 beyond 20", SpecialFunctions.GammaUpperRegularized(7.0, 20.0), (ref DrawStream s) => s.NextGamma(7.0) > 20.0);
        Tail("gamma 29 below 12", SpecialFunctions.GammaLowerRegularized(29.0, 12.0), (ref DrawStream s) => s.NextGamma(29.0) < 12.0);
        comparison.Conclude();

        void Tail(string name, double share, Test test)
        {
            var stream = Stream(8);
            long count = 0;
            for (int i = 0; i < Draws; i++)
            {
                count += test(ref stream) ? 1 : 0;
            }

            comparison.Add(name, 0.0, (count - Draws * share) / Math.Sqrt(Draws * share * (1.0 - share)));
        }
    }

    internal delegate double Draw(ref DrawStream stream);

    internal delegate bool Test(ref DrawStream stream);

    internal static DrawStream Stream(byte purpose) => new(20_260_401, new DrawAddress(purpose, 0, 0, 0));

    private static double[] Even(int classes, double draws) => Enumerable.Repeat(draws / classes, classes).ToArray();

    private static void Holds(string what, Func<double, double> distribution, Draw draw, byte purpose)
    {
        var stream = Stream(purpose);
        var sample = new double[Size];
        for (int i = 0; i < sample.Length; i++)
        {
            sample[i] = draw(ref stream);
        }

        GoodnessOfFit.Kolmogorov(sample, distribution, what);
    }
}
