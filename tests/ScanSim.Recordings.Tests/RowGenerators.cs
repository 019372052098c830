using CsCheck;

namespace ScanSim.Recordings.Tests;

/// <summary>Rows with every value a table may hold: extremes, negative zero, infinities, ids of all scripts and with separators in them.</summary>
internal static class RowGenerators
{
    private static readonly Gen<double> Number = Gen.OneOf(
        Gen.Double[-1e6, 1e6],
        Gen.Double[-1e-300, 1e-300],
        Among(
            0.0,
            -0.0,
            0.1,
            1.0 / 3.0,
            double.Epsilon,
            -double.Epsilon,
            double.MaxValue,
            double.MinValue,
            double.PositiveInfinity,
            double.NegativeInfinity
        )
    );

    private static readonly Gen<double?> NumberOrNull = Gen.OneOf(Number.Select(value => (double?)value), Gen.Const((double?)null));

    private static readonly Gen<int> Count = Gen.OneOf(Gen.Int, Among(0, int.MaxValue, int.MinValue));

    private static readonly Gen<long> LongCount = Gen.OneOf(Gen.Long, Among(0L, long.MaxValue, long.MinValue));

    private static readonly Gen<string> Text = Gen.OneOf(
        Gen.String[Gen.Char.AlphaNumeric, 0, 12],
        Among(
            "",
            " ",
            "ferry",
            "a+b",
            "Fähre 7",
            "汽船",
            "🚤 fast",
            "a,b",
            "say \"no\"",
            "=1+1",
            "-",
            "two\nlines",
            "cr\r\nlf",
            " edge ",
            "tab\t",
            "null",
            "\\u0041",
            "<&>"
        )
    );

    public static readonly Gen<ScanRow> Scan =
        from counts in Count.Array[6]
        from numbers in Number.Array[2]
        select new ScanRow
        {
            Scan = counts[0],
            StartS = numbers[0],
            EndS = numbers[1],
            Looks = counts[1],
            Hits = counts[2],
            FalseHits = counts[3],
            Plots = counts[4],
            FalsePlots = counts[5],
        };

    public static readonly Gen<LookRow> Look =
        from numbers in Number.Array[15]
        from fluctuation in NumberOrNull
        from counts in Count.Array[3]
        from dwell in LongCount
        from target in Text
        from detected in Gen.Bool
        from lostTo in Gen.Enum<LossReason>()
        select new LookRow
        {
            TimeS = numbers[0],
            Scan = counts[0],
            Dwell = dwell,
            Target = target,
            RangeM = numbers[1],
            AzimuthDeg = numbers[2],
            ElevationDeg = numbers[3],
            RadialSpeedMps = numbers[4],
            BeamAzimuthDeg = numbers[5],
            Pulses = counts[1],
            RadarDb = numbers[6],
            RcsDb = numbers[7],
            SpreadingDb = numbers[8],
            AzimuthBeamDb = numbers[9],
            ElevationBeamDb = numbers[10],
            EclipsingDb = numbers[11],
            SnrDb = numbers[12],
            Pd = numbers[13],
            FluctuationDb = fluctuation,
            StatisticDb = numbers[14],
            Detected = detected,
            LostTo = lostTo,
            TargetsInCell = counts[2],
        };

    public static readonly Gen<HitRow> Hit =
        from numbers in Number.Array[4]
        from scan in Count
        from dwell in LongCount
        from kind in Gen.Enum<EchoKind>()
        from target in Text
        select new HitRow
        {
            TimeS = numbers[0],
            Scan = scan,
            Dwell = dwell,
            BeamAzimuthDeg = numbers[1],
            RangeM = numbers[2],
            SnrDb = numbers[3],
            Kind = kind,
            Target = target,
        };

    public static readonly Gen<PlotRow> Plot =
        from numbers in Number.Array[6]
        from counts in Count.Array[2]
        from kind in Gen.Enum<EchoKind>()
        from target in Text
        select new PlotRow
        {
            TimeS = numbers[0],
            Scan = counts[0],
            RangeM = numbers[1],
            AzimuthDeg = numbers[2],
            SnrDb = numbers[3],
            Hits = counts[1],
            SigmaRangeM = numbers[4],
            SigmaAzimuthDeg = numbers[5],
            Kind = kind,
            Target = target,
        };

    public static readonly Gen<TruthRow> Truth =
        from numbers in Number.Array[12]
        from scan in Count
        from target in Text
        from view in Gen.Enum<TargetView>()
        select new TruthRow
        {
            TimeS = numbers[0],
            Scan = scan,
            Target = target,
            LatitudeDeg = numbers[1],
            LongitudeDeg = numbers[2],
            HeightM = numbers[3],
            EastM = numbers[4],
            NorthM = numbers[5],
            EastMps = numbers[6],
            NorthMps = numbers[7],
            UpMps = numbers[8],
            RangeM = numbers[9],
            AzimuthDeg = numbers[10],
            ElevationDeg = numbers[11],
            View = view,
        };

    public static readonly Gen<RowSet> All =
        from scans in Scan.Array[0, 20]
        from looks in Look.Array[0, 60]
        from hits in Hit.Array[0, 30]
        from plots in Plot.Array[0, 30]
        from truth in Truth.Array[0, 30]
        select new RowSet(scans, looks, hits, plots, truth);

    /// <summary>The same values on each call.</summary>
    public static T Fixed<T>(Gen<T> values) => values.Generate(new PCG(7, 11), null, out _);

    private static Gen<T> Among<T>(params T[] values) => Gen.Int[0, values.Length - 1].Select(place => values[place]);
}
