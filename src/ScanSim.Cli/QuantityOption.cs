using System.CommandLine;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>Options whose value is a number with its unit, read as in scenario files.</summary>
internal static class QuantityOption
{
    /// <summary>The option's value in SI units, or null when it is not given.</summary>
    public static Option<double?> Create(string name, Dimension dimension, string helpName, string description, double leastSi = double.NegativeInfinity, bool above = false) =>
        new(name)
        {
            Description = description,
            HelpName = helpName,
            CustomParser = result =>
            {
                var text = result.Tokens[0].Value;
                if (!QuantityText.TryParse(text, dimension, out var si, out var problem))
                {
                    result.AddError($"{name}: {problem}");
                    return null;
                }

                if (si < leastSi || (above && si <= leastSi))
                {
                    result.AddError($"{name}: read \"{text}\", expected a value {(above ? "above" : "of at least")} {leastSi}");
                    return null;
                }

                return si;
            },
        };
}
