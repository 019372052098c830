using System.Collections.Immutable;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>Dwells that follow one another without gaps, each with the next PRF of the waveform; all instants in whole picoseconds.</summary>
/// <remarks>Whole picoseconds: no sum of rounded doubles drifts over a long run. 2⁶³ ps are 106 days.</remarks>
internal sealed class DwellGrid
{
    public const double PicosecondsPerSecond = 1e12;

    private readonly long[] offsetPs;

    public DwellGrid(Radar radar)
    {
        PriPs = [.. radar.Waveform.PrfHz.Select(prfHz => ToPicoseconds(1 / prfHz))];
        Pulses = [.. radar.Waveform.PrfHz.Select(prfHz => radar.PulsesPerDwell(prfHz))];
        offsetPs = new long[PriPs.Length + 1];
        for (var i = 0; i < PriPs.Length; i++)
        {
            offsetPs[i + 1] = offsetPs[i] + Pulses[i] * PriPs[i];
        }
    }

    public ImmutableArray<long> PriPs { get; }

    public ImmutableArray<int> Pulses { get; }

    /// <summary>Mean duration of a dwell.</summary>
    public double MeanDwellS => offsetPs[^1] / PicosecondsPerSecond / PriPs.Length;

    public static long ToPicoseconds(double timeS) => (long)Math.Round(timeS * PicosecondsPerSecond);

    public int PrfIndex(long index) => (int)(index % PriPs.Length);

    public long StartPs(long index) => index / PriPs.Length * offsetPs[^1] + offsetPs[PrfIndex(index)];

    /// <summary>Half-way between the first and the last pulse, rounded down to a picosecond.</summary>
    public long MiddlePs(long index)
    {
        var prf = PrfIndex(index);
        return StartPs(index) + (Pulses[prf] - 1) * PriPs[prf] / 2;
    }

    /// <summary>First dwell whose middle is not before <paramref name="timePs"/> (≥ 0).</summary>
    public long FirstWithMiddleAtOrAfter(long timePs)
    {
        var index = Math.Max(0, timePs / offsetPs[^1] * PriPs.Length - 1);
        while (MiddlePs(index) < timePs)
        {
            index++;
        }

        return index;
    }
}
