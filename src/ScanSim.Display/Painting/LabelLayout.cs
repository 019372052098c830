using System.Collections.Immutable;

namespace ScanSim.Display.Painting;

/// <summary>Labels with a place, and how many found none.</summary>
internal sealed record LabelLayout(ImmutableArray<PlacedLabel> Placed, int Omitted);
