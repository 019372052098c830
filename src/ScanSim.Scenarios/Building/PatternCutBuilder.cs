using System.Collections.Immutable;
using ScanSim.Physics.Antennas;
using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>Builds one cut of the antenna pattern from its sound block.</summary>
internal static class PatternCutBuilder
{
    /// <summary>Half the power: 10·log10(1/2).</summary>
    private const double HalfPowerDb = -3.01029995663981195214;

    /// <summary>Null, with a fault, when a table is no beam.</summary>
    public static PatternCut? Build(CheckedBlock cut, FaultList faults) => cut.Text("shape") switch
    {
        "gaussian" => new PatternCut.Gaussian { BeamwidthRad = cut.Si("beamwidth") },
        "uniform" => new PatternCut.Uniform { BeamwidthRad = cut.Si("beamwidth") },
        "cosine" => new PatternCut.Cosine { BeamwidthRad = cut.Si("beamwidth") },
        "cosineSquared" => new PatternCut.CosineSquared { BeamwidthRad = cut.Si("beamwidth") },
        "cosecantSquared" => new PatternCut.CosecantSquared { BeamwidthRad = cut.Si("beamwidth"), UpToRad = cut.Si("upTo") },
        _ => Table(cut, faults),
    };

    private static PatternCut.Table? Table(CheckedBlock cut, FaultList faults)
    {
        var rows = cut.Blocks("table").ToList();
        var offsetsRad = rows.Select(row => row.Si("offset")).ToImmutableArray();
        var levelsDb = rows.Select(row => row.Written("level")).ToImmutableArray();
        for (var i = 1; i < rows.Count; i++)
        {
            if (!(offsetsRad[i] > offsetsRad[i - 1]))
            {
                faults.Add(rows[i].Values["offset"], rows[i].Values["offset"].Json.Shown(), $"an offset above {rows[i - 1].Values["offset"].Json.Shown()}, that of the row before");
                return null;
            }
        }

        var peak = levelsDb.IndexOf(levelsDb.Max());
        if (levelsDb[peak] != 0)
        {
            faults.Add(cut.Values["table"], $"a table whose highest level is {QuantityText.Plain(levelsDb[peak], 6)} dB", "levels below the peak: the highest is 0 dB");
            return null;
        }

        if (!levelsDb.AsSpan()[..peak].ContainsAnyInRange(double.MinValue, HalfPowerDb) || !levelsDb.AsSpan()[peak..].ContainsAnyInRange(double.MinValue, HalfPowerDb))
        {
            faults.Add(cut.Values["table"], "a table without half-power points", "rows on both sides of the peak at -3.01 dB or lower");
            return null;
        }

        var beamwidthRad = new TablePattern(offsetsRad.AsSpan(), levelsDb.AsSpan()).BeamwidthRad;
        return new PatternCut.Table { BeamwidthRad = beamwidthRad, OffsetsRad = offsetsRad, LevelsDb = levelsDb };
    }
}
