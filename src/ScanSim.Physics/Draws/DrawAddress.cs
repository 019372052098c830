namespace ScanSim.Physics.Draws;

/// <summary>Where a draw lives: what it is for, whose it is, in which run, and which one (scan, dwell, look).</summary>
/// <remarks>Two different addresses never share a word of the generator. The default is purpose 0 of the radar in run 0, a legal address.</remarks>
/// <param name="Purpose">What is drawn. Numbers are format: once given, never changed.</param>
/// <param name="Entity">Whose draw: <see cref="DrawEntity"/>; 0 is the radar itself.</param>
/// <param name="Run">Number of the run within a study.</param>
/// <param name="Index">Number of the draw among its like.</param>
public readonly record struct DrawAddress(byte Purpose, uint Entity, uint Run, uint Index);
