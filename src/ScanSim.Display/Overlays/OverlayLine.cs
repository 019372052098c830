using System.Collections.Immutable;

namespace ScanSim.Display.Overlays;

/// <summary>A line or the ring of a polygon.</summary>
public sealed record OverlayLine
{
    /// <summary>At least two. Of a closed line the last one joins the first, which is not repeated.</summary>
    public required ImmutableArray<OverlayVertex> Vertices { get; init; }

    public required bool Closed { get; init; }

    /// <summary>Empty when it has none.</summary>
    public required string Name { get; init; }
}
