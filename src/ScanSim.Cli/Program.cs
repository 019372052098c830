using ScanSim.Cli;

return CommandTree.Invoke(args);
