namespace ScanSim.Physics.Antennas;

/// <summary>Far field of a rectangular aperture with uniform, cosine or cosine-squared illumination, relative to its peak.</summary>
/// <remarks>
/// Source: Recommendation ITU-R M.1851-2, table 4, with μ = π K sin θ / θ3 (K and θ3 in degrees):
/// sin μ / μ; (π/2) cos μ / ((π/2)² − μ²); π² sin μ / (2 μ (π² − μ²)); here each divided by its value at μ = 0.
/// The removable singularities at 0, ±π/2 and ±π are handled by the shifted sine. Domain: finite μ.
/// Accuracy: about (1 + |μ|)·2⁻⁵³ of the local envelope. NaN in, NaN out.
/// </remarks>
public static class ApertureField
{
    private const double HalfPi = Math.PI / 2.0;

    /// <summary>Field (voltage) relative to the peak; the power pattern is its square.</summary>
    public static double Relative(ApertureTaper taper, double mu)
    {
        double m = Math.Abs(mu);
        return taper switch
        {
            ApertureTaper.Uniform => Sinc(m),
            ApertureTaper.Cosine => HalfPi * HalfPi * Sinc(HalfPi - m) / (HalfPi + m),
            ApertureTaper.CosineSquared => m < HalfPi
                ? Math.PI * Math.PI * Sinc(m) / ((Math.PI - m) * (Math.PI + m))
                : Math.PI * Math.PI * Sinc(Math.PI - m) / (m * (Math.PI + m)),
            _ => throw new ArgumentOutOfRangeException(nameof(taper), taper, "not an aperture taper"),
        };
    }

    /// <summary>The μ at which the power is one half. Computed with 25 digits from the closed forms.</summary>
    public static double HalfPowerMu(ApertureTaper taper) => taper switch
    {
        ApertureTaper.Uniform => 1.391557378251510150,
        ApertureTaper.Cosine => 1.867621510577969897,
        ApertureTaper.CosineSquared => 2.262861825297631090,
        _ => throw new ArgumentOutOfRangeException(nameof(taper), taper, "not an aperture taper"),
    };

    private static double Sinc(double x) => x == 0.0 ? 1.0 : Math.Sin(x) / x;
}
