namespace ScanSim.Physics.Accuracy;

/// <summary>Standard deviation of a measured range and azimuth, from the integrated signal-to-noise ratio.</summary>
/// <remarks>
/// Source: M. I. Skolnik, Theoretical accuracy of radar measurements, IRE Trans. ANE-7, December 1960, pp. 123-129:
/// σ(τ) = 1/(β √(2E/N0)). The ratio passed in is E/N0, mean signal power over mean noise power at the matched filter summed
/// over the pulses of the measurement, so √(2E/N0) = √(2·ratio). The formulas are asymptotic: below about 10 dB they promise
/// too little error in theory and too much in the limit of none, so each is capped at the value of a measurement that knows
/// no more than its cell, width/√12 (a uniform distribution over the cell). Ratio 0 or below gives the cap. NaN in, NaN out.
/// </remarks>
public static class MeasurementAccuracy
{
    /// <summary>√3/π: a rectangular spectrum of width B has β = π B/√3.</summary>
    private const double RectangularSpectrumFactor = 0.551328895421792049511;

    /// <summary>√3/π over the 0.885892941 λ/L of a uniform aperture's half-power width (Skolnik prints 0.628 with 0.88).</summary>
    private const double UniformApertureFactor = RectangularSpectrumFactor / 0.885892941378904715150;

    /// <summary>1/√12.</summary>
    private const double UniformCellFactor = 0.288675134594812882255;

    /// <summary>σ(R) = (c τ/2) (√3/π) / √(2E/N0), for a rectangular spectrum of width B = 1/τ; at most cell/√12.</summary>
    /// <remarks>Domain: width &gt; 0. Accuracy: rounding only; the model is the Cramér-Rao bound, a real extractor is somewhat worse.</remarks>
    public static double RangeSigmaM(double compressedWidthS, double integratedSnrRatio)
    {
        double cellM = 0.5 * Constants.SpeedOfLightMps * compressedWidthS;
        return Capped(cellM, RectangularSpectrumFactor, integratedSnrRatio);
    }

    /// <summary>σ(θ) = 0.6223 θ3 / √(2E/N0), the bound of a uniform aperture: √3 λ/(π L √(2E/N0)); at most θ3/√12.</summary>
    /// <remarks>
    /// Skolnik 1960 and Introduction to Radar Systems (from memory). Barton's 1/k_m with k_m = 1.6 is 0.625, the same within 0.5 %.
    /// Domain: beamwidth &gt; 0 (one-way, half power).
    /// </remarks>
    public static double AzimuthSigmaRad(double beamwidthRad, double integratedSnrRatio) =>
        Capped(beamwidthRad, UniformApertureFactor, integratedSnrRatio);

    private static double Capped(double width, double factor, double integratedSnrRatio) =>
        integratedSnrRatio <= 0.0
            ? width * UniformCellFactor
            : width * Math.Min(UniformCellFactor, factor / Math.Sqrt(2.0 * integratedSnrRatio));
}
