using MeshSection.Cli;

return CommandLine.Run(args, Terminal.OfProcess());
