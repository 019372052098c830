using System.Globalization;
using Xunit;

namespace ScanSim.Testing;

/// <summary>Compares many values with their reference, prints the worst row, and records the outcome in docs/validation.md.</summary>
/// <remarks>
/// A row passes when |actual − expected| ≤ absolute + relative·|expected|. The excess of a row is its difference over that
/// allowance; the worst row is the one with the greatest excess. Use one instance per source and claim.
/// </remarks>
public sealed class Comparison(string claim, string source, double absolute, double relative, string unit = "")
{
    private readonly List<string> failures = [];
    private double worstExcess = -1;
    private string worstText = "";
    private string worstRow = "";

    public int Count { get; private set; }

    public void Add(string row, double expected, double actual)
    {
        Count++;
        var difference = expected.Equals(actual) ? 0 : Math.Abs(actual - expected);
        var allowance = absolute + relative * Math.Abs(expected);
        var excess = difference == 0 ? 0 : difference / allowance;
        if (double.IsNaN(excess) || excess > 1)
        {
            failures.Add(string.Create(CultureInfo.InvariantCulture, $"{row}: expected {expected:R}, got {actual:R}, difference {difference:E3}, allowed {allowance:E3}"));
        }

        if (double.IsNaN(excess) || excess > worstExcess)
        {
            worstExcess = double.IsNaN(excess) ? double.PositiveInfinity : excess;
            worstText = absolute > 0 || expected == 0
                ? string.Create(CultureInfo.InvariantCulture, $"{difference:0.0E+0} {unit}").Trim()
                : string.Create(CultureInfo.InvariantCulture, $"{difference / Math.Abs(expected):0.0E+0} relative");
            worstRow = row;
        }
    }

    /// <summary>Fails with the rows that are off; otherwise records the claim for docs/validation.md.</summary>
    public void Conclude()
    {
        Assert.True(Count > 0, $"{claim}: nothing was compared");
        Assert.True(
            failures.Count == 0,
            $"{claim}: {failures.Count} of {Count} rows are off; the first ones:\n{string.Join('\n', failures.Take(10))}\nworst: {worstRow}");
        ValidationLog.Record(new ValidationEntry(claim, source, Count, Allowance(), worstText, worstRow));
    }

    private string Allowance()
    {
        var parts = new List<string>();
        if (absolute > 0)
        {
            parts.Add(string.Create(CultureInfo.InvariantCulture, $"{absolute:0.##E+0} {unit}").Trim());
        }

        if (relative > 0)
        {
            parts.Add(string.Create(CultureInfo.InvariantCulture, $"{relative:0.##E+0} relative"));
        }

        return parts.Count == 0 ? "exact" : string.Join(" + ", parts);
    }
}
