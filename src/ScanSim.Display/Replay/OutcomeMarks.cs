using System.Collections.Immutable;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Replay;

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
