namespace ScanSim.Engine;

/// <summary>
/// The error that a centroid over a few dwells makes without any noise, because the beam is sampled once a dwell: standard deviation
/// over a target's place between the dwell centres.
/// </summary>
/// <remarks>Derived: for each place the strongest dwells' two-way weights give a noise-free centroid; its squared error is averaged over places. One dwell alone gives step/√12.</remarks>
internal sealed class CentroidSampling
{
    private const int MostDwells = 16;
    private const int Places = 64;
    private const int SamplesPerDwell = 16;

    private readonly double[] sigmaRad = new double[MostDwells + 1];

    public CentroidSampling(RunSetup setup)
    {
        for (var dwells = 1; dwells <= MostDwells; dwells++)
        {
            sigmaRad[dwells] = Sigma(setup, dwells);
        }
    }

    /// <summary>For a plot with hits in this many different dwells.</summary>
    public double SigmaRad(List<Hit> hits)
    {
        var dwells = 1;
        for (var i = 1; i < hits.Count; i++)
        {
            dwells += hits[i].Dwell != hits[i - 1].Dwell ? 1 : 0;
        }

        return sigmaRad[Math.Min(dwells, MostDwells)];
    }

    private static double Sigma(RunSetup setup, int dwells)
    {
        var stepRad = setup.Timeline.DwellStepRad;
        double squares = 0;
        for (var place = 0; place < Places; place++)
        {
            // The place is measured from the middle of the strongest dwells: between two dwell centres for an even number of them.
            var placeRad = stepRad * ((place + 0.5) / Places - 0.5);
            double weight = 0;
            double moment = 0;
            for (var i = 0; i < dwells; i++)
            {
                var centreRad = stepRad * (i - 0.5 * (dwells - 1));
                var w = MeanTwoWay(setup, centreRad - placeRad, stepRad);
                weight += w;
                moment += w * centreRad;
            }

            var errorRad = moment / weight - placeRad;
            squares += errorRad * errorRad;
        }

        return Math.Sqrt(squares / Places);
    }

    private static double MeanTwoWay(RunSetup setup, double offsetRad, double stepRad)
    {
        double sum = 0;
        for (var i = 0; i < SamplesPerDwell; i++)
        {
            var gain = setup.Model.Patterns.Azimuth.GainRatio(Math.Clamp(offsetRad + stepRad * ((i + 0.5) / SamplesPerDwell - 0.5), -Math.PI, Math.PI));
            sum += gain * gain;
        }

        return sum / SamplesPerDwell;
    }
}
