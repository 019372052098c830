using System.Collections.Immutable;
using System.Text;

namespace ScanSim.Scenarios.Json;

/// <summary>A value of the file with the place where it begins. Doubled members are kept, so that they can be reported.</summary>
internal sealed record JsonValue(JsonKind Kind, int Line, int Column)
{
    private const int LongestShown = 60;

    /// <summary>The text's content, or the number as it was written.</summary>
    public string Text { get; init; } = "";

    public ImmutableArray<JsonMember> Members { get; init; } = [];

    public ImmutableArray<JsonValue> Items { get; init; } = [];

    /// <summary>As it is quoted in a message: short, on one line.</summary>
    public string Shown() => Kind switch
    {
        JsonKind.Null => "null",
        JsonKind.False => "false",
        JsonKind.True => "true",
        JsonKind.Number => Short(Text),
        JsonKind.Text => $"\"{Short(Text)}\"",
        JsonKind.List => Items.Length == 0 ? "an empty list" : "a list",
        _ => Members.Length == 0 ? "an empty block" : "a block { ... }",
    };

    internal static string Short(string text)
    {
        var shown = new StringBuilder();
        foreach (var c in text.Length > LongestShown ? text[..LongestShown] : text)
        {
            shown.Append(char.IsControl(c) || char.IsSurrogate(c) || c is '\u2028' or '\u2029' ? '\uFFFD' : c);
        }

        return text.Length > LongestShown ? shown.Append("...").ToString() : shown.ToString();
    }
}
