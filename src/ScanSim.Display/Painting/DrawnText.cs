using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>One piece of text as it was set, in layout units: for checks that nothing is too small, clipped or covered.</summary>
internal readonly record struct DrawnText(string Text, float Size, SKRect Box);
