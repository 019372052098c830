using System.Collections.Immutable;
using ScanSim.Physics;
using ScanSim.Physics.Detection;
using ScanSim.Recordings;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>
/// The radar equation of a scenario for one target, term by term: the beam's centre on the target's azimuth, everything else as in a
/// run. The terms of <see cref="Received"/> add up to the received power, those of <see cref="ToSnr"/> from there to the SNR per pulse.
/// </summary>
public sealed record Budget
{
    public required Target Target { get; init; }

    public required double TimeS { get; init; }

    public required Sight Sight { get; init; }

    public required double HeightM { get; init; }

    public required TargetView View { get; init; }

    public required ImmutableArray<BudgetTerm> Received { get; init; }

    public required double ReceivedDbW { get; init; }

    public required ImmutableArray<BudgetTerm> ToSnr { get; init; }

    public required double SnrDb { get; init; }

    public required int Pulses { get; init; }

    public required double FalseAlarmProbability { get; init; }

    /// <summary>Probability of detection of this look; 0 when there is none.</summary>
    public required double Pd { get; init; }

    /// <summary>Radar equation with beams and eclipsing counted as loss: what is solved for one of its terms.</summary>
    public required RadarEquationTerms Terms { get; init; }

    /// <summary>Mean SNR per pulse that gives a detection probability, with this target's fluctuation and the dwell's pulses.</summary>
    public double NeededSnrRatio(double detectionProbability) =>
        RequiredSnr.Ratio((FluctuationCase)Target.FluctuationCase, Pulses, FalseAlarmProbability, detectionProbability);

    /// <summary>Budget of a target at a time of its track; with <paramref name="rangeM"/> at that slant range instead, on the same bearing and at the same height.</summary>
    /// <param name="scenario">The scenario.</param>
    /// <param name="target">One of its targets.</param>
    /// <param name="timeS">Within the track.</param>
    /// <param name="rangeM">Slant range, or null for the track's own.</param>
    public static Budget Of(Scenario scenario, Target target, double timeS, double? rangeM)
    {
        var model = new LookModel(scenario);
        var timeline = ScanTimeline.Of(scenario);
        var state = target.Track.At(timeS);
        if (rangeM is { } range)
        {
            state = Placement.AtRange(model, state, range);
        }

        var sight = model.SightOf(state);
        var dwell = DwellOn(timeline, sight.AzimuthRad);
        var pulseSnr = new double[dwell.Pulses];
        var look = model.LookAt(target.RcsM2, state, dwell, pulseSnr);
        return Of(scenario, target, timeS, state.HeightM, sight, model.ViewOf(sight, dwell.PriS), look, dwell, pulseSnr);
    }

    private static Budget Of(
        Scenario scenario, Target target, double timeS, double heightM, in Sight sight, TargetView view, in Look look, in Dwell dwell, double[] pulseSnr)
    {
        var radar = scenario.Radar;
        var beams = look.AzimuthBeamRatio * look.ElevationBeamRatio * look.EclipsingRatio;
        var terms = radar.EquationTerms() with { RcsM2 = target.RcsM2, RangeM = look.RangeM, LossRatio = radar.Losses.TotalRatio / beams };
        var received = BudgetLines.Received(terms, radar.Losses, look);
        var toSnr = BudgetLines.ToSnr(terms);
        var receivedDbW = received.Sum(t => t.Db);
        var fluctuation = (FluctuationCase)target.FluctuationCase;
        var detector = new Detector(dwell.Pulses, radar.Processing.FalseAlarmProbability, [fluctuation]);
        var seen = view == TargetView.InView;
        return new Budget
        {
            Target = target,
            TimeS = timeS,
            Sight = sight,
            HeightM = heightM,
            View = view,
            Received = received,
            ReceivedDbW = receivedDbW,
            ToSnr = toSnr,
            SnrDb = receivedDbW + toSnr.Sum(t => t.Db),
            Pulses = dwell.Pulses,
            FalseAlarmProbability = radar.Processing.FalseAlarmProbability,
            Pd = seen && look.SnrRatio > 0 ? detector.Probability(fluctuation, look.SnrRatio, pulseSnr) : 0,
            Terms = terms,
        };
    }

    /// <summary>The first dwell's pulses, with the beam's centre on an azimuth at the middle of the dwell.</summary>
    private static Dwell DwellOn(ScanTimeline timeline, double azimuthRad) =>
        timeline.DwellAt(0, timeline.FirstDwell(0)) with { BeamAzimuthRad = azimuthRad };
}
