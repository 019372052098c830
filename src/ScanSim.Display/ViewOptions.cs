using System.Collections.Immutable;
using ScanSim.Display.Overlays;

namespace ScanSim.Display;

/// <summary>What part of a scene is shown and how; the defaults show the whole instrumented range on a dark ground.</summary>
public sealed record ViewOptions
{
    /// <summary>East of the site of the plan's middle.</summary>
    public double CentreEastM { get; init; }

    public double CentreNorthM { get; init; }

    /// <summary>From the plan's middle to its nearer edges (less the margin for bearing labels); null: the instrumented range.</summary>
    public double? RangeM { get; init; }

    public RangeUnit Unit { get; init; } = RangeUnit.Kilometre;

    public Theme Theme { get; init; } = Theme.Dark;

    /// <summary>Plots stay on the plan for this many scans, fading.</summary>
    public int AfterglowScans { get; init; } = 8;

    /// <summary>The truth trail reaches back this many scans.</summary>
    public int TrailScans { get; init; } = 40;

    public bool ShowTruth { get; init; } = true;

    public bool ShowLabels { get; init; } = true;

    public bool ShowFalsePlots { get; init; } = true;

    /// <summary>Coastlines, zones and places under the plan.</summary>
    public ImmutableArray<Overlay> Overlays { get; init; } = [];

    /// <summary>Throws <see cref="PictureException"/> when a value cannot be drawn.</summary>
    public void Check()
    {
        if (!double.IsFinite(CentreEastM) || !double.IsFinite(CentreNorthM))
        {
            throw new PictureException($"The plan's middle ({CentreEastM} m east, {CentreNorthM} m north) must be two finite numbers.");
        }

        if (RangeM is { } rangeM && !(rangeM is >= 10 and <= 5e6))
        {
            throw new PictureException($"The range shown, {rangeM} m, must lie between 10 m and 5000 km.");
        }

        if (AfterglowScans is < 1 or > 1000 || TrailScans is < 0 or > 100_000)
        {
            throw new PictureException($"Afterglow of {AfterglowScans} scans and trail of {TrailScans} scans do not go: 1 to 1000 and 0 to 100000.");
        }
    }
}
