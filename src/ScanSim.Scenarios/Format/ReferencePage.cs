using System.Text;

namespace ScanSim.Scenarios.Format;

/// <summary>Writes the reference page of the format in Markdown.</summary>
internal sealed class ReferencePage
{
    private const string Head = """
        # Scenario files

        A scenario file is JSON in UTF-8; comments (`//`, `/* */`) and trailing commas are allowed. **Every value with a dimension is
        a number with its unit in one text**: `"9.41 GHz"`, `"25 kW"`, `"12 kn"`. Units are case-sensitive; blanks between number and
        unit are optional. An unknown or doubled property, a missing one, a bare number where a unit is needed, a unit of another
        dimension, a value out of its range: each is an error with file, line, column and JSON path, all errors of a file at once.
        What this page does not list is not in this version.

        Times are seconds (or another unit of time) from `run.start`. Azimuths, bearings and headings are clockwise from true north.
        Heights are above mean sea level.

        This page is made from the same description that checks the files; do not edit it by hand. After a change of the format,
        the tests of ScanSim.Scenarios rewrite it when the environment variable SCANSIM_REWRITE_REFERENCE is 1.

        """;

    private const string Motion = """

        ## How targets move

        A target exists from `start.at` to the end of its last leg, or to `end` if that is earlier; before and after it is not there.
        Legs run in the site's local plane: a point at surface distance s and bearing a lies at east = s sin a, north = s cos a, with
        the distance and the bearing of the geodesic from the site. Points in latitude and longitude are put there the same way.

        * Every leg begins where, when and with the heading at which the one before it ended.
        * `to` without `turnRate` turns on the spot. With it the target flies an arc, to the side on which the point lies, until the
          point is straight ahead; a point inside that turning circle is an error. Without a heading (first leg, none in `start`)
          there is nothing to turn from. A height at the point is reached evenly over arc and straight.
        * `turn` keeps the speed; `by` more than 360 deg is a holding pattern.
        * `speed` in a leg holds at once and from then on; `speedTo` changes it with constant acceleration.
        * `climbTo` flies on along the heading at the present speed; with speed 0 it goes straight up or down.
        * `wait` stays on the spot with speed 0; the next leg has the old speed again unless it gives its own.

        """;

    private const string Rules = """

        ## Rules between properties

        * `pulseWidth` is shorter than the time between two pulses of every PRF; `compressedWidth` is not above `pulseWidth`.
        * `instrumentedRange` is not beyond the unambiguous range c / (2 PRF) of any PRF.
        * A sector has two different azimuths and is at least one azimuth beamwidth wide; blanked sectors leave something to see.
        * `pulsesPerDwell` fits into one scan; `"beamwidth"` gives 1 to 10000 pulses: azimuth beamwidth * PRF / scan rate.
        * `duration` has less than 2^32 dwells.
        * The cosecant-squared part begins (tilt + beamwidth / 2) above the horizontal and below `upTo`.
        * Target ids differ, and so do their 32-bit FNV-1a hashes, under which the targets draw their random numbers.
        * Tracks stay within 2000 km east, west, north and south of the site and within 720 h of time 0.

        """;

    private readonly StringBuilder text = new();
    private readonly HashSet<string> written = new(StringComparer.Ordinal);

    public static string Write(Shape.OfBlock root)
    {
        var page = new ReferencePage();
        page.text.Append(Head);
        page.Block(root);
        page.text.Append(Motion).Append(Rules);
        page.UnitTable();
        return page.text.ToString();
    }

    private void Block(Shape.OfBlock block)
    {
        if (!written.Add(block.Name))
        {
            return;
        }

        text.Append("\n## ").Append(block.Name).Append("\n\n").Append(block.Description).Append("\n\n");
        text.Append("| property | meaning | value | default | example |\n|---|---|---|---|---|\n");
        foreach (var property in block.Properties)
        {
            Row(block, property);
        }

        foreach (var group in block.Groups)
        {
            text.Append('\n').Append(Rule(group)).Append('\n');
        }

        foreach (var inner in block.Properties.Select(property => Inner(property.Shape)).OfType<Shape.OfBlock>())
        {
            Block(inner);
        }
    }

    private void Row(Shape.OfBlock block, Property property)
    {
        var ruled = block.Groups.Any(group => group.AllNames.Contains(property.Name, StringComparer.Ordinal));
        var byDefault = property.Default is not null ? Code(property.Default) : property.DefaultWords ?? (property.Required ? "required" : ruled ? "see below" : "none");
        text.Append("| ").Append(Code(property.Name))
            .Append(" | ").Append(Cell(property.Description))
            .Append(" | ").Append(Value(property.Shape))
            .Append(" | ").Append(byDefault)
            .Append(" | ").Append(property.Example is null ? "" : Code(property.Example)).Append(" |\n");
    }

    private static string Value(Shape shape) => shape switch
    {
        Shape.OfBlock block => Link(block),
        Shape.OfList { Item: Shape.OfBlock block } list => $"a list of {list.Fewest} to {list.Most}: {Link(block)}",
        _ => Cell(ShapeWords.Of(shape)),
    };

    private static string Rule(PropertyGroup group)
    {
        if (group.SwitchedBy is null)
        {
            return $"Exactly one of: {string.Join("; or ", group.Variants.Select(Variant))}.";
        }

        var cases = group.Variants.Select(variant => $"{string.Join(", ", variant.Values.Select(Code))} with {Variant(variant)}");
        return $"By {Code(group.SwitchedBy)}: {string.Join("; ", cases)}.";
    }

    private static string Variant(PropertyVariant variant)
    {
        var optional = variant.Optional.Length == 0 ? "" : $" (and, if wanted, {string.Join(", ", variant.Optional.Select(Code))})";
        return string.Join(" and ", variant.Required.Select(Code)) + optional;
    }

    private void UnitTable()
    {
        text.Append("\n## Units\n\n| dimension | unit | is |\n|---|---|---|\n");
        foreach (var dimension in Enum.GetValues<Dimension>())
        {
            foreach (var unit in Units.Of(dimension))
            {
                text.Append("| ").Append(Units.Words(dimension)).Append(" | ").Append(Code(unit.Symbol)).Append(" | ").Append(unit.Definition).Append(" |\n");
            }
        }
    }

    private static Shape.OfBlock? Inner(Shape shape) => shape switch
    {
        Shape.OfBlock block => block,
        Shape.OfList list => Inner(list.Item),
        _ => null,
    };

    private static string Link(Shape.OfBlock block) => $"[{block.Name}](#{AnchorOf(block.Name)})";

#pragma warning disable CA1308 // Anchors are lower case.
    private static string AnchorOf(string name) => name.ToLowerInvariant();
#pragma warning restore CA1308

    private static string Code(string content) => $"`{content}`";

    private static string Cell(string content) => content.Replace("|", "\\|", StringComparison.Ordinal);
}
