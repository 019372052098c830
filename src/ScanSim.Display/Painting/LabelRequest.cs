using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>A label wanted beside a point.</summary>
internal readonly record struct LabelRequest(string Text, SKPoint Anchor, SKSize Size, bool IsQuiet);
