using ScanSim.Physics.Detection;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Detection;

public class IncompleteGammaTests
{
    [Fact]
    public void Both_tails_and_their_logarithms_agree_with_30_digit_values()
    {
        var table = ReferenceTable.Load("detection_incomplete_gamma.csv");
        var tails = new Comparison("Incomplete gamma P and Q, a 0.5 to 4096", table.Source, 0, 5e-13);
        var logs = new Comparison("Logarithms of incomplete gamma P and Q, far below the smallest double", table.Source, 2e-15, 1e-14);
        foreach (var row in table.Rows)
        {
            double a = table.Number(row, "a"), x = table.Number(row, "x");
            double logP = table.Number(row, "log_p"), logQ = table.Number(row, "log_q");
            var name = $"a {a} x {x}";
            logs.Add("log P " + name, logP, IncompleteGamma.LogLowerRegularized(a, x));
            logs.Add("log Q " + name, logQ, IncompleteGamma.LogUpperRegularized(a, x));
            if (logP > -690 && logQ > -690)
            {
                tails.Add("P " + name, Math.Exp(logP), IncompleteGamma.LowerRegularized(a, x));
                tails.Add("Q " + name, Math.Exp(logQ), IncompleteGamma.UpperRegularized(a, x));
            }
        }

        tails.Conclude();
        logs.Conclude();
    }

    [Theory]
    [InlineData(1, 0.0)]
    [InlineData(7.5, 0.0)]
    public void Nothing_lies_below_zero(double a, double x)
    {
        Assert.Equal(0, IncompleteGamma.LowerRegularized(a, x));
        Assert.Equal(1, IncompleteGamma.UpperRegularized(a, x));
        Assert.Equal(double.NegativeInfinity, IncompleteGamma.LogLowerRegularized(a, x));
        Assert.Equal(0, IncompleteGamma.LogUpperRegularized(a, x));
    }

    [Theory]
    [InlineData(1)]
    [InlineData(7.5)]
    public void Everything_lies_below_infinity(double a)
    {
        Assert.Equal(1, IncompleteGamma.LowerRegularized(a, double.PositiveInfinity));
        Assert.Equal(0, IncompleteGamma.UpperRegularized(a, double.PositiveInfinity));
    }

    [Fact]
    public void Exponential_distribution_is_the_case_a_1()
    {
        var comparison = new Comparison("Q(1, x) is exp(-x)", "DLMF 8.4.5", 0, 2e-13);
        foreach (var x in new[] { 1e-300, 1e-9, 0.5, 1, 2, 40, 700 })
        {
            comparison.Add($"x {x}", Math.Exp(-x), IncompleteGamma.UpperRegularized(1, x));
        }

        comparison.Conclude();
    }

    [Fact]
    public void Nan_comes_out_as_nan_and_arguments_outside_the_domain_are_refused()
    {
        Assert.True(double.IsNaN(IncompleteGamma.UpperRegularized(double.NaN, 1)));
        Assert.True(double.IsNaN(IncompleteGamma.LowerRegularized(2, double.NaN)));
        Assert.True(double.IsNaN(IncompleteGamma.LogUpperRegularized(2.5, double.NaN)));
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => IncompleteGamma.UpperRegularized(0, 1));
        Assert.Contains("a is 0; it must be greater than 0", error.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => IncompleteGamma.LowerRegularized(1, -1e-300));
    }
}
