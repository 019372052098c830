using System.Collections.Immutable;
using System.Text;
using System.Text.Json;

namespace ScanSim.Scenarios.Json;

/// <summary>Reads JSON (comments and trailing commas allowed) into a tree with positions.</summary>
internal static class JsonTree
{
    private const int DeepestNesting = 64;

    private static readonly JsonReaderOptions Options = new()
    {
        CommentHandling = JsonCommentHandling.Skip,
        AllowTrailingCommas = true,
        MaxDepth = DeepestNesting,
    };

    /// <summary>The one value that the text holds.</summary>
    /// <exception cref="JsonTextException">The text is not JSON.</exception>
    public static JsonValue Read(ReadOnlySpan<byte> utf8)
    {
        var reader = new Utf8JsonReader(utf8, Options);
        var cursor = new TextCursor();
        try
        {
            reader.Read();
            var root = Value(ref reader, ref cursor, utf8);
            reader.Read();
            return root;
        }
        catch (JsonException fault)
        {
            throw At(fault, utf8);
        }
        catch (InvalidOperationException)
        {
            // The reader's own way to refuse half a surrogate pair in an escape.
            cursor.MoveTo(utf8, (int)reader.TokenStartIndex);
            throw new JsonTextException(cursor.Line, cursor.Column, "a text with half a surrogate pair (\\ud800 to \\udfff)");
        }
    }

    private static JsonValue Value(ref Utf8JsonReader reader, ref TextCursor cursor, ReadOnlySpan<byte> utf8)
    {
        cursor.MoveTo(utf8, (int)reader.TokenStartIndex);
        var (line, column) = (cursor.Line, cursor.Column);
        return reader.TokenType switch
        {
            JsonTokenType.StartObject => new JsonValue(JsonKind.Block, line, column) { Members = Members(ref reader, ref cursor, utf8) },
            JsonTokenType.StartArray => new JsonValue(JsonKind.List, line, column) { Items = Items(ref reader, ref cursor, utf8) },
            JsonTokenType.String => new JsonValue(JsonKind.Text, line, column) { Text = reader.GetString()! },
            JsonTokenType.Number => new JsonValue(JsonKind.Number, line, column) { Text = Encoding.ASCII.GetString(reader.ValueSpan) },
            JsonTokenType.True => new JsonValue(JsonKind.True, line, column),
            JsonTokenType.False => new JsonValue(JsonKind.False, line, column),
            _ => new JsonValue(JsonKind.Null, line, column),
        };
    }

    private static ImmutableArray<JsonMember> Members(ref Utf8JsonReader reader, ref TextCursor cursor, ReadOnlySpan<byte> utf8)
    {
        var members = ImmutableArray.CreateBuilder<JsonMember>();
        while (reader.Read() && reader.TokenType != JsonTokenType.EndObject)
        {
            cursor.MoveTo(utf8, (int)reader.TokenStartIndex);
            var (line, column, name) = (cursor.Line, cursor.Column, reader.GetString()!);
            reader.Read();
            members.Add(new JsonMember(name, line, column, Value(ref reader, ref cursor, utf8)));
        }

        return members.ToImmutable();
    }

    private static ImmutableArray<JsonValue> Items(ref Utf8JsonReader reader, ref TextCursor cursor, ReadOnlySpan<byte> utf8)
    {
        var items = ImmutableArray.CreateBuilder<JsonValue>();
        while (reader.Read() && reader.TokenType != JsonTokenType.EndArray)
        {
            items.Add(Value(ref reader, ref cursor, utf8));
        }

        return items.ToImmutable();
    }

    private static JsonTextException At(JsonException fault, ReadOnlySpan<byte> utf8)
    {
        var cursor = new TextCursor();
        cursor.MoveToLine(utf8, fault.LineNumber ?? 0, fault.BytePositionInLine ?? 0);
        var end = fault.Message.IndexOf(" LineNumber:", StringComparison.Ordinal);
        return new JsonTextException(cursor.Line, cursor.Column, "text that is not JSON: " + (end < 0 ? fault.Message : fault.Message[..end]));
    }
}
