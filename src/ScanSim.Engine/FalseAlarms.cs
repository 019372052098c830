using ScanSim.Physics.Detection;
using ScanSim.Physics.Draws;
using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>Crossings of the threshold by receiver noise alone: a Poisson number a dwell, spread evenly over its range cells.</summary>
internal static class FalseAlarms
{
    /// <summary>Appends the dwell's false alarms, in the order they are drawn.</summary>
    public static void Draw(RunSetup setup, in Dwell dwell, List<Hit> hits)
    {
        var cells = setup.Cells[dwell.PrfIndex];
        var detector = setup.Detectors[dwell.PrfIndex];
        var draws = new DrawStream(setup.Seed, new DrawAddress(DrawPurpose.FalseAlarms, 0, setup.Run, (uint)dwell.Index));
        var count = draws.NextPoisson(cells.Count * detector.FalseAlarmProbability);
        for (var i = 0; i < count; i++)
        {
            var place = draws.NextUniform() * cells.Count;

            // Given that it crossed, the statistic's upper tail is evenly distributed below Pfa.
            var statistic = DetectionThreshold.FromFalseAlarm(detector.Pulses, draws.NextUniform() * detector.FalseAlarmProbability);
            hits.Add(new Hit
            {
                TimeS = dwell.MiddleS,
                Scan = dwell.Scan,
                Dwell = dwell.Index,
                Cell = cells.First + (int)place,
                BeamAzimuthRad = dwell.BeamAzimuthRad,
                RangeM = (cells.First + place) * cells.CellM,
                SummedSnrRatio = Math.Max(statistic, detector.Threshold) - detector.Pulses,
                Pulses = detector.Pulses,
                Kind = EchoKind.Noise,
                Target = "",
                Entity = 0,
            });
        }
    }
}
