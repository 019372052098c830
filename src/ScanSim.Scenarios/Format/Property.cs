namespace ScanSim.Scenarios.Format;

/// <summary>A property of a block.</summary>
/// <param name="Name">As it stands in the file.</param>
/// <param name="Shape">What its value is.</param>
/// <param name="Description">What it means; one or two sentences.</param>
internal sealed record Property(string Name, Shape Shape, string Description)
{
    /// <summary>Must be there always. What a group rules is not required by itself.</summary>
    public bool Required { get; init; }

    /// <summary>JSON text that stands for the property when it is left out; null: nothing does.</summary>
    public string? Default { get; init; }

    /// <summary>Said in place of <see cref="Default"/> where what holds depends on other properties.</summary>
    public string? DefaultWords { get; init; }

    /// <summary>JSON text; blocks have none.</summary>
    public string? Example { get; init; }

    public static Property Needed(string name, Shape shape, string description, string? example = null) =>
        new(name, shape, description) { Required = true, Example = example };

    public static Property Optional(string name, Shape shape, string description, string? example = null, string? byDefault = null, string? byDefaultWords = null) =>
        new(name, shape, description) { Example = example, Default = byDefault, DefaultWords = byDefaultWords };

    /// <summary>Whether it must be there is ruled by a group of the block.</summary>
    public static Property InGroup(string name, Shape shape, string description, string? example = null, string? byDefault = null) =>
        new(name, shape, description) { Example = example, Default = byDefault };
}
