using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>A label of a ring or a bearing, centred on a point.</summary>
internal readonly record struct GridLabel(string Text, SKPoint Centre, SKRect Box);
