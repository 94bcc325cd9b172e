using BenchmarkDotNet.Running;
using MeshSection.Benchmarks;

BenchmarkSwitcher.FromAssembly(typeof(MeshBenchmarks).Assembly).Run(args);
