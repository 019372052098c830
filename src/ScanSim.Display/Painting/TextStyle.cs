namespace ScanSim.Display.Painting;

/// <summary>The five ways text is set. Sizes: <see cref="Sheet.SizeOf"/>.</summary>
internal enum TextStyle
{
    Small = 0,
    Body = 1,
    Strong = 2,
    Clock = 3,
    Title = 4,
}
