namespace ScanSim.Physics.Antennas;

/// <summary>Measured or data-sheet cut: one-way level in dB (0 at the peak, negative below) over offsets in rising order.</summary>
/// <remarks>
/// Between two rows the level runs linearly in dB; outside the table the end level holds. The beamwidth is the distance of the
/// half-power crossings on both sides of the highest row; where the table never falls so far, its end (±π) stands for the
/// crossing. Domain: at least two rows, offsets finite, strictly rising and in [−π, π], levels finite and ≤ 0. NaN in, NaN out.
/// </remarks>
public sealed class TablePattern : Pattern
{
    private const double HalfPowerDb = -3.01029995663981195214;

    private readonly double[] offsetsRad;
    private readonly double[] levelsDb;

    public TablePattern(ReadOnlySpan<double> offsetsRad, ReadOnlySpan<double> levelsDb)
    {
        Check(offsetsRad, levelsDb);
        this.offsetsRad = offsetsRad.ToArray();
        this.levelsDb = levelsDb.ToArray();
        int peak = Array.IndexOf(this.levelsDb, this.levelsDb.Max());
        BeamwidthRad = Crossing(peak, 1) - Crossing(peak, -1);
    }

    public override double BeamwidthRad { get; }

    public override double GainRatio(double offsetRad) => Decibels.ToRatio(LevelDb(offsetRad));

    private static void Check(ReadOnlySpan<double> offsetsRad, ReadOnlySpan<double> levelsDb)
    {
        if (offsetsRad.Length < 2 || offsetsRad.Length != levelsDb.Length)
        {
            throw new ArgumentException($"a pattern table needs at least two rows and as many levels as offsets; it has {offsetsRad.Length} offsets and {levelsDb.Length} levels", nameof(levelsDb));
        }

        for (int i = 0; i < offsetsRad.Length; i++)
        {
            if (!(Math.Abs(offsetsRad[i]) <= Math.PI) || (i > 0 && !(offsetsRad[i] > offsetsRad[i - 1])))
            {
                throw new ArgumentException($"row {i + 1} of the pattern table: offset {offsetsRad[i]:R} rad; offsets must rise and lie between -π and π", nameof(offsetsRad));
            }

            if (!(levelsDb[i] <= 0.0) || double.IsInfinity(levelsDb[i]))
            {
                throw new ArgumentException($"row {i + 1} of the pattern table: level {levelsDb[i]:R} dB; levels are relative to the peak, finite and at most 0 dB", nameof(levelsDb));
            }
        }
    }

    private double LevelDb(double offsetRad)
    {
        if (offsetRad <= offsetsRad[0])
        {
            return levelsDb[0];
        }

        if (offsetRad >= offsetsRad[^1])
        {
            return levelsDb[^1];
        }

        int found = Array.BinarySearch(offsetsRad, offsetRad);
        int above = found >= 0 ? Math.Max(found, 1) : Math.Max(~found, 1);
        double share = (offsetRad - offsetsRad[above - 1]) / (offsetsRad[above] - offsetsRad[above - 1]);
        return levelsDb[above - 1] + share * (levelsDb[above] - levelsDb[above - 1]);
    }

    private double Crossing(int peak, int direction)
    {
        double levelDb = levelsDb[peak] + HalfPowerDb;
        for (int i = peak + direction; i >= 0 && i < levelsDb.Length; i += direction)
        {
            if (levelsDb[i] <= levelDb)
            {
                int inner = i - direction;
                double share = (levelDb - levelsDb[inner]) / (levelsDb[i] - levelsDb[inner]);
                return offsetsRad[inner] + share * (offsetsRad[i] - offsetsRad[inner]);
            }
        }

        return direction * Math.PI;
    }
}
