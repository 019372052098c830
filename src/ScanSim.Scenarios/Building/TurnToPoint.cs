namespace ScanSim.Scenarios.Building;

/// <summary>
/// An arc from a position and heading until a point lies straight ahead, towards the side on which the point lies.
/// </summary>
/// <remarks>
/// The centre C of the arc lies one radius r to that side; with w the point seen from C, the arc ends where its tangent passes
/// through the point: heading = bearing(w) ± (π/2 − atan(L / r)), L = √(w² − r²), plus to the right. Plane geometry. Domain: r > 0.
/// </remarks>
internal static class TurnToPoint
{
    /// <summary>Below this a full turn is taken for rounding of none.</summary>
    private const double NoTurnRad = 1e-9;

    /// <summary>Signed angle (positive to the right) to turn by, or null when the point lies inside the turning circle.</summary>
    public static double? AngleRad(double headingRad, double offsetEastM, double offsetNorthM, double radiusM)
    {
        var (sin, cos) = Math.SinCos(headingRad);
        var acrossM = offsetEastM * cos - offsetNorthM * sin;
        var side = acrossM < 0 ? -1 : 1;
        var fromCentreEastM = offsetEastM - side * radiusM * cos;
        var fromCentreNorthM = offsetNorthM + side * radiusM * sin;

        // w² − r² without the difference of two great squares.
        var squareM2 = offsetEastM * offsetEastM + offsetNorthM * offsetNorthM - 2 * radiusM * Math.Abs(acrossM);
        if (!(squareM2 >= 0))
        {
            return null;
        }

        var bearingRad = Math.Atan2(fromCentreEastM, fromCentreNorthM);
        var newHeadingRad = bearingRad + side * (Math.PI / 2 - Math.Atan2(Math.Sqrt(squareM2), radiusM));
        var angleRad = Angles.Positive(side * (newHeadingRad - headingRad));
        return angleRad > Angles.TurnRad - NoTurnRad || angleRad < NoTurnRad ? 0 : side * angleRad;
    }
}
