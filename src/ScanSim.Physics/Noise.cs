namespace ScanSim.Physics;

/// <summary>System noise temperature at the antenna terminals, and noise power.</summary>
public static class Noise
{
    /// <summary>System noise temperature referred to the antenna terminals: Ts = Ta + Tline (L − 1) + L T0 (F − 1).</summary>
    /// <remarks>
    /// Source: L. V. Blake's chart in D. K. Barton and S. A. Leonov (eds.), Radar Technology Encyclopedia, Artech House 1998,
    /// p. 75: Ts = Ta + Tr + Lr Te with Tr = Tline (Lr − 1), Te = T0 (F − 1). Reference plane: the antenna terminals, so the
    /// line's loss is in here and must not be counted among the losses of the radar equation again.
    /// Domain: temperatures ≥ 0, loss ≥ 1 and noise figure ≥ 1 as ratios. Accuracy: a few 2⁻⁵³ relative. NaN in, NaN out.
    /// </remarks>
    public static double SystemTemperatureK(
        double antennaTemperatureK, double lineLossRatio, double lineTemperatureK, double noiseFigureRatio) =>
        antennaTemperatureK
        + lineTemperatureK * (lineLossRatio - 1.0)
        + lineLossRatio * Constants.StandardTemperatureK * (noiseFigureRatio - 1.0);

    /// <summary>Available noise power k T B.</summary>
    /// <remarks>
    /// Source: J. B. Johnson and H. Nyquist, Phys. Rev. 32 (1928), in the Rayleigh-Jeans limit: at 10 GHz and 290 K the error
    /// of that limit is 0.08 %. Accuracy: two roundings. NaN in, NaN out.
    /// </remarks>
    public static double PowerW(double temperatureK, double bandwidthHz) =>
        Constants.BoltzmannJPerK * temperatureK * bandwidthHz;
}
