using System.Collections.Immutable;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>Which of two recordings saw a target.</summary>
internal sealed class ComparisonMarks(ImmutableArray<ComparedMark> marks) : RowMarks
{
    private static readonly int[] Order = [(int)ComparedOutcome.Both, (int)ComparedOutcome.OnlyLeft, (int)ComparedOutcome.OnlyRight, (int)ComparedOutcome.Neither];

    public override int Count => marks.Length;

    public override int Kinds => 5;

    public override IReadOnlyList<int> FromBelow => Order;

    public override int Nothing => (int)ComparedOutcome.NoLook;

    public override double TimeS(int index) => marks[index].TimeS;

    public override int Scan(int index) => marks[index].Scan;

    public override int Kind(int index) => (int)marks[index].Outcome;

    public override int Shade(int index) => SnrShades.Count - 1;

    public override void Fill(Sheet sheet, int kind, SKRect box) => ComparedGlyphs.Fill(sheet, (ComparedOutcome)kind, box);

    public override void Draw(Sheet sheet, int kind, SKPoint[] centres, float r, byte alpha) => ComparedGlyphs.Draw(sheet, (ComparedOutcome)kind, centres, r);
}
