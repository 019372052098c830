namespace ScanSim.Display.Overlays;

/// <summary>A place in the site's azimuthal-equidistant plane. default(OverlayVertex) is the site.</summary>
public readonly record struct OverlayVertex(float EastM, float NorthM);
