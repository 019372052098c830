namespace ScanSim.Display.Films;

/// <summary>A colour, red in the lowest byte, and how many pixels have it. default(ColourCount) is black that does not occur.</summary>
internal readonly record struct ColourCount(uint Rgb, long Count)
{
    /// <summary>0 red, 1 green, 2 blue.</summary>
    public int Part(int axis) => (int)(Rgb >> (8 * axis) & 0xFF);

    /// <summary>Thin strokes of few pixels must not lose to large areas: the square root stands between counting pixels and counting colours.</summary>
    public double Weight => Math.Sqrt(Count);
}
