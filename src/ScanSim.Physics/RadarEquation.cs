namespace ScanSim.Physics;

/// <summary>The monostatic radar equation in free space, in its three factors and whole.</summary>
/// <remarks>
/// Source: M. I. Skolnik, Introduction to Radar Systems, 3rd ed., McGraw-Hill 2001, section 1.2 (from memory); also
/// D. M. Pozar, Microwave Engineering, 2nd ed., Wiley 1998, section 12.4. Domain: range &gt; 0, far field of the antenna,
/// a point target. Accuracy: rounding only, below 10·2⁻⁵³ relative. NaN in, NaN out; range 0 gives +∞.
/// </remarks>
public static class RadarEquation
{
    private const double FourPi = 4.0 * Math.PI;

    /// <summary>Power density at <paramref name="rangeM"/> from the antenna: P G / (4π R²).</summary>
    public static double PowerDensityWPerM2(double transmitPowerW, double gainRatio, double rangeM) =>
        transmitPowerW * gainRatio / (FourPi * rangeM * rangeM);

    /// <summary>Density back at the antenna per density at the target: σ / (4π R²), per m² of receiving aperture.</summary>
    public static double ReturnedFractionPerM2(double rcsM2, double rangeM) =>
        rcsM2 / (FourPi * rangeM * rangeM);

    /// <summary>Aperture that belongs to a gain: G λ² / (4π).</summary>
    public static double EffectiveApertureM2(double gainRatio, double wavelengthM) =>
        gainRatio * wavelengthM * wavelengthM / FourPi;

    /// <summary>Received power: the product of the three factors over the loss.</summary>
    /// <param name="peakPowerW">Power at the point where <paramref name="lossRatio"/> begins to count.</param>
    /// <param name="transmitGainRatio">Gain over the isotropic radiator in the target's direction.</param>
    /// <param name="receiveGainRatio">The same on the way back.</param>
    /// <param name="wavelengthM">Carrier wavelength.</param>
    /// <param name="rcsM2">Radar cross-section.</param>
    /// <param name="rangeM">Slant range.</param>
    /// <param name="lossRatio">All losses both ways, ≥ 1.</param>
    public static double ReceivedPowerW(
        double peakPowerW,
        double transmitGainRatio,
        double receiveGainRatio,
        double wavelengthM,
        double rcsM2,
        double rangeM,
        double lossRatio = 1.0) =>
        PowerDensityWPerM2(peakPowerW, transmitGainRatio, rangeM)
        * ReturnedFractionPerM2(rcsM2, rangeM)
        * EffectiveApertureM2(receiveGainRatio, wavelengthM)
        / lossRatio;
}
