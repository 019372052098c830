using System.Runtime.CompilerServices;

namespace ScanSim.Physics.Earth;

/// <summary>A sphere of k times the earth's radius on which rays run straight.</summary>
/// <remarks>
/// Source: the 4/3-earth of J. C. Schelleng, C. R. Burrows and E. B. Ferrell, Proc. IRE 21 (1933), as in R. J. Doviak and
/// D. S. Zrnić, Doppler Radar and Weather Observations, 2nd ed. 1993, equation (2.28) (both from memory). With the angle φ
/// = ground distance / radius at the centre, the differences that cancel at short range are written with sin²(φ/2), so that
/// relative accuracy holds down to zero distance: below 1e-15 in range and 1e-15 rad in elevation, plus the rounding of the heights' difference.
/// Model error: the effective earth departs from an exponential atmosphere above about 10 km height (docs/physics/earth.md).
/// Heights are above the sphere, the ground distance is along it. Domain: radius &gt; 0, heights &gt; −radius, distance ≥ 0 and below
/// half the circumference. NaN in, NaN out. The default has radius 0 and is not valid: every result is NaN.
/// </remarks>
/// <param name="RadiusM">k times the true radius.</param>
public readonly record struct EffectiveEarth(double RadiusM)
{
    /// <summary>Slant range and elevation in one call: d² = (h2 − h1)² + 4 (R + h1)(R + h2) sin²(φ/2).</summary>
    /// <param name="antennaM">Height of the antenna above the sphere.</param>
    /// <param name="targetM">Height of the target above the sphere.</param>
    /// <param name="groundM">Distance along the sphere.</param>
    public SlantGeometry Geometry(double antennaM, double targetM, double groundM)
    {
        (double sine, double cosine) = HalfAngle(0.5 * groundM / RadiusM);
        double riseM = targetM - antennaM;
        double farM = 2.0 * (RadiusM + targetM) * sine;
        double slantM = Math.Sqrt(riseM * riseM + 2.0 * (RadiusM + antennaM) * sine * farM);
        double forwardM = farM * cosine;
        return new SlantGeometry(slantM, Math.Atan2(riseM - farM * sine, forwardM), slantM > 0.0 ? forwardM / slantM : 1.0);
    }

    /// <summary>Sine and cosine: below 0.05 rad (850 km on the 4/3 earth) by their series, whose first omitted terms are below 2⁻⁵³ there.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static (double Sine, double Cosine) HalfAngle(double angleRad)
    {
        if (!(angleRad < 0.05))
        {
            return Math.SinCos(angleRad);
        }

        double x2 = angleRad * angleRad;
        double sine = angleRad * (1.0 - x2 * (1.0 / 6 - x2 * (1.0 / 120 - x2 * (1.0 / 5040 - x2 * (1.0 / 362880)))));
        double cosine = 1.0 - x2 * (1.0 / 2 - x2 * (1.0 / 24 - x2 * (1.0 / 720 - x2 * (1.0 / 40320))));
        return (sine, cosine);
    }

    public double SlantRangeM(double antennaM, double targetM, double groundM)
    {
        double sine = Math.Sin(0.5 * groundM / RadiusM);
        double riseM = targetM - antennaM;
        double farM = 2.0 * (RadiusM + targetM) * sine;
        return Math.Sqrt(riseM * riseM + 2.0 * (RadiusM + antennaM) * sine * farM);
    }

    public double ElevationRad(double antennaM, double targetM, double groundM) =>
        Geometry(antennaM, targetM, groundM).ElevationRad;

    /// <summary>Time derivative of the slant range, positive when the target recedes.</summary>
    /// <remarks>Derivative of <see cref="SlantRangeM"/>. At slant range 0 it does not exist: NaN.</remarks>
    /// <param name="antennaM">Height of the antenna above the sphere.</param>
    /// <param name="targetM">Height of the target above the sphere.</param>
    /// <param name="groundM">Distance along the sphere.</param>
    /// <param name="groundRateMps">Change of that distance per second (speed over the sphere's surface, not at the target's height).</param>
    /// <param name="climbMps">Change of the target's height per second.</param>
    public double RangeRateMps(double antennaM, double targetM, double groundM, double groundRateMps, double climbMps)
    {
        (double sine, double cosine) = HalfAngle(0.5 * groundM / RadiusM);
        double riseM = targetM - antennaM;
        double nearRadiusM = RadiusM + antennaM;
        double farRadiusM = RadiusM + targetM;
        double slantM = Math.Sqrt(riseM * riseM + 4.0 * nearRadiusM * farRadiusM * sine * sine);
        double alongM = nearRadiusM * (farRadiusM / RadiusM) * 2.0 * sine * cosine * groundRateMps;
        double upM = (riseM + 2.0 * nearRadiusM * sine * sine) * climbMps;
        return (alongM + upM) / slantM;
    }

    /// <summary>Arc from below a point at a height to its horizon, R arccos(R/(R + h)). 0 at and below the surface.</summary>
    public double HorizonDistanceM(double heightM) =>
        heightM <= 0.0 ? 0.0 : RadiusM * Math.Atan2(Math.Sqrt(heightM * (2.0 * RadiusM + heightM)), RadiusM);

    /// <summary>Whether the straight ray between the two passes clear of the sphere (grazing counts as clear).</summary>
    public bool IsAboveHorizon(double antennaM, double targetM, double groundM) =>
        groundM <= HorizonDistanceM(antennaM) + HorizonDistanceM(targetM);
}
