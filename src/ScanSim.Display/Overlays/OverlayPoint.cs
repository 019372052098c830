namespace ScanSim.Display.Overlays;

/// <summary>A single place.</summary>
/// <param name="Place">In the site's plane.</param>
/// <param name="Name">Empty when it has none.</param>
public sealed record OverlayPoint(OverlayVertex Place, string Name);
