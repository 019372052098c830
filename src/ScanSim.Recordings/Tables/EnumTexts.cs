namespace ScanSim.Recordings.Tables;

internal static class EnumTexts
{
    public static readonly EnumText<EchoKind> Echo = new(["target", "noise"]);

    public static readonly EnumText<LossReason> Loss = new(
        ["", "range", "azimuth beam", "elevation beam", "eclipsing", "fluctuation", "shared cell"]
    );

    public static readonly EnumText<TargetView> View = new(
        ["in view", "below horizon", "beyond instrumented range", "blanked", "outside sector"]
    );

    public static readonly EnumText<LooksKept> Looks = new(["best", "all", "none"]);

    /// <summary>Also the extension of the table files.</summary>
    public static readonly EnumText<TableFormat> Format = new(["parquet", "csv", "jsonl"]);
}
