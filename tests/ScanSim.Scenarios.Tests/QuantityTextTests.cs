using ScanSim.Testing;

namespace ScanSim.Scenarios.Tests;

public sealed class QuantityTextTests
{
    [Fact]
    public void Units_have_their_published_size_in_SI()
    {
        var table = ReferenceTable.Load("unit_conversions.csv");
        var comparison = new Comparison("Units have their published size in SI", table.Source, 0, 5e-7);
        foreach (var row in table.Rows)
        {
            var text = table.Text(row, "quantity");
            Assert.True(QuantityText.TryParse(text, Enum.Parse<Dimension>(table.Text(row, "dimension")), out var si, out var problem), problem);
            comparison.Add(text, table.Number(row, "si"), si);
        }

        comparison.Conclude();
    }

    [Fact]
    public void Every_unit_has_a_reference_row()
    {
        var table = ReferenceTable.Load("unit_conversions.csv");
        var covered = table.Rows.Select(row => table.Text(row, "dimension") + " " + table.Text(row, "quantity").Split(' ')[1]).ToHashSet(StringComparer.Ordinal);
        var missing = Enum.GetValues<Dimension>()
            .SelectMany(dimension => Units.Of(dimension).Select(unit => $"{dimension} {unit.Symbol}"))
            .Where(unit => !covered.Contains(unit) && unit is not ("Frequency Hz" or "Power W" or "Length m" or "Area m^2" or "Time s"));
        Assert.Empty(missing);
    }

    [Theory]
    [InlineData("0.25 us", Dimension.Time, 0.25e-6)]
    [InlineData("9.41 GHz", Dimension.Frequency, 9.41e9)]
    [InlineData("12 nmi", Dimension.Length, 22_224)]
    [InlineData("1000 ft", Dimension.Length, 304.8)]
    [InlineData("1000 ft/min", Dimension.Speed, 5.08)]
    [InlineData("0 dB", Dimension.Ratio, 1)]
    [InlineData("180 deg", Dimension.Angle, Math.PI)]
    [InlineData("10min", Dimension.Time, 600)]
    [InlineData("  10   min  ", Dimension.Time, 600)]
    [InlineData("+1.5e3 m", Dimension.Length, 1500)]
    [InlineData("-3 m", Dimension.Length, -3)]
    [InlineData("1e3m", Dimension.Length, 1000)]
    public void A_quantity_is_the_nearest_double_to_its_SI_value(string text, Dimension dimension, double expected)
    {
        Assert.True(QuantityText.TryParse(text, dimension, out var si, out var problem), problem);
        Assert.Equal(expected, si);
        Assert.Equal("", problem);
    }

    [Theory]
    [InlineData("10", "read \"10\" (a bare number where a unit is needed), expected time with its unit (s, ms, us, ns, min, h)")]
    [InlineData("10 km", "read \"10 km\" (km is a unit of length, not of time), expected time with its unit (s, ms, us, ns, min, h)")]
    [InlineData("10 Min", "read \"10 Min\" ('Min' is not a unit; units are case-sensitive: min), expected time with its unit (s, ms, us, ns, min, h)")]
    [InlineData("10 weeks", "read \"10 weeks\" ('weeks' is not a unit of time), expected time with its unit (s, ms, us, ns, min, h)")]
    [InlineData("", "read \"\" (empty), expected time with its unit (s, ms, us, ns, min, h)")]
    [InlineData("soon", "read \"soon\" (it does not begin with a number), expected time with its unit (s, ms, us, ns, min, h)")]
    [InlineData("1e999 s", "read \"1e999 s\" (the number is too large), expected time with its unit (s, ms, us, ns, min, h)")]
    [InlineData(".5 s", "read \".5 s\" (it does not begin with a number), expected time with its unit (s, ms, us, ns, min, h)")]
    [InlineData("1,5 s", "read \"1,5 s\" (',5 s' is not a unit of time), expected time with its unit (s, ms, us, ns, min, h)")]
    public void What_is_no_quantity_is_told_with_what_would_be_right(string text, string expected)
    {
        Assert.False(QuantityText.TryParse(text, Dimension.Time, out var si, out var problem));
        Assert.Equal(double.NaN, si);
        Assert.Equal(expected, problem);
    }

    [Theory]
    [InlineData(22_224, Dimension.Length, "nmi", "12 nmi")]
    [InlineData(304.8, Dimension.Length, "ft", "1000 ft")]
    [InlineData(0.1, Dimension.Area, "dBsm", "-10 dBsm")]
    [InlineData(1234.5678, Dimension.Length, "km", "1.23457 km")]
    [InlineData(0, Dimension.Length, "m", "0 m")]
    [InlineData(1e-9, Dimension.Length, "m", "1E-09 m")]
    [InlineData(300, Dimension.Temperature, "degC", "26.85 degC")]
    public void An_SI_value_is_shown_in_the_unit_asked_for(double si, Dimension dimension, string unit, string expected) =>
        Assert.Equal(expected, QuantityText.Format(si, dimension, unit));

    [Fact]
    public void An_unknown_unit_to_show_is_the_callers_error() =>
        Assert.Throws<ArgumentException>(() => QuantityText.Format(1, Dimension.Length, "kg"));

    [Fact]
    public void What_is_shown_reads_back_within_the_digits_shown()
    {
        foreach (var dimension in Enum.GetValues<Dimension>())
        {
            foreach (var unit in Units.Of(dimension))
            {
                var si = unit.ToSi(12.34567890123);
                Assert.True(QuantityText.TryParse(QuantityText.Format(si, dimension, unit.Symbol, 15), dimension, out var again, out var problem), problem);
                Assert.Equal(si, again, 1e-13 * si);
            }
        }
    }
}
