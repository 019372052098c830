using ScanSim.Physics.Antennas;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Antennas;

public sealed class ApertureFieldTests
{
    [Fact]
    public void The_closed_forms_agree_with_independently_computed_levels()
    {
        var table = ReferenceTable.Load("antenna_m1851_pattern.csv");
        var comparison = new Comparison("Aperture patterns over μ", table.Source, 1e-7, 0.0, "dB");
        foreach (string[] row in table.Rows)
        {
            double field = ApertureField.Relative(Enum.Parse<ApertureTaper>(table.Text(row, "taper")), table.Number(row, "mu"));
            comparison.Add(
                $"{table.Text(row, "taper")}, K {table.Text(row, "k_used")}, {table.Text(row, "offset_deg")} deg",
                table.Number(row, "level_db"),
                Decibels.FromRatio(field * field));
        }

        comparison.Conclude();
    }

    [Fact]
    public void Half_power_side_lobe_and_first_null_lie_where_the_recommendation_has_them()
    {
        var table = ReferenceTable.Load("antenna_m1851_distributions.csv");
        var width = new Comparison("Beamwidth constants of aperture distributions", table.Source, 6e-9, 0.0, "deg");
        var lobe = new Comparison("First side lobe of aperture distributions, computed", table.Source, 2e-6, 0.0, "dB");
        var printed = new Comparison("First side lobe of aperture distributions, as published", table.Source, 0.6, 0.0, "dB");
        var zero = new Comparison("Field at the first null of aperture distributions", table.Source, 1e-15, 0.0);
        foreach (string[] row in table.Rows)
        {
            var taper = Enum.Parse<ApertureTaper>(table.Text(row, "taper"));
            string name = taper.ToString();
            double nullMu = Math.PI * table.Number(row, "first_null_wavelengths_per_aperture");
            double lobeDb = FirstSideLobeDb(taper, nullMu);
            width.Add(name, table.Number(row, "exact_k_deg"), ApertureField.HalfPowerMu(taper) * 360.0 / (Math.PI * Math.PI));
            lobe.Add(name, table.Number(row, "first_side_lobe_db"), lobeDb);
            printed.Add(name, table.Number(row, "published_side_lobe_db"), lobeDb);
            zero.Add(name, 0.0, ApertureField.Relative(taper, nullMu));
        }

        width.Conclude();
        lobe.Conclude();
        printed.Conclude();
        zero.Conclude();
    }

    [Theory]
    [InlineData(ApertureTaper.Uniform, 0.0, 1.0)]
    [InlineData(ApertureTaper.Cosine, Math.PI / 2, Math.PI / 4)]
    [InlineData(ApertureTaper.CosineSquared, Math.PI, 0.5)]
    public void Removable_singularities_are_filled(ApertureTaper taper, double mu, double limit)
    {
        Assert.Equal(limit, ApertureField.Relative(taper, mu), 1e-15);
        foreach (double step in new[] { 1e-15, 1e-12, 1e-8, 1e-5 })
        {
            Assert.Equal(limit, ApertureField.Relative(taper, mu + step), 1e-15 + step);
            Assert.Equal(limit, ApertureField.Relative(taper, mu - step), 1e-15 + step);
        }
    }

    /// <summary>Second route: the Fourier integral over the aperture by the midpoint rule with 4,000 strips.</summary>
    [Theory]
    [InlineData(ApertureTaper.Uniform, 0)]
    [InlineData(ApertureTaper.Cosine, 1)]
    [InlineData(ApertureTaper.CosineSquared, 2)]
    public void The_field_is_the_Fourier_integral_of_the_illumination(ApertureTaper taper, int power)
    {
        const int Strips = 4000;
        for (double mu = 0.0; mu < 40.0; mu += 0.173)
        {
            double field = 0.0;
            double peak = 0.0;
            for (int i = 0; i < Strips; i++)
            {
                double x = (i + 0.5) / Strips * 2.0 - 1.0;
                double weight = Math.Pow(Math.Cos(0.5 * Math.PI * x), power);
                field += weight * Math.Cos(mu * x);
                peak += weight;
            }

            Assert.Equal(field / peak, ApertureField.Relative(taper, mu), 3e-6);
        }
    }

    private static double FirstSideLobeDb(ApertureTaper taper, double nullMu)
    {
        double greatest = 0.0;
        for (double mu = nullMu; mu < nullMu + Math.PI; mu += 1e-4)
        {
            greatest = Math.Max(greatest, Math.Abs(ApertureField.Relative(taper, mu)));
        }

        return 2.0 * Decibels.FromRatio(greatest);
    }
}
