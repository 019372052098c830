using ScanSim.Testing;

namespace ScanSim.Physics.Tests;

public sealed class RadarEquationTests
{
    private const string ByHand = "Worked by hand from the definitions: 1 kW, 30 dBi, 3 GHz, 1 m² at 1 km (three printed digits)";

    [Fact]
    public void The_three_factors_have_their_common_practice_values()
    {
        double wavelengthM = Constants.SpeedOfLightMps / 3e9;
        double densityWPerM2 = RadarEquation.PowerDensityWPerM2(1e3, 1e3, 1e3);
        double fraction = RadarEquation.ReturnedFractionPerM2(1.0, 1e3);
        double apertureM2 = RadarEquation.EffectiveApertureM2(1e3, wavelengthM);
        var linear = new Comparison("The three factors of the radar equation", ByHand, 0.0, 0.7e-3);
        linear.Add("power density at 1 km, W/m²", 0.0796, densityWPerM2);
        linear.Add("returned fraction per m²", 7.96e-8, fraction);
        linear.Add("effective aperture, m²", 0.795, apertureM2);
        linear.Conclude();
        var levels = new Comparison("Levels of the radar equation", ByHand, 0.05, 0.0, "dB");
        levels.Add("returned fraction", -71.0, Decibels.FromRatio(fraction));
        levels.Add("received power, dBW", -83.0, Decibels.FromRatio(RadarEquation.ReceivedPowerW(1e3, 1e3, 1e3, wavelengthM, 1.0, 1e3)));
        levels.Conclude();
    }

    [Fact]
    public void Worked_examples_come_out_as_published()
    {
        var table = ReferenceTable.Load("radar_equation_examples.csv");
        var published = new Comparison("Radar equation: nine published worked examples", table.Source, 0.0, 1.5e-4);
        var recomputed = new Comparison("Radar equation: the same examples recomputed independently", table.Source, 0.0, 6e-9);
        foreach (string[] row in table.Rows)
        {
            double actual = Solve(table, row);
            published.Add(table.Text(row, "example"), table.Number(row, "expected"), actual);
            recomputed.Add(table.Text(row, "example"), table.Number(row, "recomputed"), actual);
        }

        published.Conclude();
        recomputed.Conclude();
    }

    [Fact]
    public void Dish_and_noise_figure_examples_come_out_within_the_rounded_constant_of_their_form()
    {
        var table = ReferenceTable.Load("radar_equation_dish_examples.csv");
        var ranges = new Comparison("Radar equation: published ranges from dish, bandwidth and noise figure", table.Source, 0.0, 1.1e-2);
        var powers = new Comparison("Radar equation: published power from dish, bandwidth and noise figure", table.Source, 0.0, 5e-2);
        foreach (string[] row in table.Rows)
        {
            double apertureM2 = 0.65 * Math.PI / 4.0 * Math.Pow(table.Number(row, "diameter_m"), 2);
            double wavelengthM = table.Number(row, "wavelength_m");
            double gainRatio = apertureM2 / RadarEquation.EffectiveApertureM2(1.0, wavelengthM);
            var terms = new RadarEquationTerms
            {
                PeakPowerW = Given(table, row, "peak_power_w"),
                TransmitGainRatio = gainRatio,
                ReceiveGainRatio = gainRatio,
                WavelengthM = wavelengthM,
                RcsM2 = table.Number(row, "rcs_m2"),
                RangeM = Given(table, row, "range_m"),
                LossRatio = 1.0,
                NoiseTemperatureK = Noise.SystemTemperatureK(0.0, 1.0, 290.0, table.Number(row, "noise_figure_ratio")),
                NoiseBandwidthHz = table.Number(row, "bandwidth_hz"),
                EnergyGainRatio = 1.0,
            };
            bool range = string.Equals(table.Text(row, "solve"), "range_m", StringComparison.Ordinal);
            (range ? ranges : powers).Add(
                table.Text(row, "example"), table.Number(row, "expected"), range ? terms.SolveRangeM(1.0) : terms.SolvePeakPowerW(1.0));
        }

        ranges.Conclude();
        powers.Conclude();
    }

