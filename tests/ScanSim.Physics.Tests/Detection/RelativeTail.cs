namespace ScanSim.Physics.Tests.Detection;

/// <summary>What tables and doubles have in common at the bottom of their range.</summary>
internal static class RelativeTail
{
    /// <summary>Smallest normal double; below it doubles lose digits and expected values count as 0.</summary>
    public const double SmallestNormal = 2.2250738585072014e-308;

    public static bool IsBelowDoubles(double value) => Math.Abs(value) < SmallestNormal;

    public static double Db(double ratio) => 10 * Math.Log10(ratio);

    public static double Ratio(double db) => Math.Pow(10, db / 10);
}
