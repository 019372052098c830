namespace ScanSim.Engine;

/// <summary>The truth label of a plot: the ids in its hits joined by '+', by their share of the signal.</summary>
internal sealed class PlotLabels
{
    private readonly Dictionary<string, string> known = new(StringComparer.Ordinal);
    private readonly List<(string Id, double Weight)> shares = [];

    public string Of(List<Hit> hits)
    {
        var label = "";
        var alike = true;
        foreach (var hit in hits)
        {
            if (hit.Target.Length > 0)
            {
                alike &= label.Length == 0 || string.Equals(label, hit.Target, StringComparison.Ordinal);
                label = hit.Target;
            }
        }

        return alike ? label : Join(hits);
    }

    private string Join(List<Hit> hits)
    {
        shares.Clear();
        foreach (var hit in hits)
        {
            // In a shared cell the first id is the strongest; the split of the rest is not known to a plot, so halve it each time.
            var weight = hit.SummedSnrRatio;
            foreach (var id in hit.Target.Split('+', StringSplitOptions.RemoveEmptyEntries))
            {
                AddShare(id, weight);
                weight *= 0.5;
            }
        }

        shares.Sort(static (a, b) => a.Weight != b.Weight ? b.Weight.CompareTo(a.Weight) : string.CompareOrdinal(a.Id, b.Id));
        var label = string.Join('+', shares.Select(s => s.Id));
        return known.TryGetValue(label, out var same) ? same : known[label] = label;
    }

    private void AddShare(string id, double weight)
    {
        var index = shares.FindIndex(s => string.Equals(s.Id, id, StringComparison.Ordinal));
        if (index < 0)
        {
            shares.Add((id, weight));
        }
        else
        {
            shares[index] = (id, shares[index].Weight + weight);
        }
    }
}
