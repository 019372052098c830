namespace ScanSim.Physics.Antennas;

/// <summary>Pattern of a rectangular aperture, side lobes included, by the closed forms of ITU-R M.1851.</summary>
/// <remarks>
/// Source: Recommendation ITU-R M.1851-2, table 4. The recommendation rounds K (50.8, 68.8, 83.2); here
/// μ = μ½ sin θ / sin(θ3/2), so that half power falls exactly at half the beamwidth. Beyond ±90° the closed form would repeat
/// the main lobe behind the antenna: there the pattern is 0. Domain: beamwidth in (0, π]. NaN in, NaN out.
/// </remarks>
public sealed class AperturePattern : Pattern
{
    private readonly ApertureTaper taper;
    private readonly double muPerSine;

    public AperturePattern(ApertureTaper taper, double beamwidthRad)
    {
        BeamwidthRad = beamwidthRad <= Math.PI
            ? CheckedBeamwidth(beamwidthRad)
            : throw new ArgumentOutOfRangeException(nameof(beamwidthRad), beamwidthRad, "an aperture's beamwidth lies above 0 and up to π rad");
        this.taper = taper;
        muPerSine = ApertureField.HalfPowerMu(taper) / Math.Sin(0.5 * beamwidthRad);
    }

    public override double BeamwidthRad { get; }

    public override double GainRatio(double offsetRad)
    {
        if (Math.Abs(offsetRad) > 0.5 * Math.PI)
        {
            return 0.0;
        }

        double field = ApertureField.Relative(taper, muPerSine * Math.Sin(offsetRad));
        return field * field;
    }
}
