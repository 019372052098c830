namespace ScanSim.Display.Films;

/// <summary>Colours that share an entry of the palette.</summary>
/// <remarks>
/// Splitting where the spread is largest: P. Heckbert, Color image quantization for frame buffer display, SIGGRAPH 1982, with the sum of
/// squared deviations in place of the extent and the mean in place of the median.
/// </remarks>
internal sealed class ColourBox
{
    private readonly ColourCount[] colours;
    private readonly double[] means = new double[3];
    private readonly int widestAxis;

    private ColourBox(ColourCount[] colours)
    {
        this.colours = colours;
        var weight = colours.Sum(c => c.Weight);
        for (var axis = 0; axis < 3; axis++)
        {
            var at = axis;
            means[axis] = colours.Sum(c => c.Weight * c.Part(at)) / weight;
            var spread = colours.Sum(c => c.Weight * (c.Part(at) - means[at]) * (c.Part(at) - means[at]));
            if (spread > Spread)
            {
                (Spread, widestAxis) = (spread, axis);
            }
        }
    }

    /// <summary>Weighted sum of squared deviations along the axis where it is largest; 0 for a single colour.</summary>
    private double Spread { get; }

    private uint Mean => (uint)Math.Round(means[0]) | (uint)Math.Round(means[1]) << 8 | (uint)Math.Round(means[2]) << 16;

    /// <summary>At most so many colours that stand for all of these; exactly these when they are few enough.</summary>
    public static IEnumerable<uint> Split(IEnumerable<ColourCount> colours, int most)
    {
        // In order of colour: the result must not depend on the order of a dictionary.
        var all = colours.OrderBy(c => c.Rgb).ToArray();
        if (all.Length == 0)
        {
            return [];
        }

        var boxes = new List<ColourBox> { new(all) };
        while (boxes.Count < most)
        {
            var widest = boxes.MaxBy(b => b.Spread)!;
            if (widest.Spread <= 0)
            {
                break;
            }

            boxes.Remove(widest);
            boxes.AddRange(widest.Halves());
        }

        return boxes.Select(b => b.Mean).Distinct();
    }

    private IEnumerable<ColourBox> Halves()
    {
        var parts = colours.ToLookup(c => c.Part(widestAxis) > means[widestAxis]);
        return [new ColourBox([.. parts[false]]), new ColourBox([.. parts[true]])];
    }
}
