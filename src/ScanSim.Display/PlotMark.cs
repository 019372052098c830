using ScanSim.Recordings;

namespace ScanSim.Display;

/// <summary>One plot where the radar reports it: its slant range laid off along its azimuth. Single precision: better than 1 cm at 100 km.</summary>
public readonly record struct PlotMark(double TimeS, int Scan, float EastM, float NorthM, EchoKind Kind);
