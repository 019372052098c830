namespace ScanSim.Physics.Waveforms;

/// <summary>Ranges beyond one pulse repetition interval.</summary>
/// <remarks>
/// Source: M. I. Skolnik, Introduction to Radar Systems, 3rd ed., 2001, section 1.1 (from memory): Ru = c T / 2.
/// Domain: interval &gt; 0, range ≥ 0. Accuracy: the remainder itself is exact, the interval's range is rounded twice. NaN in, NaN out.
/// </remarks>
public static class RangeAmbiguity
{
    /// <summary>Range whose echo returns just as the next pulse leaves.</summary>
    public static double UnambiguousRangeM(double priS) => 0.5 * Constants.SpeedOfLightMps * priS;

    /// <summary>Range at which the echo of a true range appears, in [0, unambiguous range).</summary>
    public static double ApparentRangeM(double rangeM, double priS)
    {
        double unambiguousM = UnambiguousRangeM(priS);
        return rangeM < unambiguousM ? rangeM : rangeM % unambiguousM;
    }
}
