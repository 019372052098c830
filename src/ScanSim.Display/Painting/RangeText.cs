namespace ScanSim.Display.Painting;

/// <summary>Ranges in the unit asked for.</summary>
public static class RangeText
{
    public static double MetresPerUnit(RangeUnit unit) => unit == RangeUnit.NauticalMile ? 1852 : 1000;

    public static string Symbol(RangeUnit unit) => unit == RangeUnit.NauticalMile ? "nmi" : "km";

    /// <summary>With the digits that a step of 1-2-5 needs and no more.</summary>
    public static string OfStep(double rangeM, RangeUnit unit) => $"{rangeM / MetresPerUnit(unit):0.#####} {Symbol(unit)}";

    /// <summary>To ten metres.</summary>
    public static string Precise(double rangeM, RangeUnit unit) => $"{rangeM / MetresPerUnit(unit):0.00} {Symbol(unit)}";

    public static string Of(double rangeM, RangeUnit unit) => $"{rangeM / MetresPerUnit(unit):0.0} {Symbol(unit)}";
}
