namespace ScanSim.Engine;

/// <summary>Hits that hang together so far, in order of dwell and cell.</summary>
internal sealed class OpenPlot
{
    public List<Hit> Hits { get; } = [];

    public long FirstDwell => Hits[0].Dwell;

    public long LastDwell => Hits[^1].Dwell;

    /// <summary>Whether a hit lies beside one of the plot's: at most so many cells and so many dwells away.</summary>
    public bool Touches(in Hit hit, int rangeGapCells, int azimuthGapDwells)
    {
        for (var i = Hits.Count - 1; i >= 0 && hit.Dwell - Hits[i].Dwell <= azimuthGapDwells + 1; i--)
        {
            if (Math.Abs(hit.Cell - Hits[i].Cell) <= rangeGapCells)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>Takes over another plot's hits, keeping the order.</summary>
    public void Absorb(OpenPlot other)
    {
        Hits.AddRange(other.Hits);
        Hits.Sort(static (a, b) => a.Dwell != b.Dwell ? a.Dwell.CompareTo(b.Dwell) : a.Cell.CompareTo(b.Cell));
    }
}
