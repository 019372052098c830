using ScanSim.Physics.Earth;
using ScanSim.Physics.Waveforms;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>
/// The one place where a look is computed: a pure function of radar, site, environment, target state and beam position.
/// Runs, budgets and everything that explains a look use it.
/// </summary>
public sealed class LookModel
{
    /// <summary>
    /// Looks whose signal, summed over the dwell's pulses, is below this ratio to the noise of one pulse do not exist: they would raise the
    /// probability of a crossing by less than 15 % of Pfa (single pulse, Pfa 1e-6: Pfa^(1/1.01)), which the false alarms already cover.
    /// </summary>
    public const double SummedSnrFloorRatio = 0.01;

    private readonly AntennaPatterns patterns;
    private readonly EffectiveEarth earth;
    private readonly double antennaAltitudeM;
    private readonly double horizonM;
    private readonly double pulseWidthS;
    private readonly double instrumentedRangeM;

    public LookModel(Scenario scenario)
    {
        var radar = scenario.Radar;
        patterns = new AntennaPatterns(radar.Antenna);
        earth = scenario.EffectiveEarth();
        antennaAltitudeM = scenario.Site.AntennaAltitudeM;
        horizonM = earth.HorizonDistanceM(Math.Max(0, antennaAltitudeM));
        pulseWidthS = radar.Waveform.PulseWidthS;
        instrumentedRangeM = radar.InstrumentedRangeM;
        RadarRatioM2 = radar.EquationTerms().SnrRatio();
    }

    /// <summary>SNR per pulse of 1 m² at 1 m at the peak of the beam: everything that no target changes. Unit: m⁴/m².</summary>
    public double RadarRatioM2 { get; }

    internal AntennaPatterns Patterns => patterns;

    /// <summary>Where a target stands as seen from the antenna, on the effective earth.</summary>
    public Sight SightOf(in TrackState state)
    {
        var groundM = Math.Sqrt(state.EastM * state.EastM + state.NorthM * state.NorthM);
        var geometry = earth.Geometry(antennaAltitudeM, state.HeightM, groundM);
        return new Sight
        {
            GroundM = groundM,
            RangeM = geometry.SlantRangeM,
            AzimuthRad = Angles.ToTurn(Math.Atan2(state.EastM, state.NorthM)),
            ElevationRad = geometry.ElevationRad,
            CosElevation = geometry.CosElevation,
            AboveHorizon = IsAboveHorizon(state.HeightM, groundM),
        };
    }

    /// <summary>Whether geometry lets the radar look at a target at all (the timeline's reasons are the caller's).</summary>
    public TargetView ViewOf(in Sight sight, double shortestPriS)
    {
        if (!sight.AboveHorizon)
        {
            return TargetView.BelowHorizon;
        }

        return RangeAmbiguity.ApparentRangeM(sight.RangeM, shortestPriS) > instrumentedRangeM
            ? TargetView.BeyondInstrumentedRange
            : TargetView.InView;
    }

    /// <summary>
    /// Computes the look of a target in a dwell. False when there is none: below the horizon, an echo outside the receiver's
    /// span, or a signal below <see cref="SummedSnrFloorRatio"/>.
    /// </summary>
    /// <param name="rcsM2">Mean radar cross section, > 0.</param>
    /// <param name="state">The target at the middle of the dwell.</param>
    /// <param name="dwell">The dwell, not blanked.</param>
    /// <param name="pulseSnrRatio">Filled with the mean SNR of each pulse; at least as long as the dwell has pulses.</param>
    /// <param name="look">The look.</param>
    public bool TryLook(double rcsM2, in TrackState state, in Dwell dwell, Span<double> pulseSnrRatio, out Look look)
    {
        look = default;
        var sight = SightOf(state);
        var apparentM = RangeAmbiguity.ApparentRangeM(sight.RangeM, dwell.PriS);
        if (!sight.AboveHorizon || apparentM > instrumentedRangeM)
        {
            return false;
        }

        var eclipsing = Eclipsing.PowerRatio(sight.RangeM, pulseWidthS, dwell.PriS);
        var peakSnr = PeakSnrRatio(rcsM2, sight.RangeM) * eclipsing;
        if (!(peakSnr * dwell.Pulses >= SummedSnrFloorRatio))
        {
            return false;
        }

        look = LookAt(sight, state, dwell, apparentM, eclipsing, peakSnr, pulseSnrRatio);
        return look.SnrRatio * dwell.Pulses >= SummedSnrFloorRatio;
    }

    /// <summary>The terms of a look whether or not it can exist: what <see cref="TryLook"/> gives, without its limits.</summary>
    public Look LookAt(double rcsM2, in TrackState state, in Dwell dwell, Span<double> pulseSnrRatio)
    {
        var sight = SightOf(state);
        var apparentM = RangeAmbiguity.ApparentRangeM(sight.RangeM, dwell.PriS);
        var eclipsing = Eclipsing.PowerRatio(sight.RangeM, pulseWidthS, dwell.PriS);
        return LookAt(sight, state, dwell, apparentM, eclipsing, PeakSnrRatio(rcsM2, sight.RangeM) * eclipsing, pulseSnrRatio);
    }

