namespace ScanSim.Physics.Tests.Detection;

/// <summary>Decibels and ratios, and where doubles end.</summary>
internal static class Scale
{
    /// <summary>Smallest normal double; below it doubles lose digits and expected values count as 0.</summary>
    public const double SmallestNormal = 2.2250738585072014e-308;

    public static double Db(double ratio) => 10 * Math.Log10(ratio);

    public static double Ratio(double db) => Math.Pow(10, db / 10);
}
