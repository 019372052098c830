namespace ScanSim.Scenarios;

/// <summary>One unit of a dimension: its symbol, its definition, and the way to SI and back.</summary>
/// <remarks>
/// A linear unit is held as numerator / denominator, both exact in a double where the definition is decimal, so that
/// number·numerator/denominator has two roundings at most and "0.25 us" is the double nearest to 0.25e-6. NaN in, NaN out.
/// </remarks>
public sealed class Unit
{
    private readonly double numerator;
    private readonly double denominator;
    private readonly double offset;
    private readonly bool decibel;

    private Unit(string symbol, string definition, double numerator, double denominator, double offset, bool decibel)
    {
        Symbol = symbol;
        Definition = definition;
        this.numerator = numerator;
        this.denominator = denominator;
        this.offset = offset;
        this.decibel = decibel;
    }

    /// <summary>As it is written in a file; case counts.</summary>
    public string Symbol { get; }

    /// <summary>What one of it is, with the source of the figure.</summary>
    public string Definition { get; }

    public double ToSi(double number) =>
        decibel ? Math.Pow(10, (number + offset) / 10) : number * numerator / denominator + offset;

    public double FromSi(double si) =>
        decibel ? 10 * Math.Log10(si) - offset : (si - offset) * denominator / numerator;

    public override string ToString() => Symbol;

    internal static Unit Linear(string symbol, double numerator, double denominator, string definition) =>
        new(symbol, definition, numerator, denominator, 0, decibel: false);

    internal static Unit Shifted(string symbol, double offset, string definition) =>
        new(symbol, definition, 1, 1, offset, decibel: false);

    /// <summary>10·log10 of the SI value, less <paramref name="offsetDb"/>.</summary>
    internal static Unit Decibel(string symbol, double offsetDb, string definition) =>
        new(symbol, definition, 1, 1, offsetDb, decibel: true);
}
