using System.Collections.Immutable;
using ScanSim.Physics.Detection;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>The processing of a dwell of given length: threshold, drawn statistic, analytic probability.</summary>
internal sealed class Detector
{
    private const double EvenOdds = 0.5;

    private readonly ImmutableArray<DetectionTable?> tables;
    private readonly ImmutableArray<double> evenOddsSnrRatio;

    public Detector(int pulses, double falseAlarmProbability, IEnumerable<FluctuationCase> cases)
    {
        Pulses = pulses;
        FalseAlarmProbability = falseAlarmProbability;
        Threshold = DetectionThreshold.FromFalseAlarm(pulses, falseAlarmProbability);
        var used = cases.ToHashSet();
        var all = Enum.GetValues<FluctuationCase>();
        tables = [.. all.Select(c => used.Contains(c) ? new DetectionTable(c, pulses, Threshold) : null)];
        evenOddsSnrRatio = [.. all.Select(c => used.Contains(c) ? RequiredSnr.Ratio(c, pulses, falseAlarmProbability, EvenOdds) : double.NaN)];
    }

    public int Pulses { get; }

    public double FalseAlarmProbability { get; }

    /// <summary>For the sum of <see cref="Pulses"/> squared samples with noise power 1 each.</summary>
    public double Threshold { get; }

    /// <summary>One for each PRF of the waveform, for the fluctuation cases that the targets have.</summary>
    public static ImmutableArray<Detector> For(Scenario scenario, DwellGrid grid)
    {
        var cases = scenario.Targets.Select(t => (FluctuationCase)t.FluctuationCase).Distinct().ToList();
        var byPulses = grid.Pulses.Distinct().ToDictionary(n => n, n => new Detector(n, scenario.Radar.Processing.FalseAlarmProbability, cases));
        return [.. grid.Pulses.Select(n => byPulses[n])];
    }

    /// <summary>Mean SNR per pulse at which Pd is one half.</summary>
    public double EvenOddsSnrRatio(FluctuationCase fluctuation) => evenOddsSnrRatio[(int)fluctuation];

    /// <summary>
    /// Analytic Pd of a look. Exact for cases 0, 1 and 3, where only the summed SNR counts; for cases 2 and 4 with pulses of unequal
    /// SNR see <see cref="UnequalPulses"/>.
    /// </summary>
    public double Probability(FluctuationCase fluctuation, double meanSnrRatio, ReadOnlySpan<double> pulseSnrRatio) =>
        fluctuation is FluctuationCase.Case2 or FluctuationCase.Case4 && Pulses > 1
            ? UnequalPulses.Detect(fluctuation, pulseSnrRatio, Threshold)
            : tables[(int)fluctuation]!.Detect(meanSnrRatio);
}
