namespace ScanSim.Recordings;

/// <summary>Of a truth row what a plan needs. default(TruthSummary) is no row.</summary>
public readonly record struct TruthSummary
{
    public required double TimeS { get; init; }

    public required int Scan { get; init; }

    public required string Target { get; init; }

    public required double HeightM { get; init; }

    public required double EastMps { get; init; }

    public required double NorthMps { get; init; }

    public required double RangeM { get; init; }

    public required double AzimuthDeg { get; init; }

    public required TargetView View { get; init; }

    public static TruthSummary Of(in TruthRow row) => new()
    {
        TimeS = row.TimeS,
        Scan = row.Scan,
        Target = row.Target,
        HeightM = row.HeightM,
        EastMps = row.EastMps,
        NorthMps = row.NorthMps,
        RangeM = row.RangeM,
        AzimuthDeg = row.AzimuthDeg,
        View = row.View,
    };
}
