namespace ScanSim.Physics;

/// <summary>Power ratios and decibels: 10 lg of a ratio of powers.</summary>
/// <remarks>
/// Source: IEC 60027-3:2002 (level of a power quantity), from memory. Accuracy: relative error of a few 2⁻⁵³, plus for
/// <see cref="ToRatio"/> the rounding of the exponent, |db|·ln 10/10·2⁻⁵³. NaN in, NaN out.
/// </remarks>
public static class Decibels
{
    /// <summary>ln 10 / 10.</summary>
    private const double LogTenPerDecibel = 0.230258509299404568402;

    /// <summary>Ratio of powers of a level in dB. −∞ dB gives 0.</summary>
    public static double ToRatio(double db) => Math.Exp(db * LogTenPerDecibel);

    /// <summary>Level in dB of a ratio of powers. 0 gives −∞; a negative ratio is no ratio of powers and gives NaN.</summary>
    public static double FromRatio(double ratio) => 10.0 * Math.Log10(ratio);
}
