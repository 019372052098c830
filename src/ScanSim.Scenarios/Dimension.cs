namespace ScanSim.Scenarios;

/// <summary>What a quantity measures; each has its units in <see cref="Units"/> and one SI value inside the program.</summary>
public enum Dimension
{
    /// <summary>Inside: Hz.</summary>
    Frequency,

    /// <summary>Inside: W.</summary>
    Power,

    /// <summary>Gain over the isotropic radiator. Inside: power ratio.</summary>
    Gain,

    /// <summary>A power ratio in decibels: losses, noise figure, pattern levels. Inside: power ratio.</summary>
    Ratio,

    /// <summary>Inside: rad.</summary>
    Angle,

    /// <summary>Inside: rad/s.</summary>
    AngularRate,

    /// <summary>Inside: m.</summary>
    Length,

    /// <summary>Inside: m/s.</summary>
    Speed,

    /// <summary>Inside: m/s².</summary>
    Acceleration,

    /// <summary>Inside: m².</summary>
    Area,

    /// <summary>Inside: s.</summary>
    Time,

    /// <summary>Inside: K.</summary>
    Temperature,
}
