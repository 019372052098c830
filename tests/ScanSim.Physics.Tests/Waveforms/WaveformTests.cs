using ScanSim.Physics.Waveforms;
using ScanSim.Testing;

namespace ScanSim.Physics.Tests.Waveforms;

public sealed class WaveformTests
{
    [Fact]
    public void Ambiguous_range_and_cell_agree_with_published_examples()
    {
        var table = ReferenceTable.Load("waveform_examples.csv");
        var comparison = new Comparison("Unambiguous, apparent range and range cell", table.Source, 0.0, 1e-12, "m");
        foreach (string[] row in table.Rows)
        {
            double timeS = table.Number(row, "input_s") * 3e8 / Constants.SpeedOfLightMps;
            double actualM = table.Text(row, "quantity") switch
            {
                "unambiguous" => RangeAmbiguity.UnambiguousRangeM(timeS),
                "apparent" => RangeAmbiguity.ApparentRangeM(table.Number(row, "range_m"), timeS),
                "cell" => RangeResolution.CellM(timeS),
                string other => throw new InvalidDataException(other),
            };
            comparison.Add(table.Text(row, "example"), table.Number(row, "expected_m"), actualM);
        }

        comparison.Conclude();
    }

    [Fact]
    public void Apparent_ranges_repeat_with_the_interval()
    {
        const double PriS = 1e-3;
        double turnM = RangeAmbiguity.UnambiguousRangeM(PriS);
        for (double rangeM = 0.0; rangeM < turnM; rangeM += 1234.5)
        {
            Assert.Equal(rangeM, RangeAmbiguity.ApparentRangeM(rangeM, PriS));
            Assert.Equal(rangeM, RangeAmbiguity.ApparentRangeM(rangeM + 2.0 * turnM, PriS), 1e-9);
        }

        Assert.Equal(0.0, RangeAmbiguity.ApparentRangeM(turnM, PriS));
    }

    /// <summary>n = θ PRF / (6 rpm): 1.5° at 1,000 Hz and 15 rpm is 16.67 pulses.</summary>
    [Fact]
    public void Pulses_per_beamwidth_follow_the_rule_in_degrees_and_turns_per_minute()
    {
        double rate = 15.0 * 2.0 * Math.PI / 60.0;
        Assert.Equal(1.5 * 1000.0 / (6.0 * 15.0), BeamwidthPulses.Count(Degrees.ToRad(1.5), 1000.0, rate), 1e-12);
        Assert.Equal(BeamwidthPulses.Count(0.02, 1000.0, rate), BeamwidthPulses.Count(0.02, 1000.0, -rate));
        Assert.Equal(BeamwidthPulses.Count(0.02, 1000.0, rate) / 2.0, BeamwidthPulses.Count(0.02, 1000.0, 2.0 * rate), 1e-12);
    }
}
