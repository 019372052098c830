using ScanSim.Physics.Detection;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Detection;

public class BeamShapeLossTests
{
    [Fact]
    public void Losses_agree_with_the_computed_integrals_and_the_published_roundings()
    {
        var table = ReferenceTable.Load("detection_beam_shape.csv");
        var exact = new Comparison("Beam-shape loss of a Gaussian beam", table.Source, 0, 1e-13);
        foreach (var row in table.Rows)
        {
            var quantity = table.Text(row, "quantity");
            var actual = quantity switch
            {
                "matched" => BeamShapeLoss.DenseMatchedRatio,
                "uniform" => BeamShapeLoss.UniformWindowRatio(table.Number(row, "window_beamwidths")),
                _ => BeamShapeLoss.MeanPowerRatio(table.Number(row, "window_beamwidths")),
            };
            exact.Add($"{quantity} {table.Text(row, "window_beamwidths")}", table.Number(row, "loss_ratio"), actual);
        }

        exact.Conclude();
        var published = new Comparison("Beam-shape loss as printed: 1.24 dB matched, 1.6 dB uniform window", "Barton 1988; Blake 1969 (both from memory)", 0.05, 0, "dB");
        published.Add("matched", 1.24, Scale.Db(BeamShapeLoss.DenseMatchedRatio));
        published.Add("uniform", 1.6, Scale.Db(BeamShapeLoss.UniformWindowRatio(BeamShapeLoss.OptimumWindowBeamwidths)));
        published.Conclude();
    }

    [Fact]
    public void No_window_beats_the_optimum_one()
    {
        var best = BeamShapeLoss.UniformWindowRatio(BeamShapeLoss.OptimumWindowBeamwidths);
        for (var width = 0.05; width < 5; width += 0.05)
        {
            Assert.True(BeamShapeLoss.UniformWindowRatio(width) > best);
        }
    }

    [Fact]
    public void Narrow_window_sees_the_peak_and_nothing_has_infinite_loss()
    {
        Assert.Equal(1, BeamShapeLoss.MeanPowerRatio(1e-6), 1e-11);
        Assert.Equal(1, BeamShapeLoss.MeanPowerRatio(0));
        Assert.Equal(double.PositiveInfinity, BeamShapeLoss.UniformWindowRatio(0));
        Assert.True(double.IsNaN(BeamShapeLoss.UniformWindowRatio(double.NaN)));
        Assert.Throws<ArgumentOutOfRangeException>(() => BeamShapeLoss.UniformWindowRatio(-1));
    }
}
