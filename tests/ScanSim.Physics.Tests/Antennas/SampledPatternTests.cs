using CsCheck;
using ScanSim.Physics.Antennas;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Antennas;

public sealed class SampledPatternTests
{
    private static readonly double Beamwidth = Degrees.ToRad(1.2);

    private static readonly SampledPattern[] Patterns =
    [
        new(new GaussianPattern(Beamwidth), 1e-4),
        new(new AperturePattern(ApertureTaper.Uniform, Beamwidth), 1e-4),
        new(new AperturePattern(ApertureTaper.CosineSquared, Beamwidth), 0.0),
        new(new AperturePattern(ApertureTaper.Cosine, Degrees.ToRad(25)), 1e-3),
        new(new CosecantSquaredPattern(Degrees.ToRad(4.8), Degrees.ToRad(3.6), Degrees.ToRad(30)), 3e-6),
        new(new TablePattern([-2.0, -0.3, 0.0, 0.2, 1.0, 2.5], [-18.0, -25.0, 0.0, -25.0, -40.0, -12.0]), 1e-5),
    ];

    [Fact]
    public void Samples_depart_from_the_Gaussian_beam_by_less_than_the_derived_bound()
    {
        var exact = new GaussianPattern(Beamwidth);
        double bound = Math.Log(2.0) / 16384.0;
        for (double offset = -3.0 * Beamwidth; offset < 3.0 * Beamwidth; offset += Beamwidth / 997.0)
        {
            Assert.Equal(Math.Max(1e-4, exact.GainRatio(offset)), Patterns[0].GainRatio(offset), bound);
        }

        Assert.Equal(1.0, Patterns[0].GainRatio(0.0));
    }

    [Fact]
    public void The_two_way_integral_of_the_Gaussian_beam_gives_the_published_beam_shape_loss()
    {
        var comparison = new Comparison(
            "Beam-shape loss of a Gaussian beam, dense pulses, one coordinate",
            "D. K. Barton, Modern Radar System Analysis, 1988: 1.24 dB (from memory); exact √(8 ln 2/π) = 1.2338 dB", 0.005, 0.0, "dB");
        var beam = new SampledPattern(new GaussianPattern(Beamwidth), 0.0);
        double sum = 0.0;
        const int Steps = 20_000;
        for (int i = 0; i < Steps; i++)
        {
            double gain = beam.GainRatio(((i + 0.5) / Steps - 0.5) * 6.0 * Beamwidth);
            sum += gain * gain * 6.0 / Steps;
        }

        comparison.Add("exact", 1.2338, -Decibels.FromRatio(sum));
        comparison.Conclude();
    }

    [Fact]
    public void The_floor_holds_everywhere_and_the_ends_can_be_read()
    {
        double[] floors = [1e-4, 1e-4, 0.0, 1e-3, 3e-6, 1e-5];
        for (int p = 0; p < Patterns.Length; p++)
        {
            for (double offset = -Math.PI; offset <= Math.PI; offset += 0.00123)
            {
                Assert.InRange(Patterns[p].GainRatio(offset), floors[p] * (1 - 1e-12), 1.0 + 1e-15);
            }

            Assert.InRange(Patterns[p].GainRatio(-Math.PI), floors[p], 1.0);
            Assert.InRange(Patterns[p].GainRatio(Math.PI), floors[p], 1.0);
        }
    }

    /// <summary>The bound is rigorous (nothing beyond it reaches the level) and tight (something close inside it does).</summary>
    [Fact]
    public void Beyond_the_greatest_offset_the_level_is_never_reached_and_close_within_it_is()
    {
        Property.Holds(
            Gen.Select(Gen.Int[0, Patterns.Length - 1], Gen.Double[-7.0, 0.0]),
            60,
            v =>
            {
                var (index, exponent) = v;
                SampledPattern pattern = Patterns[index];
                double level = Math.Pow(10.0, exponent);
                double bound = pattern.MaximumOffsetRad(level);
                for (double offset = Math.BitIncrement(bound); offset <= Math.PI; offset += 0.23 * pattern.StepRad)
                {
                    if (pattern.GainRatio(offset) >= level || pattern.GainRatio(-offset) >= level)
                    {
                        return false;
                    }
                }

                double inside = Math.Max(0.0, bound - 1e-5 * pattern.StepRad);
                return pattern.GainRatio(inside) >= level * (1 - 1e-4) || pattern.GainRatio(-inside) >= level * (1 - 1e-4);
            });
    }

    [Fact]
    public void The_floor_reaches_all_round_and_nothing_reaches_above_the_peak()
    {
        Assert.Equal(Math.PI, Patterns[0].MaximumOffsetRad(1e-4));
        Assert.Equal(Math.PI, Patterns[0].MaximumOffsetRad(0.0));
        Assert.Equal(Math.PI, Patterns[0].MaximumOffsetRad(double.NaN));
        Assert.Equal(0.0, Patterns[0].MaximumOffsetRad(1.0000001));
        Assert.Equal(0.5 * Beamwidth, Patterns[0].MaximumOffsetRad(0.5), Patterns[0].StepRad);
        Assert.InRange(Patterns[5].MaximumOffsetRad(0.06), 2.3, Math.PI);
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(1.1)]
    [InlineData(double.NaN)]
    public void A_floor_that_is_no_ratio_is_refused(double floorRatio)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new SampledPattern(new GaussianPattern(0.1), floorRatio));
    }

    [Fact]
    public void A_needle_beam_is_sampled_within_the_size_limit()
    {
        var needle = new SampledPattern(new GaussianPattern(1e-5), 0.0);
        Assert.Equal(1.0, needle.GainRatio(0.0));
        Assert.True(needle.StepRad >= 2.0 * Math.PI / (1 << 20));
    }
}
