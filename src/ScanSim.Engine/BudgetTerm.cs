namespace ScanSim.Engine;

/// <summary>One line of a budget: what it is, its value in the unit one thinks in, and what it adds in dB (negative for a loss).</summary>
/// <param name="Name">The term, in the trade's words.</param>
/// <param name="Value">In SI units (W, m, m², K, Hz, s or a plain ratio, as <paramref name="Unit"/> says).</param>
/// <param name="Unit">SI unit of the value; empty for a ratio.</param>
/// <param name="Db">Contribution to the sum.</param>
public sealed record BudgetTerm(string Name, double Value, string Unit, double Db);
