using ScanSim.Recordings;

namespace ScanSim.Display.Replay;

/// <summary>One threshold crossing where the radar sees it: its slant range along the beam's azimuth.</summary>
public readonly record struct HitMark(double TimeS, float EastM, float NorthM, EchoKind Kind);
