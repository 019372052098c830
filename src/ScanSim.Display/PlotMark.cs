using ScanSim.Recordings;

namespace ScanSim.Display;

/// <summary>One plot where the radar reports it: its slant range laid off along its azimuth. Single precision: better than 1 cm at 100 km.</summary>
public readonly record struct PlotMark(double TimeS, int Scan, float EastM, float NorthM, EchoKind Kind)
{
    /// <summary>Measured signal-to-noise ratio per pulse of the strongest hit.</summary>
    public float SnrDb { get; init; }

    public int Hits { get; init; }

    /// <summary>Ids joined by '+', the strongest first; empty for noise.</summary>
    public string Target { get; init; } = "";
}
