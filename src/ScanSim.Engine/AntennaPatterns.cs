using ScanSim.Physics.Antennas;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>The antenna's two cuts as sampled functions of the offset from the beam's peak.</summary>
internal sealed class AntennaPatterns
{
    public AntennaPatterns(Antenna antenna)
    {
        FloorRatio = antenna.SideLobeFloorRatio;
        Azimuth = new SampledPattern(antenna.Azimuth.ToPattern(antenna.TiltRad), FloorRatio);
        Elevation = new SampledPattern(antenna.Elevation.ToPattern(antenna.TiltRad), FloorRatio);
        TiltRad = antenna.TiltRad;
    }

    public SampledPattern Azimuth { get; }

    public SampledPattern Elevation { get; }

    public double TiltRad { get; }

    public double FloorRatio { get; }
}
