namespace ScanSim.Scenarios;

/// <summary>A sector of azimuth, clockwise from <paramref name="FromRad"/> to <paramref name="ToRad"/>, both in [0, 2π) from true north.</summary>
/// <remarks>default(AzimuthSector) is the empty sector at north.</remarks>
public readonly record struct AzimuthSector(double FromRad, double ToRad)
{
    /// <summary>Width in [0, 2π).</summary>
    public double WidthRad => ToRad >= FromRad ? ToRad - FromRad : ToRad - FromRad + 2 * Math.PI;

    /// <summary>True for an azimuth (in [0, 2π)) inside, both edges included.</summary>
    public bool Contains(double azimuthRad)
    {
        var offset = azimuthRad - FromRad;
        return (offset < 0 ? offset + 2 * Math.PI : offset) <= WidthRad;
    }
}
