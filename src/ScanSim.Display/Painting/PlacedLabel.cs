using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>A label's place, and the line that leads from its point to it where it could not stand beside it.</summary>
internal readonly record struct PlacedLabel(LabelRequest Request, SKRect Box, SKPoint LeaderEnd, bool HasLeader);
