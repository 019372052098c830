using ScanSim.Testing;

namespace ScanSim.Physics.Tests;

public sealed class NoiseTests
{
    [Fact]
    public void Noise_power_agrees_with_published_examples()
    {
        var table = ReferenceTable.Load("radar_equation_noise.csv");
        var comparison = new Comparison("Noise power of published examples, in units of each row's tolerance", table.Source, 1.0, 0.0, "tolerances");
        foreach (string[] row in table.Rows)
        {
            double powerW = Noise.PowerW(table.Number(row, "temperature_k"), table.Number(row, "bandwidth_hz"));
            double dbm = Decibels.FromRatio(powerW) + 30.0 + table.Number(row, "gain_db");
            double toleranceDb = table.Number(row, "tolerance_db");
            comparison.Add(table.Text(row, "example"), table.Number(row, "expected_dbm") / toleranceDb, dbm / toleranceDb);
        }

        comparison.Conclude();
    }

    /// <summary>
    /// Pozar's receiver: antenna at 0.9·200 K + 0.1·300 K, line of 1.5 dB at 300 K, amplifier 20 dB / F 3 dB, mixer 6 dB loss /
    /// F 7 dB, intermediate amplifier F 1.1 dB; −80 dBm in 1 MHz. The published ratio has two decimals; k adds 0.002 dB.
    /// </summary>
    [Fact]
    public void System_temperature_gives_the_published_signal_to_noise_ratio_of_a_receiver()
    {
        double mixer = (Decibels.ToRatio(7) - 1) / Decibels.ToRatio(20);
        double amplifier = (Decibels.ToRatio(1.1) - 1) / Decibels.ToRatio(20 - 6);
        double noiseFigure = Decibels.ToRatio(3) + mixer + amplifier;
        double temperatureK = Noise.SystemTemperatureK(210.0, Decibels.ToRatio(1.5), 300.0, noiseFigure);
        var comparison = new Comparison(
            "Signal-to-noise ratio of a receiver with line loss", "D. M. Pozar, Microwave Engineering, 2nd ed., Wiley 1998, ex. 12.3, p. 669", 0.0071, 0.0, "dB");
        comparison.Add("output", 29.78, -110.0 - Decibels.FromRatio(Noise.PowerW(temperatureK, 1e6)));
        comparison.Add("input", 35.38, -110.0 - Decibels.FromRatio(Noise.PowerW(210.0, 1e6)));
        comparison.Conclude();
    }

    [Fact]
    public void A_perfect_receiver_without_line_leaves_the_antenna_temperature()
    {
        Assert.Equal(123.0, Noise.SystemTemperatureK(123.0, 1.0, 290.0, 1.0));
    }

    [Fact]
    public void With_everything_at_290_K_the_line_loss_adds_to_the_noise_figure()
    {
        double lossRatio = Decibels.ToRatio(2);
        double noiseFigureRatio = Decibels.ToRatio(4);
        Assert.Equal(290.0 * lossRatio * noiseFigureRatio, Noise.SystemTemperatureK(290.0, lossRatio, 290.0, noiseFigureRatio), 1e-9);
    }
}
