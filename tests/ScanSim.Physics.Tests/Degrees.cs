namespace ScanSim.Physics.Tests;

/// <summary>The reference tables print degrees; the code has radians.</summary>
internal static class Degrees
{
    public static double ToRad(double deg) => deg * (Math.PI / 180.0);

    public static double FromRad(double rad) => rad * (180.0 / Math.PI);

    /// <summary>Smallest difference of two directions, signed.</summary>
    public static double Between(double aRad, double bRad) => Math.IEEERemainder(aRad - bRad, 2.0 * Math.PI);
}
