using MathNet.Numerics;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Draws;

public sealed class PoissonTests
{
    [Theory]
    [InlineData(0.01)]
    [InlineData(0.7)]
    [InlineData(5.0)]
    [InlineData(9.99)]
    [InlineData(10.0)]
    [InlineData(12.3)]
    [InlineData(50.0)]
    [InlineData(700.0)]
    [InlineData(1e5)]
    public void Counts_have_the_Poisson_distribution(double mean)
    {
        const int Draws = 400_000;
        double spread = 8.0 * Math.Sqrt(mean) + 8.0;
        int first = (int)Math.Max(0.0, mean - spread);
        int last = (int)(mean + spread);
        var counted = new long[last - first + 1];
        var stream = DistributionTests.Stream(20);
        for (int i = 0; i < Draws; i++)
        {
            counted[Math.Clamp(stream.NextPoisson(mean), first, last) - first]++;
        }

        double[] expected = Enumerable.Range(first, counted.Length)
            .Select(k => Draws * Math.Exp(k * Math.Log(mean) - mean - SpecialFunctions.GammaLn(k + 1.0)))
            .ToArray();
        GoodnessOfFit.ChiSquare(expected, counted, $"Poisson of mean {mean}");
    }

    /// <summary>Mean and variance against their own standard errors, also where the counts are too many to tabulate.</summary>
    [Fact]
    public void Mean_and_variance_equal_the_parameter()
    {
        const int Draws = 100_000;
        var comparison = new Comparison(
            "Mean and variance of Poisson draws, in standard errors", "Definition: both equal the parameter; 100,000 draws each", 3.9, 0.0, "standard errors");
        foreach (double mean in new[] { 0.05, 3.0, 10.0, 400.0, 3e6, 1e9 })
        {
            var stream = DistributionTests.Stream(21);
            double sum = 0.0;
            double squares = 0.0;
            for (int i = 0; i < Draws; i++)
            {
                double difference = stream.NextPoisson(mean) - mean;
                sum += difference;
                squares += difference * difference;
            }

            comparison.Add($"mean of {mean}", 0.0, sum / Math.Sqrt(Draws * mean));

            // The fourth central moment is μ + 3 μ², so the squares have the variance μ + 2 μ².
            comparison.Add($"variance of {mean}", 0.0, (squares - Draws * mean) / Math.Sqrt(Draws * (mean + 2.0 * mean * mean)));
        }

        comparison.Conclude();
    }
}
