using System.CommandLine;

namespace ScanSim.Cli;

/// <summary>Options with a few fixed words as values.</summary>
internal static class ChoiceOption
{
    /// <summary>The first choice is the default: it must be the value 0, which an option that is not given has.</summary>
    public static Option<T> Create<T>(string name, string description, params (string Word, T Value)[] choices)
        where T : struct, Enum
    {
        var words = string.Join('|', choices.Select(c => c.Word));
        return new Option<T>(name)
        {
            Description = $"{description} [default: {choices[0].Word}]",
            HelpName = words,
            CustomParser = result =>
            {
                var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : choices[0].Word;
                foreach (var (word, value) in choices)
                {
                    if (string.Equals(word, text, StringComparison.Ordinal))
                    {
                        return value;
                    }
                }

                result.AddError($"{name}: read \"{text}\", expected one of {string.Join(", ", choices.Select(c => c.Word))}");
                return choices[0].Value;
            },
        };
    }
}
