using ScanSim.Display.Explaining;
using ScanSim.Display.Painting;
using ScanSim.Recordings;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>The last look at the selected target: outcome, reason, budget, and its looks around that time.</summary>
internal sealed class TargetLookPanel(
    Sheet sheet, PanelColumn column, ReplayState state, ReplayRecording recording, SceneTarget target, SelectedLooks looks, int index, bool isBrief)
{
    private const float SnrHeight = 46;
    private const float PdHeight = 30;
    private const float BudgetHeight = 9 * BudgetBars.LineHeight + 10;

    public void Paint()
    {
        var look = looks.At(index, state.TimeS, 1.5 * recording.Scene.Beam.PeriodS);
        var explained = look is { } row ? recording.Explainer.Explain(row) : null;
        PaintOutcome(explained);
        if (explained is not null)
        {
            PaintDraw(explained);
        }

        if (explained is not null && !isBrief && column.HasRoom(BudgetHeight + SnrHeight + 16))
        {
            column.Y += 2;
            new BudgetBars(sheet, explained).Paint(column);
        }

        PaintCharts(explained);
    }

    private void PaintOutcome(LookExplanation? explained)
    {
        var at = ReplaySteps.FirstFrom(target.Looks, state.TimeS + 1e-6) - 1;
        if (at < 0 || state.TimeS - target.Looks[at].TimeS > 1.5 * recording.Scene.Beam.PeriodS)
        {
            column.Y += 4;
            column.Paragraph("No look yet at this time.", 1, sheet.Colours.Quiet);
            return;
        }

        var mark = target.Looks[at];
        var time = recording.Scene.StartUtc.ToUniversalTime().AddSeconds(mark.TimeS);
        column.Y += 3;
        column.Heading("    " + OutcomeText.Of(mark.Outcome), $"scan {mark.Scan}, {time:HH:mm:ss.f}");
        Glyphs.Outcome(sheet, mark.Outcome, new SKPoint(column.Left + 5, column.Y - 4), 4.5f);
        if (explained is not null && Math.Abs(explained.Row.TimeS - mark.TimeS) < recording.Scene.Beam.PeriodS / 2)
        {
            column.Paragraph(explained.Reason, isBrief ? 3 : 4, sheet.Colours.Ink);
        }
        else if (mark.Outcome == LookOutcome.NoLook)
        {
            column.Paragraph(NoLookText(), 2, sheet.Colours.Ink);
        }
    }

    private string NoLookText()
    {
        var truth = TruthAtTime.IndexAt(target.Truth, state.TimeS);
        return (truth < 0 ? TargetView.InView : target.Truth[truth].View) switch
        {
            TargetView.BelowHorizon => "below the horizon",
            TargetView.BeyondInstrumentedRange => "beyond the instrumented range",
            TargetView.Blanked => "in a sector where the transmitter is off",
            TargetView.OutsideSector => "outside the swept sector",
            _ => "far too weak, or no dwell met it",
        };
    }

    private void PaintDraw(LookExplanation explained)
    {
        var row = explained.Row;
        column.Figures("Pd", $"{row.Pd:0.000}", "margin", BudgetBars.Db(explained.MarginDb));
        column.Figures("RCS draw", row.FluctuationDb is { } db ? BudgetBars.Db(db) : "–", "statistic", BudgetBars.Db(row.StatisticDb));
    }

    private void PaintCharts(LookExplanation? explained)
    {
        var spare = column.Spare - (isBrief ? 24 : 46);
        // Two recordings: the second one's lines come below.
        var snrHeight = isBrief ? SnrHeight : Math.Clamp(0.6f * spare, SnrHeight, 3 * SnrHeight);
        var pdHeight = Math.Clamp(0.4f * spare, PdHeight, 3 * PdHeight);
        if (column.HasRoom(SnrHeight + 20))
        {
            Caption("SNR, dB", explained is null ? "" : "line: needed for even odds");
            new LookChart(sheet, recording.Scene, state.TimeS, column.Box(snrHeight)).PaintSnr(target.Looks, explained?.NeededDb);
        }

        if (!isBrief && column.HasRoom(PdHeight + 20))
        {
            Caption("Pd", looks.IsWhole ? "" : "reading …");
            new LookChart(sheet, recording.Scene, state.TimeS, column.Box(pdHeight)).PaintPd(looks.Looks[index]);
        }
    }

    private void Caption(string text, string beside)
    {
        column.Y += 15;
        sheet.Text(text, column.Left, column.Y, TextStyle.Small, sheet.Colours.Quiet);
        sheet.Text(beside, column.Right, column.Y, TextStyle.Small, sheet.Colours.Quiet, SKTextAlign.Right);
    }
}
