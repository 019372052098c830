using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Where a target is at the time shown.</summary>
internal readonly record struct TargetNow(SceneTarget Target, SKPoint Position, float EastMps, float NorthMps, bool IsInView);
