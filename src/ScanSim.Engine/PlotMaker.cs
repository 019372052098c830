using ScanSim.Physics;
using ScanSim.Physics.Accuracy;
using ScanSim.Physics.Draws;
using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>Makes a plot of its hits: centroid weighted by the measured signal, errors as an extractor would state them.</summary>
internal sealed class PlotMaker(RunSetup setup)
{
    private readonly CentroidSampling sampling = new(setup);
    private readonly PlotLabels labels = new();
    private readonly double beamwidthRad = setup.Scenario.Radar.Antenna.Azimuth.BeamwidthRad;
    private readonly double compressedWidthS = setup.Scenario.Radar.Waveform.CompressedWidthS;
    private readonly double instrumentRangeM = setup.Scenario.Radar.Accuracy.RangeSigmaM;
    private readonly double instrumentAzimuthRad = setup.Scenario.Radar.Accuracy.AzimuthSigmaRad;

    public PlotRow Make(List<Hit> hits)
    {
        double weight = 0;
        double time = 0;
        double range = 0;
        double turn = 0;
        var strongest = hits[0];
        var referenceRad = hits[0].BeamAzimuthRad;
        foreach (var hit in hits)
        {
            weight += hit.SummedSnrRatio;
            time += hit.SummedSnrRatio * (hit.TimeS - hits[0].TimeS);
            range += hit.SummedSnrRatio * hit.RangeM;
            turn += hit.SummedSnrRatio * Angles.ToHalfTurns(hit.BeamAzimuthRad - referenceRad);
            strongest = hit.SummedSnrRatio > strongest.SummedSnrRatio ? hit : strongest;
        }

        var timeS = hits[0].TimeS + time / weight;
        var (rangeErrorM, azimuthErrorRad) = InstrumentErrors(strongest);
        var thermalRad = MeasurementAccuracy.AzimuthSigmaRad(beamwidthRad, weight);
        var samplingRad = sampling.SigmaRad(hits);
        var noiseM = MeasurementAccuracy.RangeSigmaM(compressedWidthS, weight);
        return new PlotRow
        {
            TimeS = timeS,
            Scan = setup.Timeline.ScanAt(timeS),
            RangeM = Math.Max(0, range / weight + rangeErrorM),
            AzimuthDeg = Angles.ToTurn(Angles.ToTurn(referenceRad + turn / weight) + azimuthErrorRad) * Angles.DegPerRad,
            SnrDb = Decibels.FromRatio(strongest.SummedSnrRatio / strongest.Pulses),
            Hits = hits.Count,
            SigmaRangeM = Math.Sqrt(noiseM * noiseM + instrumentRangeM * instrumentRangeM),
            SigmaAzimuthDeg = Math.Sqrt(thermalRad * thermalRad + samplingRad * samplingRad + instrumentAzimuthRad * instrumentAzimuthRad) * Angles.DegPerRad,
            Kind = hits.Exists(static h => h.Kind == EchoKind.Target) ? EchoKind.Target : EchoKind.Noise,
            Target = labels.Of(hits),
        };
    }

    private (double RangeM, double AzimuthRad) InstrumentErrors(in Hit strongest)
    {
        if (instrumentRangeM == 0 && instrumentAzimuthRad == 0)
        {
            return (0, 0);
        }

        var isNoise = strongest.Kind == EchoKind.Noise;
        var address = new DrawAddress(
            isNoise ? DrawPurpose.NoisePlotInstrument : DrawPurpose.PlotInstrument,
            isNoise ? (uint)strongest.Cell : strongest.Entity,
            setup.Run,
            (uint)strongest.Dwell);
        var draws = new DrawStream(setup.Seed, address);
        return (instrumentRangeM * draws.NextNormal(), instrumentAzimuthRad * draws.NextNormal());
    }
}
