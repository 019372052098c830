using System.Collections.Immutable;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>The marks of a row of the timeline, whatever they stand for, and how each kind looks.</summary>
internal abstract class RowMarks
{
    public abstract int Count { get; }

    public abstract int Kinds { get; }

    /// <summary>Kinds in the order in which a column is filled from below; what is left is the kind for nothing to see.</summary>
    public abstract IReadOnlyList<int> FromBelow { get; }

    public abstract int Nothing { get; }

    public abstract double TimeS(int index);

    public abstract int Scan(int index);

    public abstract int Kind(int index);

    /// <summary>From 0, weak, to <see cref="SnrShades.Count"/> − 1.</summary>
    public abstract int Shade(int index);

    public abstract void Fill(Sheet sheet, int kind, SKRect box);

    public abstract void Draw(Sheet sheet, int kind, SKPoint[] centres, float r, byte alpha);

    public int FirstFrom(double timeS)
    {
        var (low, high) = (0, Count);
        while (low < high)
        {
            var middle = (low + high) >> 1;
            (low, high) = TimeS(middle) < timeS ? (middle + 1, high) : (low, middle);
        }

        return low;
    }
}

/// <summary>What became of a target in one recording.</summary>
internal sealed class OutcomeMarks(ImmutableArray<LookMark> looks, SnrShades shades) : RowMarks
{
    private static readonly int[] Order =
    [
        (int)LookOutcome.Detected, (int)LookOutcome.MissedChance, (int)LookOutcome.MissedRange, (int)LookOutcome.MissedBeam,
        (int)LookOutcome.MissedMasked, (int)LookOutcome.MissedUnrecorded,
    ];

    public override int Count => looks.Length;

    public override int Kinds => 7;

    public override IReadOnlyList<int> FromBelow => Order;

    public override int Nothing => (int)LookOutcome.NoLook;

    public override double TimeS(int index) => looks[index].TimeS;

    public override int Scan(int index) => looks[index].Scan;

    public override int Kind(int index) => (int)looks[index].Outcome;

    public override int Shade(int index) => shades.Of(looks[index].SnrDb);

    public override void Fill(Sheet sheet, int kind, SKRect box) => OutcomeTexture.Fill(sheet, (LookOutcome)kind, box);

    public override void Draw(Sheet sheet, int kind, SKPoint[] centres, float r, byte alpha) => Glyphs.Outcomes(sheet, (LookOutcome)kind, centres, r, alpha);
}

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
