using ScanSim.Physics.Detection;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Detection;

public class MarcumQTests
{
    [Fact]
    public void Q_and_its_complement_agree_with_the_table_in_both_tails()
    {
        var table = ReferenceTable.Load("detection_marcum_q.csv");
        var comparison = new Comparison("Marcum Q and its complement, m 1 to 200, a and b 0 to 100", table.Source, Scale.SmallestNormal, 1e-12);
        foreach (var row in table.Rows)
        {
            var (m, a, b) = (table.Whole(row, "m"), table.Number(row, "a"), table.Number(row, "b"));
            comparison.Add($"Q_{m}({a}, {b})", table.Number(row, "q"), MarcumQ.Q(m, a, b));
            comparison.Add($"1 - Q_{m}({a}, {b})", table.Number(row, "complement"), MarcumQ.Complement(m, a, b));
        }

        comparison.Conclude();
    }

    [Fact]
    public void Tails_down_to_1e_300_agree_with_the_table_as_values_and_as_logarithms()
    {
        var table = ReferenceTable.Load("detection_marcum_q_tails.csv");
        var values = new Comparison("Marcum Q tails from 1e-10 to 1e-300", table.Source, 0, 1e-12);
        var logs = new Comparison("Logarithms of Marcum Q tails from 1e-10 to 1e-300", table.Source, 0, 5e-14);
        foreach (var row in table.Rows)
        {
            var (m, a, b) = (table.Whole(row, "m"), table.Number(row, "a"), table.Number(row, "b"));
            var upper = table.Text(row, "tail") == "upper";
            var name = $"{table.Text(row, "tail")} tail, m {m} a {a} b {b}";
            values.Add(name, table.Number(row, upper ? "q" : "complement"), upper ? MarcumQ.Q(m, a, b) : MarcumQ.Complement(m, a, b));
            logs.Add(name, table.Number(row, "log_tail"), upper ? MarcumQ.LogQ(m, a, b) : MarcumQ.LogComplement(m, a, b));
        }

        values.Conclude();
        logs.Conclude();
    }

    [Fact]
    public void Arguments_of_several_hundred_agree_with_the_table()
    {
        var table = ReferenceTable.Load("detection_marcum_q_large.csv");
        var values = new Comparison("Marcum Q and its complement, a 30 to 600, m to 1024", table.Source, 0, 5e-12);
        foreach (var row in table.Rows)
        {
            var (m, a, b) = (table.Whole(row, "m"), table.Number(row, "a"), table.Number(row, "b"));
            values.Add($"Q_{m}({a}, {b})", Math.Exp(table.Number(row, "log_q")), MarcumQ.Q(m, a, b));
            values.Add($"1 - Q_{m}({a}, {b})", Math.Exp(table.Number(row, "log_complement")), MarcumQ.Complement(m, a, b));
        }

        values.Conclude();
    }

    [Fact]
    public void Q_plus_complement_is_one_and_both_stay_probabilities()
    {
        for (var i = 0; i < 4000; i++)
        {
            // A low-discrepancy walk over m, a, b on logarithmic scales.
            var m = 1 + (int)Math.Pow(2000, i * 0.6180339887498949 % 1);
            var a = Math.Pow(10, 9 * (i * 0.7548776662466927 % 1) - 6);
            var b = Math.Pow(10, 9 * (i * 0.5698402909980532 % 1) - 6);
            var q = MarcumQ.Q(m, a, b);
            var complement = MarcumQ.Complement(m, a, b);
            Assert.InRange(q, 0, 1);
            Assert.InRange(complement, 0, 1);
            Assert.Equal(1, q + complement, 1e-15);
            Assert.False(double.IsNaN(MarcumQ.LogQ(m, a, b)) || double.IsNaN(MarcumQ.LogComplement(m, a, b)));
        }
    }

    [Fact]
    public void Recurrence_in_the_order_holds()
    {
        // DLMF has no Marcum section; the difference Q_(m+1) − Q_m = (b/a)^m·exp(−(a²+b²)/2)·I_m(ab) is symmetric in a and b up to
        // (b/a)^(2m), which ties four values together without a Bessel function.
        var comparison = new Comparison("Marcum Q: [Q_(m+1)-Q_m](a,b)·(a/b)^2m = [Q_(m+1)-Q_m](b,a)", "Marcum 1960, difference in the order", 0, 1e-9);
        foreach (var (m, a, b) in new[] { (1, 3.0, 4.0), (2, 5.0, 3.0), (5, 8.0, 10.0), (10, 20.0, 22.0) })
        {
            var left = (MarcumQ.Q(m + 1, a, b) - MarcumQ.Q(m, a, b)) * Math.Pow(a / b, 2 * m);
            comparison.Add($"m {m} a {a} b {b}", MarcumQ.Q(m + 1, b, a) - MarcumQ.Q(m, b, a), left);
        }

        comparison.Conclude();
    }

    [Fact]
    public void Limits_are_exact()
    {
        Assert.Equal(1, MarcumQ.Q(3, 0, 0));
        Assert.Equal(1, MarcumQ.Q(3, 5, 0));
        Assert.Equal(0, MarcumQ.Complement(3, 5, 0));
        Assert.Equal(0, MarcumQ.Q(3, 5, double.PositiveInfinity));
        Assert.Equal(1, MarcumQ.Q(3, double.PositiveInfinity, 5));
        Assert.Equal(IncompleteGamma.UpperRegularized(4, 8), MarcumQ.Q(4, 0, 4), 1e-15);
    }

    [Fact]
    public void Nan_comes_out_as_nan_and_arguments_outside_the_domain_are_refused()
    {
        Assert.True(double.IsNaN(MarcumQ.Q(1, double.NaN, 1)));
        Assert.True(double.IsNaN(MarcumQ.Complement(1, 1, double.NaN)));
        Assert.True(double.IsNaN(MarcumQ.LogQ(1, double.NaN, double.NaN)));
        Assert.Throws<ArgumentOutOfRangeException>(() => MarcumQ.Q(0, 1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => MarcumQ.Q(1, -1, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => MarcumQ.Q(1, double.PositiveInfinity, double.PositiveInfinity));
    }
}
