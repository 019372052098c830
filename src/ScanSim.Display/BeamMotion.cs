using ScanSim.Scenarios;

namespace ScanSim.Display;

/// <summary>Where the beam points at any time: the scenario's <see cref="Scan"/> as a function of time.</summary>
public sealed class BeamMotion(Scan scan)
{
    /// <summary>From the start of one scan to the start of the next.</summary>
    public double PeriodS => scan.ScanS;

    /// <summary>The swept sector; null for full turns.</summary>
    public AzimuthSector? Limits => (scan as Scan.Sector)?.Limits;

    /// <summary>Azimuth of the beam's centre in [0, 2π). While a sector scan turns round it is the edge where the sweep ended.</summary>
    public double AzimuthRad(double timeS)
    {
        var scans = timeS / PeriodS;
        var index = Math.Floor(scans);
        if (scan is not Scan.Sector sector)
        {
            return Math.Tau * (scans - index);
        }

        var sweptRad = Math.Min((timeS - index * PeriodS) * sector.RateRadPerS, sector.Limits.WidthRad);
        var offsetRad = (long)index % 2 == 0 ? sweptRad : sector.Limits.WidthRad - sweptRad;
        return (sector.Limits.FromRad + offsetRad) % Math.Tau;
    }
}
