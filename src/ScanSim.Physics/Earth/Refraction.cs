namespace ScanSim.Physics.Earth;

/// <summary>From the gradient of refractivity to the effective-earth factor.</summary>
public static class Refraction
{
    /// <summary>Mean earth radius of the ITU-R P series. Source: Recommendation ITU-R P.452-18 and P.526-16.</summary>
    public const double MeanEarthRadiusKm = 6371.0;

    /// <summary>k = 1 / (1 + a dN/dh 10⁻⁶).</summary>
    /// <remarks>
    /// Source: Recommendation ITU-R P.310 and P.834, definition of k (from memory); P.452-18 equation (5) has the same as 157/(157 − ΔN).
    /// Domain: gradient above −156.96 N-units per km; at and below it rays bend with the earth or more (a duct), no effective
    /// earth exists and the call throws. Accuracy: rounding only. NaN in, NaN out.
    /// </remarks>
    /// <param name="refractivityGradientPerKm">dN/dh in N-units per km, negative in the usual atmosphere (about −39).</param>
    public static double EffectiveEarthFactor(double refractivityGradientPerKm)
    {
        double inverse = 1.0 + MeanEarthRadiusKm * refractivityGradientPerKm * 1e-6;
        if (inverse <= 0.0)
        {
            throw new ArgumentOutOfRangeException(
                nameof(refractivityGradientPerKm), refractivityGradientPerKm, "a gradient of −156.96 N/km or below is a duct: an effective earth describes gradients above that only");
        }

        return 1.0 / inverse;
    }
}
