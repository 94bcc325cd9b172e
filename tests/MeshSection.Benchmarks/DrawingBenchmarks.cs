using System.Globalization;
using System.Text;
using BenchmarkDotNet.Attributes;
using MeshSection.Dxf;
using MeshSection.Dxf.Entities;

namespace MeshSection.Benchmarks;

/// <summary>
/// Reading and joining loose lines in random order, against sorting as many random numbers: the ratios tell how far both stay
/// n log n, on any machine.
/// </summary>
[MemoryDiagnoser]
public class DrawingBenchmarks
{
    private byte[] file = [];
    private Drawing drawing = null!;
    private double[] unsorted = [];

    [Params(1_000, 10_000, 50_000, 100_000, 1_000_000)]
    public int Entities { get; set; }

    [Params("one boundary", "circles")]
    public string Kind { get; set; } = "";

    [GlobalSetup]
    public void Prepare()
    {
        file = Encoding.ASCII.GetBytes(Text(Kind, Entities));
        drawing = Read();
        var random = new Random(1);
        unsorted = [.. Enumerable.Range(0, Entities).Select(_ => random.NextDouble())];
    }

    [Benchmark(Baseline = true)]
    public double[] Sort()
    {
        var sorted = (double[])unsorted.Clone();
        Array.Sort(sorted);
        return sorted;
    }

    [Benchmark]
    public Drawing Read() => new DxfReader().Read(new MemoryStream(file));

    [Benchmark]
    public DrawingOutline Join() => DrawingOutliner.Outline(drawing, new OutlineOptions());

    private static string Text(string kind, int count)
    {
        var text = new StringBuilder("  0\nSECTION\n  2\nHEADER\n  9\n$INSUNITS\n 70\n4\n  0\nENDSEC\n  0\nSECTION\n  2\nENTITIES\n");
        var order = Enumerable.Range(0, count).ToArray();
        new Random(1).Shuffle(order);
        foreach (var i in order)
        {
            if (kind == "circles")
            {
                var side = (int)Math.Ceiling(Math.Sqrt(count));
                text.Append(CultureInfo.InvariantCulture, $"  0\nCIRCLE\n  8\nSECTION\n 10\n{3 * (i % side)}.5\n 20\n{3 * (i / side)}.5\n 40\n1.0\n");
            }
            else
            {
                var ((x, y), (u, v)) = (Wavy(i, count), Wavy((i + 1) % count, count));
                text.Append(CultureInfo.InvariantCulture, $"  0\nLINE\n  8\nSECTION\n 10\n{x:R}\n 20\n{y:R}\n 30\n0.0\n 11\n{u:R}\n 21\n{v:R}\n 31\n0.0\n");
            }
        }

        return text.Append("  0\nENDSEC\n  0\nEOF\n").ToString();
    }

    private static (double X, double Y) Wavy(int i, int count)
    {
        var angle = Math.Tau * i / count;
        var radius = 1000 + 10 * Math.Sin(60 * angle);
        return (radius * Math.Cos(angle), radius * Math.Sin(angle));
    }
}