    [Fact]
    public void Thirty_decibels_less_cross_section_cut_the_range_as_published()
    {
        var comparison = new Comparison(
            "Range with the cross-section lowered by 30 dB", "USAF Academy, ECE 495 course notes, lesson 3 Q9: 472 km become 84 km", 0.5, 0.0, "km");
        RadarEquationTerms terms = OneWattOfNoise() with { RcsM2 = 1e-3 };
        double snrRatio = (terms with { RcsM2 = 1.0, RangeM = 472e3 }).SnrRatio();
        comparison.Add("Q9", 84.0, terms.SolveRangeM(snrRatio) / 1e3);
        comparison.Conclude();
    }

    [Fact]
    public void A_dish_has_its_published_gain()
    {
        var comparison = new Comparison(
            "Gain of a 3 m dish at 10 GHz, linear efficiency 0.7", "A. K. Maini, Microwaves and Radar, 3rd ed., Khanna 2004, ch. 7 ex. 6, p. 334", 0.05, 0.0, "dB");
        double apertureM2 = Math.PI / 4.0 * Math.Pow(0.7 * 3.0, 2);
        comparison.Add("gain", 46.8, Decibels.FromRatio(apertureM2 / RadarEquation.EffectiveApertureM2(1.0, 0.03)));
        comparison.Conclude();
    }

    [Fact]
    public void Received_power_falls_by_40_dB_when_range_grows_tenfold()
    {
        double near = RadarEquation.ReceivedPowerW(1e4, 1e3, 1e3, 0.03, 1.0, 1e3);
        double far = RadarEquation.ReceivedPowerW(1e4, 1e3, 1e3, 0.03, 1.0, 1e4);
        Assert.Equal(-40.0, Decibels.FromRatio(far / near), 1e-12);
    }

    [Fact]
    public void The_whole_equation_is_the_product_of_its_factors_over_the_loss()
    {
        double whole = RadarEquation.ReceivedPowerW(2e4, 900, 700, 0.1, 3.0, 5e4, 2.5);
        double factors = RadarEquation.PowerDensityWPerM2(2e4, 900, 5e4)
            * RadarEquation.ReturnedFractionPerM2(3.0, 5e4)
            * RadarEquation.EffectiveApertureM2(700, 0.1) / 2.5;
        Assert.Equal(factors, whole);
        double closedForm = 2e4 * 900 * 700 * 0.01 * 3.0 / (Math.Pow(4 * Math.PI, 3) * Math.Pow(5e4, 4) * 2.5);
        Assert.Equal(1.0, whole / closedForm, 1e-14);
    }

    /// <summary>Terms in which the noise is 1 W, so that the signal-to-noise ratio is the received power in watts.</summary>
    internal static RadarEquationTerms OneWattOfNoise() => new()
    {
        PeakPowerW = 1.0,
        TransmitGainRatio = 1.0,
        ReceiveGainRatio = 1.0,
        WavelengthM = 1.0,
        RcsM2 = 1.0,
        RangeM = 1.0,
        LossRatio = 1.0,
        NoiseTemperatureK = 1.0 / Constants.BoltzmannJPerK,
        NoiseBandwidthHz = 1.0,
        EnergyGainRatio = 1.0,
    };

    private static double Solve(ReferenceTable table, string[] row)
    {
        RadarEquationTerms terms = OneWattOfNoise() with
        {
            PeakPowerW = Given(table, row, "peak_power_w"),
            TransmitGainRatio = table.Number(row, "transmit_gain_ratio"),
            ReceiveGainRatio = table.Number(row, "receive_gain_ratio"),
            WavelengthM = table.Number(row, "wavelength_m"),
            RcsM2 = Given(table, row, "rcs_m2"),
            RangeM = Given(table, row, "range_m"),
        };
        double receivedPowerW = Given(table, row, "received_power_w");
        return table.Text(row, "solve") switch
        {
            "received_power_w" => terms.SnrRatio(),
            "rcs_m2" => terms.SolveRcsM2(receivedPowerW),
            "range_m" => terms.SolveRangeM(receivedPowerW),
            "peak_power_w" => terms.SolvePeakPowerW(receivedPowerW),
            string other => throw new InvalidDataException(other),
        };
    }

    /// <summary>NaN where the row leaves the term open, so that a solution that reads it shows.</summary>
    private static double Given(ReferenceTable table, string[] row, string column) =>
        table.Text(row, column).Length == 0 ? double.NaN : table.Number(row, column);
}
