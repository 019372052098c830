using ScanSim.Physics;
using ScanSim.Physics.Antennas;
using ScanSim.Scenarios;

namespace ScanSim.Display.Explaining;

/// <summary>The antenna's elevation cut: what the beam would give a target if its azimuth were on it.</summary>
internal sealed class ElevationCut(Antenna antenna)
{
    /// <summary>Rounding of a level that stands on the floor, with some to spare.</summary>
    private const double RoundingDb = 0.01;

    private const double RadPerDeg = Math.PI / 180;

    private readonly SampledPattern pattern = new(PatternOf(antenna.Elevation, antenna.TiltRad), antenna.SideLobeFloorRatio);
    private readonly double floorDb = 2 * Decibels.FromRatio(antenna.SideLobeFloorRatio);

    /// <summary>
    /// Whether a look at the side-lobe floor would be there with the beam's centre on the target's azimuth too. There the whole pattern is
    /// cut off, azimuth × elevation, and which of the two a recorded loss is booked to says nothing.
    /// </summary>
    /// <param name="elevationDeg">The target's.</param>
    /// <param name="beamDb">Two-way level of the look, azimuth and elevation beam together.</param>
    public bool HoldsAtFloor(double elevationDeg, double beamDb) =>
        beamDb <= floorDb + RoundingDb
        && 2 * Decibels.FromRatio(pattern.GainRatio(Math.IEEERemainder(elevationDeg * RadPerDeg - antenna.TiltRad, 2 * Math.PI))) <= floorDb + RoundingDb;

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
