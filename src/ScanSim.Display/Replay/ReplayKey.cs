using ScanSim.Display.Windowing;

namespace ScanSim.Display.Replay;

/// <summary>A key of the replay: what it is called, what it does in words, and the doing.</summary>
public sealed class ReplayKey
{
    private readonly Func<ReplayState, ReplayWorld, ReplayState> act;

    private ReplayKey(KeyGroup group, string keys, string does, Func<ReplayState, ReplayWorld, ReplayState> act)
    {
        Group = group;
        Keys = keys;
        Does = does;
        this.act = act;
    }

    public KeyGroup Group { get; }

    /// <summary>As the help page writes it: "Shift+Right".</summary>
    public string Keys { get; }

    public string Does { get; }

    internal WindowKey Key { get; private init; }

    internal char Character { get; private init; }

    internal bool Shift { get; private init; }

    internal static ReplayKey Of(KeyGroup group, WindowKey key, bool shift, string name, string does, Func<ReplayState, ReplayWorld, ReplayState> act) =>
        new(group, shift ? "Shift+" + name : name, does, act) { Key = key, Shift = shift };

    internal static ReplayKey Of(KeyGroup group, char character, string does, Func<ReplayState, ReplayWorld, ReplayState> act) =>
        new(group, char.IsUpper(character) ? "Shift+" + character : character.ToString().ToUpperInvariant(), does, act) { Key = WindowKey.Character, Character = character };

    /// <summary>Characters are known by what they type, whatever shift that needs on the keyboard at hand; other keys by shift too.</summary>
    internal bool Is(in WindowEvent e) =>
        e is { Kind: WindowEventKind.KeyDown, Control: false, Alt: false } && e.Key == Key
        && (Key == WindowKey.Character ? e.Character == Character : e.Shift == Shift);

    internal ReplayState Act(ReplayState state, ReplayWorld world) => act(state, world);
}
