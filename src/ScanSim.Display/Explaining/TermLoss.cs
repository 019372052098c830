namespace ScanSim.Display.Explaining;

/// <summary>What one term cost a look; negative when it left something in hand. default(TermLoss) is no loss by range.</summary>
public readonly record struct TermLoss(LookTerm Term, double LossDb);
