using ScanSim.Physics.Accuracy;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Accuracy;

public sealed class MeasurementAccuracyTests
{
    [Fact]
    public void Errors_agree_with_the_published_bounds()
    {
        var table = ReferenceTable.Load("accuracy_published.csv");
        var range = new Comparison("Range error of a rectangular spectrum", table.Source, 0.0, 1e-5);
        var azimuth = new Comparison("Azimuth error in beamwidths", table.Source, 0.0, 1e-2);
        foreach (string[] row in table.Rows)
        {
            string quantity = table.Text(row, "quantity");
            double width = table.Number(row, "width");
            double snrRatio = table.Number(row, "snr_ratio");
            if (string.Equals(quantity, "range", StringComparison.Ordinal))
            {
                range.Add(quantity, table.Number(row, "expected"), MeasurementAccuracy.RangeSigmaM(width, snrRatio));
            }
            else
            {
                azimuth.Add(quantity, table.Number(row, "expected"), MeasurementAccuracy.AzimuthSigmaRad(width, snrRatio));
            }
        }

        range.Conclude();
        azimuth.Conclude();
    }

    /// <summary>Second route: β of the rectangular spectrum and of the uniform aperture by numerical integration.</summary>
    [Fact]
    public void The_factors_are_the_rms_widths_of_spectrum_and_aperture()
    {
        const int Steps = 200_000;
        double square = 0.0;
        for (int i = 0; i < Steps; i++)
        {
            double x = (i + 0.5) / Steps - 0.5;
            square += 4.0 * Math.PI * Math.PI * x * x / Steps;
        }

        double sigmaS = 1e-6 / Math.Sqrt(square * 2.0 * 50.0);
        Assert.Equal(0.5 * Constants.SpeedOfLightMps * sigmaS, MeasurementAccuracy.RangeSigmaM(1e-6, 50.0), 1e-8);

        // θ3 of the uniform aperture is 2 μ½/π wavelengths per length; its phase slope is 2π x/λ.
        double beamwidthRad = 2.0 * 1.391557378251510 / Math.PI;
        Assert.Equal(1.0 / Math.Sqrt(square * 2.0 * 50.0), MeasurementAccuracy.AzimuthSigmaRad(beamwidthRad, 50.0), 1e-10);
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(-1.0)]
    [InlineData(1e-6)]
    [InlineData(0.5)]
    public void At_low_ratio_the_error_is_that_of_a_uniform_cell(double snrRatio)
    {
        Assert.Equal(RangeCellM / Math.Sqrt(12.0), MeasurementAccuracy.RangeSigmaM(1e-6, snrRatio), 1e-9);
        Assert.Equal(0.02 / Math.Sqrt(12.0), MeasurementAccuracy.AzimuthSigmaRad(0.02, snrRatio), 1e-14);
    }

    [Fact]
    public void Twenty_decibels_more_make_the_error_a_tenth()
    {
        Assert.Equal(0.1, MeasurementAccuracy.RangeSigmaM(1e-6, 1e4) / MeasurementAccuracy.RangeSigmaM(1e-6, 1e2), 1e-12);
        Assert.Equal(0.1, MeasurementAccuracy.AzimuthSigmaRad(0.02, 1e4) / MeasurementAccuracy.AzimuthSigmaRad(0.02, 1e2), 1e-12);
    }

    [Fact]
    public void An_unknown_ratio_has_an_unknown_error()
    {
        Assert.Equal(double.NaN, MeasurementAccuracy.RangeSigmaM(1e-6, double.NaN));
        Assert.Equal(double.NaN, MeasurementAccuracy.AzimuthSigmaRad(0.02, double.NaN));
    }

    private const double RangeCellM = 0.5 * Constants.SpeedOfLightMps * 1e-6;
}
