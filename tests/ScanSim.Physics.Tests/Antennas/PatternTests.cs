using ScanSim.Physics.Antennas;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Antennas;

public sealed class PatternTests
{
    private static readonly double Beamwidth = Degrees.ToRad(1.45);

    public static TheoryData<Pattern> Symmetric =>
    [
        new GaussianPattern(Beamwidth),
        new AperturePattern(ApertureTaper.Uniform, Beamwidth),
        new AperturePattern(ApertureTaper.Cosine, Beamwidth),
        new AperturePattern(ApertureTaper.CosineSquared, Beamwidth),
        new AperturePattern(ApertureTaper.Cosine, 2.0),
        new GaussianPattern(2.0),
    ];

    [Theory]
    [MemberData(nameof(Symmetric))]
    public void The_peak_is_one_half_power_falls_at_half_the_beamwidth_and_both_sides_agree(Pattern pattern)
    {
        Assert.Equal(1.0, pattern.GainRatio(0.0));
        Assert.Equal(0.5, pattern.GainRatio(0.5 * pattern.BeamwidthRad), 1e-14);
        for (double offset = 0.0; offset <= Math.PI; offset += 0.0137)
        {
            double gain = pattern.GainRatio(offset);
            Assert.InRange(gain, 0.0, 1.0);
            Assert.Equal(gain, pattern.GainRatio(-offset));
        }
    }

    [Theory]
    [MemberData(nameof(Symmetric))]
    public void An_unknown_angle_has_an_unknown_gain(Pattern pattern) => Assert.Equal(double.NaN, pattern.GainRatio(double.NaN));

    [Fact]
    public void The_main_lobe_over_the_angle_agrees_with_the_recommendation()
    {
        var table = ReferenceTable.Load("antenna_m1851_pattern.csv");
        var comparison = new Comparison("Aperture patterns over the angle, main lobe", table.Source, 2.5e-3, 0.0, "dB");
        foreach (string[] row in table.Rows)
        {
            double offsetDeg = table.Number(row, "offset_deg");
            if (string.Equals(table.Text(row, "k_used"), "exact", StringComparison.Ordinal) && offsetDeg <= 1.45)
            {
                var pattern = new AperturePattern(Enum.Parse<ApertureTaper>(table.Text(row, "taper")), Beamwidth);
                comparison.Add(
                    $"{table.Text(row, "taper")} at {offsetDeg} deg",
                    table.Number(row, "level_db"),
                    Decibels.FromRatio(pattern.GainRatio(Degrees.ToRad(offsetDeg))));
            }
        }

        comparison.Conclude();
    }

    [Fact]
    public void The_Gaussian_beam_is_a_parabola_of_12_041_dB()
    {
        var comparison = new Comparison("Gaussian beam", "Definition (half power at half the beamwidth): 12.0412 (θ/θ3)² dB", 0.0, 4e-6, "dB");
        var pattern = new GaussianPattern(Beamwidth);
        foreach (double widths in new[] { 0.1, 0.25, 0.5, 1.0, 1.5, 2.0 })
        {
            comparison.Add($"{widths} beamwidths", -12.0412 * widths * widths, Decibels.FromRatio(pattern.GainRatio(widths * Beamwidth)));
        }

        comparison.Conclude();
    }

    [Fact]
    public void Behind_the_aperture_nothing_is_radiated()
    {
        var pattern = new AperturePattern(ApertureTaper.Uniform, Beamwidth);
        Assert.Equal(0.0, pattern.GainRatio(Math.PI));
        Assert.Equal(0.0, pattern.GainRatio(-1.6));
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(-0.1)]
    [InlineData(7.0)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void A_beamwidth_that_is_none_is_refused(double beamwidthRad)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new GaussianPattern(beamwidthRad));
        Assert.Throws<ArgumentOutOfRangeException>(() => new AperturePattern(ApertureTaper.Cosine, beamwidthRad));
        Assert.Throws<ArgumentOutOfRangeException>(() => new CosecantSquaredPattern(beamwidthRad, 0.0, 0.5));
    }
}
