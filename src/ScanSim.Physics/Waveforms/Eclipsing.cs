namespace ScanSim.Physics.Waveforms;

/// <summary>Loss of echoes that arrive while the radar transmits and cannot hear.</summary>
public static class Eclipsing
{
    /// <summary>Signal-to-noise ratio over that of a whole echo: f², f being the part of the echo pulse outside the transmit pulse.</summary>
    /// <remarks>
    /// Derived in docs/physics/waveform-and-accuracy.md: a filter matched to the whole pulse sums a share f of the signal's
    /// voltage, while its noise is that of the whole pulse. Both ends count: the echo's head under its own pulse at short range,
    /// its tail under the next pulse just below the unambiguous range; ranges fold. The receiver is taken to be deaf exactly
    /// during [0, pulse width) of each interval; recovery time is not modelled.
    /// Domain: 0 &lt; pulse width ≤ interval, range ≥ 0. NaN in, NaN out.
    /// </remarks>
    public static double PowerRatio(double rangeM, double pulseWidthS, double priS)
    {
        double delayS = 2.0 * rangeM / Constants.SpeedOfLightMps;
        if (delayS >= pulseWidthS && delayS + pulseWidthS <= priS)
        {
            return 1.0;
        }

        delayS %= priS;
        double heardS = Math.Min(delayS + pulseWidthS, priS) - Math.Max(delayS, pulseWidthS);
        double share = Math.Clamp(heardS / pulseWidthS, 0.0, 1.0);
        return share * share;
    }
}
