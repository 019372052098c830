using MathNet.Numerics.Distributions;
using ScanSim.Physics.Detection;
using ScanSim.Recordings;
using ScanSim.Scenarios;
using ScanSim.Testing;

namespace ScanSim.Engine.Tests;

public class FalseAlarmTests
{
    private const double Pfa = 2e-4;

    private static readonly CollectingSink Run = CollectingSink.Of(Noisy());

    /// <summary>1198 cells of 37.474 m between the end of the pulse (37.474 m) and 45 km, minus the first, partly blind one.</summary>
    private static readonly int Cells = (int)(45e3 / (299_792_458 * 0.25e-6 / 2)) - 1;

    [Fact]
    public void False_alarms_a_dwell_are_Poisson_by_a_chi_square_test()
    {
        var dwells = (int)ScanTimeline.Of(Noisy()).FirstDwell(240);
        var mean = Cells * Pfa;
        var counts = Run.Hits.GroupBy(h => h.Dwell).Select(g => g.Count()).ToList();
        var classes = 4;
        var observed = new double[classes];
        observed[0] = dwells - counts.Count;
        foreach (var count in counts)
        {
            observed[Math.Min(count, classes - 1)]++;
        }

        // Cells hold one hit: the few dwells with two alarms in one cell are fewer than one in a thousand and do not show.
        double chiSquare = 0;
        for (var k = 0; k < classes; k++)
        {
            var probability = k < classes - 1 ? Poisson.PMF(mean, k) : 1 - Enumerable.Range(0, classes - 1).Sum(j => Poisson.PMF(mean, j));
            var expected = dwells * probability;
            chiSquare += (observed[k] - expected) * (observed[k] - expected) / expected;
        }

        var limit = ChiSquared.InvCDF(classes - 1, 0.999);
        var comparison = new Comparison(
            "Engine: false alarms a dwell are Poisson, chi-square with 3 degrees of freedom",
            "Poisson distribution (MathNet.Numerics), 99.9 % quantile of chi-square",
            limit,
            0);
        comparison.Add($"{dwells} dwells, mean {mean:0.000}", 0, chiSquare);
        comparison.Conclude();
    }

    [Fact]
    public void False_alarms_spread_evenly_over_range_and_azimuth()
    {
        AssertUniform(Run.Hits.Select(h => (h.RangeM / (299_792_458 * 0.25e-6 / 2) - 1) / Cells));
        AssertUniform(Run.Hits.Select(h => h.BeamAzimuthDeg / 360));
    }

    [Fact]
    public void Amplitudes_come_from_the_tail_of_the_noise_above_the_threshold()
    {
        AssertUniform(Run.Hits.Select(h => DetectionThreshold.FalseAlarmProbability(15, 15 * (1 + Math.Pow(10, h.SnrDb / 10))) / Pfa));
    }

    [Fact]
    public void Scans_count_their_false_hits_and_plots()
    {
        Assert.Equal(Run.Hits.Count, Run.Scans.Sum(s => s.Hits));
        Assert.Equal(Run.Hits.Count(h => h.Kind == EchoKind.Noise), Run.Scans.Sum(s => s.FalseHits));
        Assert.Equal(Run.Plots.Count, Run.Scans.Sum(s => s.Plots));
        Assert.Equal(Run.Plots.Count(p => p.Kind == EchoKind.Noise), Run.Scans.Sum(s => s.FalsePlots));
        Assert.All(Run.Plots, p => Assert.Equal(EchoKind.Noise, p.Kind));
        Assert.Equal(Run.Plots.OrderBy(p => p.TimeS), Run.Plots);
    }

    [Fact]
    public void A_blanked_sector_has_none()
    {
        var scenario = Noisy();
        var blanked = CollectingSink.Of(scenario with { Radar = scenario.Radar with { Blanked = [new AzimuthSector(0, Math.PI)] } });
        Assert.All(blanked.Hits, h => Assert.InRange(h.BeamAzimuthDeg, 180, 360));
        Assert.Equal(Run.Hits.Where(h => h.BeamAzimuthDeg > 180), blanked.Hits);
    }

    /// <summary>Kolmogorov-Smirnov at the 99.9 % level: 1.9495/√n (asymptotic; from memory, e.g. Knuth vol. 2, 3.3.1).</summary>
    private static void AssertUniform(IEnumerable<double> values)
    {
        var sorted = values.Order().ToArray();
        Assert.InRange(sorted[0], 0, 1);
        Assert.InRange(sorted[^1], 0, 1);
        double greatest = 0;
        for (var i = 0; i < sorted.Length; i++)
        {
            greatest = Math.Max(greatest, Math.Max(sorted[i] - (double)i / sorted.Length, (i + 1.0) / sorted.Length - sorted[i]));
        }

        // Azimuths come in steps of a dwell, half a step wide at most: 1.2 deg / 360 / 2.
        Assert.True(greatest < 1.9495 / Math.Sqrt(sorted.Length) + 0.0017, $"Kolmogorov-Smirnov distance {greatest} for {sorted.Length} values");
    }

    private static Scenario Noisy()
    {
        var scenario = TestScenario.With();
        return scenario with
        {
            Radar = scenario.Radar with { Processing = scenario.Radar.Processing with { FalseAlarmProbability = Pfa } },
            Run = scenario.Run with { DurationS = 600 },
        };
    }
}
