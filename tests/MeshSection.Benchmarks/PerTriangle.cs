using System.Globalization;
using BenchmarkDotNet.Columns;
using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Reports;
using BenchmarkDotNet.Running;

namespace MeshSection.Benchmarks;

/// <summary>Shows how many triangles were made, and what each took.</summary>
public sealed class PerTriangle : ManualConfig
{
    public PerTriangle()
    {
        AddColumn(
            new Column("Made", (_, _, count) => count),
            new Column("ns/triangle", (summary, one, count) => summary[one]?.ResultStatistics?.Mean / count),
            new Column("B/triangle", (summary, one, count) => summary[one]?.GcStats.GetBytesAllocatedPerOperation(one) / (double)count));
    }

    private sealed class Column(string name, Func<Summary, BenchmarkCase, int, double?> value) : IColumn
    {
        private readonly Dictionary<string, int> counts = [];

        public string Id => name;

        public string ColumnName => name;

        public bool AlwaysShow => true;

        public ColumnCategory Category => ColumnCategory.Custom;

        public int PriorityInCategory => 0;

        public bool IsNumeric => true;

        public UnitType UnitType => UnitType.Dimensionless;

        public string Legend => $"{name}, of the mesh made for the row";

        public string GetValue(Summary summary, BenchmarkCase benchmarkCase) =>
            value(summary, benchmarkCase, Count(benchmarkCase))?.ToString("F0", CultureInfo.InvariantCulture) ?? "-";

        public string GetValue(Summary summary, BenchmarkCase benchmarkCase, SummaryStyle style) =>
            GetValue(summary, benchmarkCase);

        public bool IsDefault(Summary summary, BenchmarkCase benchmarkCase) => false;

        public bool IsAvailable(Summary summary) => true;

        private int Count(BenchmarkCase one)
        {
            var outline = (string)one.Parameters[nameof(MeshBenchmarks.Outline)];
            var triangles = (int)one.Parameters[nameof(MeshBenchmarks.Triangles)];
            var key = $"{outline} {triangles}";
            if (!counts.TryGetValue(key, out var count)) counts[key] = count = MeshBenchmarks.Count(outline, triangles);
            return count;
        }
    }
}
