using System.Collections.Immutable;

namespace ScanSim.Recordings.Tables;

/// <summary>Texts that files hold for an enumeration, in the order of its values from 0.</summary>
internal sealed class EnumText<TEnum>(ImmutableArray<string> texts)
    where TEnum : struct, Enum
{
    private readonly ImmutableArray<TEnum> values = [.. Enum.GetValues<TEnum>()];

    public ImmutableArray<string> Texts { get; } = texts;

    public string this[int value] =>
        (uint)value < (uint)Texts.Length
            ? Texts[value]
            : throw new InvalidOperationException($"{value} is no {typeof(TEnum).Name}");

    public TEnum Parse(string text)
    {
        var place = Texts.IndexOf(text, StringComparer.Ordinal);
        return place >= 0
            ? values[place]
            : throw new FormatException($"\"{text}\" is none of {string.Join(", ", Texts.Select(known => $"\"{known}\""))}");
    }
}
