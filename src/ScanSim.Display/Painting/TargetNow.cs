using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>Where a target is on the plan at the time shown, and its speed to the right and up on it.</summary>
internal readonly record struct TargetNow(SceneTarget Target, SKPoint Position, float RightMps, float UpMps, bool IsInView);
