using SkiaSharp;

namespace ScanSim.Display.Painting;

/// <summary>The colours of a theme.</summary>
/// <remarks>
/// The categorical colours are those of M. Okabe and K. Ito, Color Universal Design: How to make figures and presentations that are
/// friendly to colorblind people (2002, revised 2008); the greys are ours. A test holds their distances under simulated dichromacy.
/// </remarks>
internal sealed record Colours
{
    private static readonly SKColor Orange = new(0xE6, 0x9F, 0x00);
    private static readonly SKColor SkyBlue = new(0x56, 0xB4, 0xE9);
    private static readonly SKColor BluishGreen = new(0x00, 0x9E, 0x73);
    private static readonly SKColor Yellow = new(0xF0, 0xE4, 0x42);
    private static readonly SKColor Blue = new(0x00, 0x72, 0xB2);
    private static readonly SKColor Vermilion = new(0xD5, 0x5E, 0x00);
    private static readonly SKColor ReddishPurple = new(0xCC, 0x79, 0xA7);
    private static readonly SKColor Black = new(0x00, 0x00, 0x00);

    public static readonly Colours Dark = new()
    {
        Ground = new(0x15, 0x19, 0x1E),
        Panel = new(0x1B, 0x20, 0x26),
        Rule = new(0x33, 0x3B, 0x44),
        Grid = new(0x36, 0x3F, 0x49),
        GridText = new(0x9A, 0xA4, 0xAF),
        Ink = new(0xE3, 0xE7, 0xEB),
        Quiet = new(0xA3, 0xAD, 0xB7),
        Truth = new(0xD2, 0xD8, 0xDE),
        Trail = new(0x6B, 0x76, 0x82),
        Plot = SkyBlue,
        FalsePlot = Vermilion,
        Outcomes = [SkyBlue, Orange, ReddishPurple, Yellow, Blue, BluishGreen, new(0x56, 0x60, 0x69)],
    };

    public static readonly Colours Paper = new()
    {
        Ground = new(0xFF, 0xFF, 0xFF),
        Panel = new(0xF6, 0xF7, 0xF8),
        Rule = new(0xCD, 0xD2, 0xD7),
        Grid = new(0xD3, 0xD8, 0xDD),
        GridText = new(0x5F, 0x69, 0x73),
        Ink = new(0x17, 0x1B, 0x1F),
        Quiet = new(0x55, 0x5E, 0x67),
        Truth = new(0x2A, 0x30, 0x36),
        Trail = new(0x9A, 0xA3, 0xAC),
        Plot = Blue,
        FalsePlot = Vermilion,
        Outcomes = [Blue, Orange, ReddishPurple, BluishGreen, SkyBlue, Black, new(0xC8, 0xCE, 0xD4)],
    };

    public required SKColor Ground { get; init; }

    public required SKColor Panel { get; init; }

    public required SKColor Rule { get; init; }

    public required SKColor Grid { get; init; }

    public required SKColor GridText { get; init; }

    public required SKColor Ink { get; init; }

    public required SKColor Quiet { get; init; }

    public required SKColor Truth { get; init; }

    public required SKColor Trail { get; init; }

    public required SKColor Plot { get; init; }

    public required SKColor FalsePlot { get; init; }

    /// <summary>By <see cref="LookOutcome"/>.</summary>
    public required IReadOnlyList<SKColor> Outcomes { get; init; }

    public static Colours Of(Theme theme) => theme == Theme.Paper ? Paper : Dark;
}
