using ScanSim.Display.Explaining;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>
/// The budget of one look as bars in dB. Above, the three great terms on a scale of their own; below, what is left of them in free space for
/// a dwell centred on the target, what beam and eclipsing take away, and the SNR that comes out, with the SNR that even odds need as a line.
/// </summary>
internal sealed class BudgetBars(Sheet sheet, LookExplanation look)
{
    public const float LineHeight = 14;
    private const float NameWidth = 92;
    private const float ValueWidth = 50;

    /// <summary>A term that takes away more than this is drawn cut off.</summary>
    private const double MostShownDb = 60;

    public void Paint(PanelColumn column)
    {
        var row = look.Row;
        var greatest = new[] { row.RadarDb, row.RcsDb, row.SpreadingDb }.Max(db => Math.Abs(db));
        Great(column, "radar", row.RadarDb, greatest);
        Great(column, "cross section", row.RcsDb, greatest);
        Great(column, "range", row.SpreadingDb, greatest);
        var (low, high) = Scale();
        column.Y += 3;
        var top = column.Y + 3;
        Step(column, "centred dwell", 0, look.FreeSpaceSnrDb, look.FreeSpaceSnrDb, sheet.Colours.Trail, low, high);
        var level = look.FreeSpaceSnrDb;
        foreach (var (name, db) in ((string, double)[])[("off azimuth", -look.LossDb(LookTerm.AzimuthBeam)), ("off elevation", -look.LossDb(LookTerm.ElevationBeam)), ("eclipsing", -look.LossDb(LookTerm.Eclipsing))])
        {
            Step(column, name, level, level + db, db, sheet.Colours.FalsePlot, low, high);
            level += db;
        }

        Step(column, "SNR", 0, row.SnrDb, row.SnrDb, sheet.Colours.Plot, low, high);
        PaintNeed(column, top, low, high);
    }

    private (double LowDb, double HighDb) Scale()
    {
        var high = Math.Max(Math.Max(look.FreeSpaceSnrDb, look.NeededDb), 0) + 2;
        var low = Math.Min(Math.Min(0, look.NeededDb), double.IsFinite(look.Row.SnrDb) ? look.Row.SnrDb : 0) - 2;
        return (Math.Max(low, high - MostShownDb), high);
    }

    private void Great(PanelColumn column, string name, double db, double greatestDb)
    {
        var (left, right) = Name(column, name, db);
        var middle = (left + right) / 2;
        var x = middle + (float)(db / greatestDb) * (right - left) / 2;
        sheet.Rect(Bar(column, Math.Min(x, middle), Math.Max(x, middle)), sheet.Colours.Trail);
        sheet.Line(new SKPoint(middle, column.Y - LineHeight + 3), new SKPoint(middle, column.Y + 3), 1, sheet.Colours.Quiet);
    }

    private void Step(PanelColumn column, string name, double fromDb, double toDb, double db, SKColor colour, double low, double high)
    {
        var (left, right) = Name(column, name, db);
        var (a, b) = (X(fromDb), X(toDb));
        sheet.Rect(Bar(column, Math.Min(a, b), Math.Max(Math.Max(a, b), Math.Min(a, b) + 1)), colour);

        float X(double atDb) => left + (float)((Math.Clamp(atDb, low, high) - low) / (high - low)) * (right - left);
    }

    private void PaintNeed(PanelColumn column, float top, double low, double high)
    {
        var (left, right) = (column.Left + NameWidth, column.Right - ValueWidth);
        var x = left + (float)((look.NeededDb - low) / (high - low)) * (right - left);
        sheet.Line(new SKPoint(x, top - 1), new SKPoint(x, column.Y + 4), 1.5f, sheet.Colours.Ink);
        column.Y += LineHeight;
        sheet.Text("needed for even odds", column.Left, column.Y, TextStyle.Small, sheet.Colours.Quiet);
        sheet.Text(Db(look.NeededDb), column.Right, column.Y, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
    }

    private (float Left, float Right) Name(PanelColumn column, string name, double db)
    {
        column.Y += LineHeight;
        sheet.Text(name, column.Left, column.Y, TextStyle.Small, sheet.Colours.Quiet);
        sheet.Text(Db(db), column.Right, column.Y, TextStyle.Small, sheet.Colours.Ink, SKTextAlign.Right);
        return (column.Left + NameWidth, column.Right - ValueWidth);
    }

    private static SKRect Bar(PanelColumn column, float left, float right) => new(left, column.Y - 9, right, column.Y);

    /// <summary>With a dash for the minus (our letters lack the sign), and no "–0.0".</summary>
    public static string Db(double db) => double.IsNegativeInfinity(db) ? "none" : (Math.Round(db, 1) + 0.0).ToString("0.0").Replace('-', '–') + " dB";
}