    /// <summary>Radial speed of a target, positive when it recedes.</summary>
    public double RangeRateMps(in Sight sight, in TrackState state)
    {
        var groundRateMps = sight.GroundM > 0 ? (state.EastM * state.EastMps + state.NorthM * state.NorthMps) / sight.GroundM : 0;
        return earth.RangeRateMps(antennaAltitudeM, state.HeightM, sight.GroundM, groundRateMps, state.UpMps);
    }

    /// <summary>
    /// Upper bound of |azimuth offset| at which any target of this size, not nearer than <paramref name="nearestM"/> and not
    /// higher than <paramref name="highestElevationRad"/>, can still give a look; negative when none can.
    /// </summary>
    internal double WidestOffsetRad(double rcsM2, double nearestM, double highestElevationRad, int pulses)
    {
        var summedSnr = PeakSnrRatio(rcsM2, nearestM) * pulses;
        var neededRatio = Math.Sqrt(SummedSnrFloorRatio / summedSnr);
        if (neededRatio > 1)
        {
            return -1;
        }

        var cosElevation = Math.Cos(Math.Min(highestElevationRad, 0.5 * Math.PI));
        var offsetRad = patterns.Azimuth.MaximumOffsetRad(neededRatio);
        return offsetRad >= Math.PI * cosElevation ? Math.PI : offsetRad / cosElevation;
    }

    /// <summary>SNR per pulse at the peak of the beam, the whole echo heard.</summary>
    private double PeakSnrRatio(double rcsM2, double rangeM)
    {
        var range2 = rangeM * rangeM;
        return RadarRatioM2 * rcsM2 / (range2 * range2);
    }

    private Look LookAt(
        in Sight sight, in TrackState state, in Dwell dwell, double apparentM, double eclipsingRatio, double peakSnr, Span<double> pulseSnrRatio)
    {
        var offsetRad = Angles.ToHalfTurns(sight.AzimuthRad - dwell.BeamAzimuthRad);
        var (azimuthSum, beamSum) = WeighPulses(sight, state, dwell, offsetRad, peakSnr, pulseSnrRatio[..dwell.Pulses]);
        return new Look
        {
            RangeM = sight.RangeM,
            ApparentRangeM = apparentM,
            AzimuthRad = sight.AzimuthRad,
            ElevationRad = sight.ElevationRad,
            OffsetRad = offsetRad,
            AzimuthBeamRatio = azimuthSum / dwell.Pulses,
            ElevationBeamRatio = beamSum / azimuthSum,
            EclipsingRatio = eclipsingRatio,
            SnrRatio = peakSnr * beamSum / dwell.Pulses,
        };
    }

    /// <summary>
    /// The two-way weights of the pulses: the beam moves on (and the target's azimuth with it) from pulse to pulse. Across the
    /// beam an azimuth difference counts by the cosine of the elevation.
    /// </summary>
    private (double AzimuthSum, double BeamSum) WeighPulses(
        in Sight sight, in TrackState state, in Dwell dwell, double offsetRad, double peakSnr, Span<double> pulseSnrRatio)
    {
        var cosElevation = sight.CosElevation;
        var ground2 = sight.GroundM * sight.GroundM;
        var azimuthRate = ground2 > 0 ? (state.NorthM * state.EastMps - state.EastM * state.NorthMps) / ground2 : 0;
        var stepRad = (azimuthRate - dwell.BeamRateRadPerS) * dwell.PriS;
        var elevationGain = patterns.Elevation.GainRatio(Angles.ToHalfTurns(sight.ElevationRad - patterns.TiltRad));
        var azimuth = patterns.Azimuth;
        var floor = patterns.FloorRatio;
        var firstRad = offsetRad - stepRad * (0.5 * (dwell.Pulses - 1));
        var lastRad = firstRad + stepRad * (dwell.Pulses - 1);
        var crossesBack = Math.Max(Math.Abs(firstRad), Math.Abs(lastRad)) > Math.PI;
        double azimuthSum = 0;
        double beamSum = 0;
        for (var pulse = 0; pulse < pulseSnrRatio.Length; pulse++)
        {
            var pulseRad = firstRad + stepRad * pulse;
            var azimuthGain = azimuth.GainRatio((crossesBack ? Angles.ToHalfTurns(pulseRad) : pulseRad) * cosElevation);
            var gain = Math.Max(azimuthGain * elevationGain, floor);
            azimuthSum += azimuthGain * azimuthGain;
            beamSum += gain * gain;
            pulseSnrRatio[pulse] = peakSnr * (gain * gain);
        }

        return (azimuthSum, beamSum);
    }

    private bool IsAboveHorizon(double heightM, double groundM) =>
        heightM >= 0 && groundM <= horizonM || earth.IsAboveHorizon(antennaAltitudeM, heightM, groundM);
}
