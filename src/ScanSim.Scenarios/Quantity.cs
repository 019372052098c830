namespace ScanSim.Scenarios;

/// <summary>A number with its unit as it was written, and its SI value.</summary>
/// <remarks>default(Quantity) has no unit and is not a quantity.</remarks>
public readonly record struct Quantity(double Number, Unit Unit, double Si);
