namespace ScanSim.Physics.Waveforms;

/// <summary>Length of a range cell.</summary>
public static class RangeResolution
{
    /// <summary>c τ / 2 of the compressed pulse.</summary>
    /// <remarks>Source: M. I. Skolnik, Introduction to Radar Systems, 3rd ed., 2001, section 1.2 (from memory). Two roundings. NaN in, NaN out.</remarks>
    public static double CellM(double compressedWidthS) => 0.5 * Constants.SpeedOfLightMps * compressedWidthS;
}
