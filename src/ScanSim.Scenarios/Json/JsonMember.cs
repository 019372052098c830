namespace ScanSim.Scenarios.Json;

/// <summary>A property of an object; line and column of its name.</summary>
internal sealed record JsonMember(string Name, int Line, int Column, JsonValue Value);
