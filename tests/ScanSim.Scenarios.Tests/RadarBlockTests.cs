namespace ScanSim.Scenarios.Tests;

public sealed class RadarBlockTests
{
    [Fact]
    public void What_is_left_out_has_the_documented_default()
    {
        var scenario = ScenarioFile.Parse(SmallScenario.Text, SmallScenario.File);
        var radar = scenario.Radar;
        Assert.Equal("", scenario.Description);
        Assert.Equal(4.0 / 3.0, scenario.Environment.EffectiveEarthFactor);
        Assert.Equal(0, radar.Antenna.TiltRad);
        Assert.Equal(-35, 10 * Math.Log10(radar.Antenna.SideLobeFloorRatio), 1e-12);
        Assert.Equal((1.0, 1.0), (radar.Losses.TransmitRatio, radar.Losses.ProcessingRatio));
        Assert.Equal((1, 1, 1), (radar.Plots.RangeGapCells, radar.Plots.AzimuthGapDwells, radar.Plots.MinimumHits));
        Assert.Equal(4 * radar.Antenna.Azimuth.BeamwidthRad, radar.Plots.MaximumWidthRad);
        Assert.Equal((0.0, 0.0), (radar.Accuracy.RangeSigmaM, radar.Accuracy.AzimuthSigmaRad));
        Assert.Equal(radar.Waveform.PulseWidthS, radar.Waveform.CompressedWidthS);
        Assert.Empty(radar.Blanked);
    }

    /// <summary>Ta + Tline (L − 1) + L 290 (F − 1) with 290 K throughout is 290 F L = 290 · 10^0.4.</summary>
    [Fact]
    public void The_default_noise_temperature_is_290_K_times_noise_figure_and_line_loss()
    {
        var receiver = ScenarioFile.Parse(SmallScenario.Text, SmallScenario.File).Radar.Receiver;
        Assert.Equal(728.4471, receiver.SystemTemperatureK, 1e-4);
        Assert.Equal(290, receiver.Parts!.AntennaTemperatureK);
    }

    /// <summary>By hand: 100 + 300 (1.258925 − 1) + 1.258925 · 290 (1.995262 − 1) = 541.036 K.</summary>
    [Fact]
    public void Given_temperatures_of_antenna_and_line_enter_the_noise_temperature()
    {
        var text = SmallScenario.With("\"lineLoss\": \"1 dB\"", "\"lineLoss\": \"1 dB\", \"antennaTemperature\": \"100 K\", \"lineTemperature\": \"26.85 degC\"");
        Assert.Equal(541.036, ScenarioFile.Parse(text, SmallScenario.File).Radar.Receiver.SystemTemperatureK, 2e-3);
    }

    [Fact]
    public void A_system_temperature_is_taken_as_it_is()
    {
        var receiver = ScenarioFile.Parse(SmallScenario.With("\"noiseFigure\": \"3 dB\", \"lineLoss\": \"1 dB\"", "\"systemTemperature\": \"500 K\""), SmallScenario.File).Radar.Receiver;
        Assert.Equal(500, receiver.SystemTemperatureK);
        Assert.Null(receiver.Parts);
    }

    [Fact]
    public void A_sector_scan_has_its_azimuths_between_0_and_a_full_turn()
    {
        var text = SmallScenario.With("\"rotation\": \"15 rpm\"", "\"sector\": { \"from\": \"-60 deg\", \"to\": \"-300 deg\", \"rate\": \"30 deg/s\", \"turnaround\": \"500 ms\" }");
        var sector = Assert.IsType<Scan.Sector>(ScenarioFile.Parse(text, SmallScenario.File).Radar.Scan);
        Assert.Equal(300, sector.Limits.FromRad * 180 / Math.PI, 1e-9);
        Assert.Equal(60, sector.Limits.ToRad * 180 / Math.PI, 1e-9);
        Assert.Equal(120, sector.Limits.WidthRad * 180 / Math.PI, 1e-9);
        Assert.Equal(0.5, sector.TurnaroundS);
    }

    /// <summary>Linear in dB between the rows: −3.0103 dB of a fall of 6 dB over 2 deg lies 1.00343 deg off.</summary>
    [Fact]
    public void The_beamwidth_of_a_table_is_that_between_its_half_power_points()
    {
        var text = SmallScenario.With(
            "\"shape\": \"uniform\", \"beamwidth\": \"20 deg\"",
            "\"shape\": \"table\", \"table\": [{ \"offset\": \"-4 deg\", \"level\": \"-12 dB\" }, { \"offset\": \"0 deg\", \"level\": \"0 dB\" }, { \"offset\": \"2 deg\", \"level\": \"-6 dB\" }]");
        var table = Assert.IsType<PatternCut.Table>(ScenarioFile.Parse(text, SmallScenario.File).Radar.Antenna.Elevation);
        Assert.Equal(2 * 1.0034333, table.BeamwidthRad * 180 / Math.PI, 1e-6);
        Assert.Equal([-12.0, 0, -6], table.LevelsDb);
    }

    [Fact]
    public void Rotation_in_any_unit_is_one_turn_a_period()
    {
        foreach (var rotation in new[] { "15 rpm", "90 deg/s", "1.5707963267948966 rad/s" })
        {
            var scan = ScenarioFile.Parse(SmallScenario.With("15 rpm", rotation), SmallScenario.File).Radar.Scan;
            Assert.Equal(4.0, Assert.IsType<Scan.Rotation>(scan).PeriodS);
        }
    }
}
