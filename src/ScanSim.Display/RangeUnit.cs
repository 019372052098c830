namespace ScanSim.Display;

/// <summary>The unit of ring labels, scale bar and ranges in text.</summary>
public enum RangeUnit
{
    Kilometre = 0,

    /// <summary>The international nautical mile: 1852 m exactly (BIPM, The International System of Units (SI), 8th edition, table 8).</summary>
    NauticalMile = 1,
}
