namespace ScanSim.Cli;

/// <summary>A part of the system that some command needs.</summary>
/// <param name="Name">What it is.</param>
/// <param name="NeededBy">The commands that do not work without it.</param>
/// <param name="IsThere">Whether it was found and works.</param>
/// <param name="Found">What was found, or what went wrong.</param>
/// <param name="WhatToDo">How to get it.</param>
internal sealed record SystemPart(string Name, string NeededBy, bool IsThere, string Found, string WhatToDo);
