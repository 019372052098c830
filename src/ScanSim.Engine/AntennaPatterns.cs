using ScanSim.Physics.Antennas;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>The antenna's two cuts as sampled functions of the offset from the beam's peak.</summary>
internal sealed class AntennaPatterns
{
    public AntennaPatterns(Antenna antenna)
    {
        FloorRatio = antenna.SideLobeFloorRatio;
        Azimuth = new SampledPattern(PatternOf(antenna.Azimuth, antenna.TiltRad), FloorRatio);
        Elevation = new SampledPattern(PatternOf(antenna.Elevation, antenna.TiltRad), FloorRatio);
        TiltRad = antenna.TiltRad;
    }

    public SampledPattern Azimuth { get; }

    public SampledPattern Elevation { get; }

    public double TiltRad { get; }

    public double FloorRatio { get; }

    private static Pattern PatternOf(PatternCut cut, double tiltRad) => cut switch
    {
        PatternCut.Gaussian => new GaussianPattern(cut.BeamwidthRad),
        PatternCut.Uniform => new AperturePattern(ApertureTaper.Uniform, cut.BeamwidthRad),
        PatternCut.Cosine => new AperturePattern(ApertureTaper.Cosine, cut.BeamwidthRad),
        PatternCut.CosineSquared => new AperturePattern(ApertureTaper.CosineSquared, cut.BeamwidthRad),
        PatternCut.CosecantSquared shaped => new CosecantSquaredPattern(shaped.BeamwidthRad, tiltRad, shaped.UpToRad),
        PatternCut.Table table => new TablePattern(table.OffsetsRad.AsSpan(), table.LevelsDb.AsSpan()),
        _ => throw new InvalidOperationException("unknown kind of pattern"),
    };
}
