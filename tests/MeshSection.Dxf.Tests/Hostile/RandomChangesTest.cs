using System.Text;
using CsCheck;
using MeshSection.Geometry;
using MeshSection.Units;

namespace MeshSection.Dxf.Tests.Hostile;

/// <summary>
/// Drawings changed at random, bytes, lines and whole parts: each gives an outline or one refusal, in bounded time and
/// memory. <c>CsCheck_Time=3600 dotnet test --project tests/MeshSection.Dxf.Tests -c Release --filter-class "*RandomChangesTest"</c>
/// runs it for an hour.
/// </summary>
public class RandomChangesTest
{
    private const long MostMemory = 500_000_000;

    // Values that are legal somewhere and hostile elsewhere.
    private static readonly string[] Values =
    [
        "0", "-1", "1", "1e300", "-1e300", "1e-300", "1e154", "1e9", "5e-324", "nan", "2147483647", "-2147483648", "1e400", "1,5",
        "1.5mm", "", "999999999", "360", "16", "255", "SECTION", "ENDSEC", "INSERT", "EOF",
    ];

    private static readonly string Folder = RepositoryRoot.PathOf("tests/MeshSection.Dxf.Tests");

    private static readonly byte[][] Seeds =
        [.. Directory.GetFiles(Path.Combine(Folder, "Drawings"), "*.dxf").Order(StringComparer.Ordinal).Select(File.ReadAllBytes)];

    private static readonly Gen<(int Kind, double At, double From, int Length, int Value)> AnyChange =
        Gen.Select(Gen.Int[0, 7], Gen.Double[0, 1], Gen.Double[0, 1], Gen.Int[1, 400], Gen.Int[0, 1000]);

    private static readonly Gen<OutlineOptions> AnyOptions =
        from layers in Gen.OneOf(Gen.Const<string[]>([]), Gen.Const<string[]>(["SECTION"]))
        from regions in Gen.OneOf(Gen.Const<string[]>([]), Gen.Const<string[]>([]), Gen.Const<string[]>(["*"]))
        from inside in Gen.OneOf(Gen.Const<Point[]>([]), Gen.Const<Point[]>([]), Gen.Const<Point[]>([new(10, 10)]))
        select new OutlineOptions { Unit = LengthUnit.Millimetre, Layers = layers, Regions = regions, Inside = inside };

    public static TheoryData<string> Found => [.. Directory.GetFiles(Path.Combine(Folder, "Hostile", "found"), "*.dxf").Select(f => Path.GetFileName(f)!)];

    [Fact]
    public void Changed_drawings_give_an_outline_or_one_refusal() =>
        Gen.Select(Gen.Int[0, Seeds.Length - 1], AnyChange.List[1, 4], AnyOptions)
            .Sample((seed, changes, options) => Check(Changed(Seeds[seed], changes), options), iter: 5_000);

    [Theory]
    [MemberData(nameof(Found))]
    public void So_do_those_that_once_did_not(string file)
    {
        var bytes = File.ReadAllBytes(Path.Combine(Folder, "Hostile", "found", file));
        Check(bytes, new OutlineOptions { Unit = LengthUnit.Millimetre });
        Check(bytes, new OutlineOptions { Unit = LengthUnit.Millimetre, Regions = ["*"] });
    }

    [Fact]
    public void Binary_drawings_cut_off_at_any_byte_give_a_drawing_or_one_refusal()
    {
        foreach (var name in new[] { "08-binary-r12.dxf", "08-binary-r2018.dxf" })
        {
            var bytes = File.ReadAllBytes(Path.Combine(Folder, "Drawings", name));
            for (var length = 0; length < bytes.Length; length++)
            {
                Check(bytes[..length], new OutlineOptions { Unit = LengthUnit.Millimetre });
            }
        }
    }

    [Fact]
    public void Bytes_of_any_kind_give_a_drawing_or_one_refusal() => Gen.Select(Gen.Bool, Gen.Byte.Array[0, 300]).Sample((isBinary, bytes) =>
        Check(isBinary ? [.. "AutoCAD Binary DXF\r\n\u001a\0"u8, .. bytes] : bytes, new OutlineOptions()));

    private static void Check(byte[] bytes, OutlineOptions options)
    {
        var before = GC.GetAllocatedBytesForCurrentThread();
        try
        {
            DrawingOutliner.Outline(new DxfReader().Read(new MemoryStream(bytes)), options);
        }
        catch (DrawingException refusal)
        {
            Assert.InRange(refusal.Message.Length, 20, 3000);
        }

        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, MostMemory);
    }

    private static byte[] Changed(byte[] seed, List<(int Kind, double At, double From, int Length, int Value)> changes)
    {
        var bytes = seed.ToList();
        foreach (var (kind, at, from, length, value) in changes)
        {
            var (place, source) = ((int)(at * (bytes.Count - 1)), (int)(from * (bytes.Count - 1)));
            var count = Math.Min(length, bytes.Count - Math.Max(place, source));
            switch (kind)
            {
                case 0:
                    bytes[place] = (byte)value;
                    break;
                case 1:
                    bytes.Insert(place, (byte)value);
                    break;
                case 2:
                    bytes.RemoveRange(place, Math.Min(count, bytes.Count - 1));
                    break;
                case 3:
                    bytes.InsertRange(place, bytes.GetRange(source, count));
                    break;
                default:
                    Replace(bytes, place, Values[value % Values.Length]);
                    break;
            }
        }

        return [.. bytes];
    }

    /// <summary>Puts a value in the place of the line at a byte.</summary>
    private static void Replace(List<byte> bytes, int place, string value)
    {
        var (start, end) = (place, place);
        while (start > 0 && bytes[start - 1] != '\n')
        {
            start--;
        }

        while (end < bytes.Count && bytes[end] != '\n')
        {
            end++;
        }

        bytes.RemoveRange(start, end - start);
        bytes.InsertRange(start, Encoding.ASCII.GetBytes(value));
    }
}
