using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>A name of an overlay and where it is set.</summary>
internal readonly record struct OverlayName(string Text, SKRect Box);
