namespace ScanSim.Physics.Antennas;

/// <summary>Elevation cut of a ground radar: a uniform-aperture lobe below, cosecant-squared from half a beamwidth above the tilt.</summary>
/// <remarks>
/// Source: Recommendation ITU-R M.1851-2, section 2.2, equations (22) to (27), with its K = 50.8: from tilt − θ3/0.88 to
/// tilt + θ3/2 the lobe sin μ / μ, μ = π 50.8 sin(θ − tilt)/θ3 (degrees); from there to the end sin²(start)/sin²(θ) times the
/// lobe's value at the start; elsewhere 0, which stands for the recommendation's floor. With the rounded K half power lies
/// 0.004 dB lower than −3.010 dB at half the beamwidth. Angles passed in are elevation minus tilt, like other patterns.
/// Domain: start of the shaped part (tilt + θ3/2) above 0, end between the start and π/2. NaN in, NaN out.
/// </remarks>
public sealed class CosecantSquaredPattern : Pattern
{
    /// <summary>π times the recommendation's K = 50.8°, turned to radians.</summary>
    private const double MuPerSineTimesBeamwidth = Math.PI * 50.8 * Math.PI / 180.0;

    private const double NullWidthRatio = 0.88;

    private readonly double tiltRad;
    private readonly double startRad;
    private readonly double upToRad;
    private readonly double nullOffsetRad;
    private readonly double shapedGain;

    public CosecantSquaredPattern(double beamwidthRad, double tiltRad, double upToRad)
    {
        BeamwidthRad = CheckedBeamwidth(beamwidthRad);
        this.tiltRad = tiltRad;
        this.upToRad = upToRad;
        startRad = tiltRad + 0.5 * beamwidthRad;
        nullOffsetRad = -beamwidthRad / NullWidthRatio;
        if (!(startRad > 0 && startRad <= upToRad && upToRad <= 0.5 * Math.PI))
        {
            throw new ArgumentOutOfRangeException(
                nameof(upToRad), upToRad, $"the cosecant-squared part must run from above 0 up to at most π/2 rad; it starts at tilt + beamwidth/2 = {startRad:R} rad");
        }

        double sine = Math.Sin(startRad);
        shapedGain = Lobe(startRad - tiltRad) * sine * sine;
    }

    public override double BeamwidthRad { get; }

    public override double GainRatio(double offsetRad)
    {
        if (double.IsNaN(offsetRad))
        {
            return double.NaN;
        }

        double elevationRad = offsetRad + tiltRad;
        if (elevationRad <= startRad)
        {
            return offsetRad >= nullOffsetRad ? Lobe(offsetRad) : 0.0;
        }

        double sine = Math.Sin(elevationRad);
        return elevationRad <= upToRad ? shapedGain / (sine * sine) : 0.0;
    }

    private double Lobe(double offsetRad)
    {
        double field = ApertureField.Relative(ApertureTaper.Uniform, MuPerSineTimesBeamwidth * Math.Sin(offsetRad) / BeamwidthRad);
        return field * field;
    }
}
