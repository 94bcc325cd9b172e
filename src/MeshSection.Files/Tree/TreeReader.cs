using System.Collections.Immutable;
using System.Globalization;
using System.Text.Json;

namespace MeshSection.Files.Tree;

/// <summary>Reads JSON with comments and trailing commas into nodes that know their places.</summary>
internal ref struct TreeReader
{
    private readonly string _file;
    private readonly LineIndex _lines;
    private Utf8JsonReader _reader;

    private TreeReader(ReadOnlySpan<byte> json, string file)
    {
        _file = file;
        _lines = new LineIndex(json);
        _reader = new Utf8JsonReader(
            json, new JsonReaderOptions { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true });
    }

    private readonly TextPlace Here => _lines.PlaceOf(_reader.TokenStartIndex);

    /// <exception cref="SectionFileException">The text is no JSON, or an object has a key twice.</exception>
    public static Node Read(ReadOnlySpan<byte> json, string file)
    {
        ReadOnlySpan<byte> mark = [0xEF, 0xBB, 0xBF];
        var text = json.StartsWith(mark) ? json[mark.Length..] : json;
        if (text.Trim(" \t\r\n"u8).IsEmpty)
        {
            throw new SectionFileException(
                file, null, "", "The file is empty.", "A section file is a JSON object with an outline or shapes.");
        }

        var reader = new TreeReader(text, file);
        try
        {
            reader._reader.Read();
            var root = reader.Value("");
            reader._reader.Read();
            return root;
        }
        catch (JsonException fault)
        {
            var place = reader._lines.PlaceOf(fault.LineNumber ?? 0, fault.BytePositionInLine ?? 0);
            throw new SectionFileException(
                file, place, "", $"This is not JSON: {Reason(fault)}", "Look for a comma, quote or bracket missing or left over.");
        }
        catch (InvalidOperationException)
        {
            throw new SectionFileException(
                file, reader.Here, "", "A text is not valid UTF-8.", "Save the file as UTF-8.");
        }
    }

    private static string Reason(JsonException fault)
    {
        var end = fault.Message.IndexOf(" LineNumber", StringComparison.Ordinal);
        return end < 0 ? fault.Message : fault.Message[..end];
    }

    private Node Value(string path) => _reader.TokenType switch
    {
        JsonTokenType.StartObject => Object(path),
        JsonTokenType.StartArray => List(path),
        JsonTokenType.String => Leaf(path, NodeKind.Text) with { Text = _reader.GetString() ?? "" },
        JsonTokenType.Number => Leaf(path, NodeKind.Number) with { Number = _reader.GetDouble() },
        JsonTokenType.True or JsonTokenType.False => Leaf(path, NodeKind.Flag) with { Flag = _reader.GetBoolean() },
        _ => Leaf(path, NodeKind.Null),
    };

    private readonly Node Leaf(string path, NodeKind kind) => new(_file, path, Here, kind);

    private Node Object(string path)
    {
        var node = Leaf(path, NodeKind.Object);
        var members = ImmutableArray.CreateBuilder<Member>();
        var keys = new HashSet<string>(StringComparer.Ordinal);
        while (_reader.Read() && _reader.TokenType != JsonTokenType.EndObject)
        {
            var place = Here;
            var key = _reader.GetString() ?? "";
            if (!keys.Add(key))
            {
                throw new SectionFileException(
                    _file, place, node.PathOf(key), "This key is there twice.", "Keep one of the two.");
            }

            _reader.Read();
            members.Add(new Member(key, place, Value(node.PathOf(key))));
        }

        return node with { Members = members.ToImmutable() };
    }

    private Node List(string path)
    {
        var node = Leaf(path, NodeKind.List);
        var items = ImmutableArray.CreateBuilder<Node>();
        while (_reader.Read() && _reader.TokenType != JsonTokenType.EndArray)
        {
            items.Add(Value(string.Create(CultureInfo.InvariantCulture, $"{path}[{items.Count}]")));
        }

        return node with { Items = items.ToImmutable() };
    }
}
