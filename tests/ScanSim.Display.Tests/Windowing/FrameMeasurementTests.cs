using ScanSim.Display.Windowing;

namespace ScanSim.Display.Tests.Windowing;

public sealed class FrameMeasurementTests
{
    [Fact]
    public void Quantiles_rate_and_processor_share_are_those_of_the_frames_after_the_first_second()
    {
        var processorS = 0.0;
        var measurement = new FrameMeasurement(1, () => processorS);
        measurement.Add(10, 5);
        for (var frame = 1; frame <= 200; frame++)
        {
            processorS += 0.005;

            // Frames of the second measured take 1, 2, ... milliseconds.
            measurement.Add(10 + frame / 100.0, frame <= 100 ? 7 : (frame - 100) / 1000.0);
        }

        Assert.True(measurement.IsComplete);
        Assert.Equal(100, measurement.Frames);
        Assert.Equal(0.050, measurement.WorkS(0.50), 12);
        Assert.Equal(0.099, measurement.WorkS(0.99), 12);
        Assert.Equal(0.100, measurement.WorkS(1), 12);
        Assert.Equal(100, measurement.RatePerS, 6);
        Assert.Equal(0.5, measurement.ProcessorRatio, 6);
    }

    [Fact]
    public void Rounds_without_a_frame_count_as_time_only()
    {
        var measurement = new FrameMeasurement(1, () => 0);
        for (var round = 0; round <= 8; round++)
        {
            measurement.Add(round / 4.0, round == 6 ? 0.003 : null);
        }

        Assert.True(measurement.IsComplete);
        Assert.Equal(1, measurement.Frames);
        Assert.Equal(1, measurement.RatePerS, 12);
        Assert.True(double.IsNaN(new FrameMeasurement(1, () => 0).WorkS(0.5)));
    }
}
