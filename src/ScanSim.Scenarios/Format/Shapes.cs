namespace ScanSim.Scenarios.Format;

/// <summary>Shapes that several blocks share, with the limits of what the models can answer for.</summary>
internal static class Shapes
{
    /// <summary>One line of text: no control characters, which would break tables and pictures.</summary>
    public static readonly Shape Line = new Shape.OfText(200, @"^[^\u0000-\u001F\u007F-\u009F\u2028\u2029]+$", "on one line, no control characters");

    public static readonly Shape Id = new Shape.OfText(64, "^[A-Za-z0-9._-]+$", "letters, digits, '-', '_' and '.'");

    /// <summary>50 km: above every aircraft, below the heights where effective-earth geometry loses its meaning.</summary>
    public static readonly Shape Height = new Shape.OfQuantity(Dimension.Length) { AtLeast = "-500 m", AtMost = "50 km" };

    /// <summary>Any compass direction, either sign.</summary>
    public static readonly Shape Direction = new Shape.OfQuantity(Dimension.Angle) { AtLeast = "-360 deg", AtMost = "360 deg" };

    /// <summary>To 2,000 km, beyond every surface radar's reach.</summary>
    public static readonly Shape Coordinate = new Shape.OfQuantity(Dimension.Length) { AtLeast = "-2000 km", AtMost = "2000 km" };

    public static readonly Shape Distance = new Shape.OfQuantity(Dimension.Length) { AtLeast = "0 m", AtMost = "2000 km" };

    public static readonly Shape PathLength = new Shape.OfQuantity(Dimension.Length) { Above = "0 m", AtMost = "6000 km" };

    public static readonly Shape Latitude = new Shape.OfQuantity(Dimension.Angle) { AtLeast = "-90 deg", AtMost = "90 deg" };

    public static readonly Shape Longitude = new Shape.OfQuantity(Dimension.Angle) { AtLeast = "-180 deg", AtMost = "180 deg" };

    public static readonly Shape MovingSpeed = new Shape.OfQuantity(Dimension.Speed) { Above = "0 m/s", AtMost = "10000 m/s" };

    public static readonly Shape AnySpeed = new Shape.OfQuantity(Dimension.Speed) { AtLeast = "0 m/s", AtMost = "10000 m/s" };

    public static readonly Shape TurnRate = new Shape.OfQuantity(Dimension.AngularRate) { AtLeast = "0.001 deg/s", AtMost = "360 deg/s" };

    /// <summary>Thirty days: run times beyond it are a slip of the unit.</summary>
    public static readonly Shape Span = new Shape.OfQuantity(Dimension.Time) { Above = "0 s", AtMost = "720 h" };

    public static readonly Shape RunTime = new Shape.OfQuantity(Dimension.Time) { AtLeast = "-720 h", AtMost = "720 h" };

    public static readonly Shape LossDb = new Shape.OfQuantity(Dimension.Ratio) { AtLeast = "0 dB", AtMost = "60 dB" };

    public static readonly Shape Kelvin = new Shape.OfQuantity(Dimension.Temperature) { AtLeast = "0 K", AtMost = "10000 K" };
}
