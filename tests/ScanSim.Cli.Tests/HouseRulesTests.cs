using System.Reflection;
using System.Runtime.CompilerServices;
using System.Text.RegularExpressions;
using ArchUnitNET.Domain;
using ArchUnitNET.Loader;
using ArchUnitNET.xUnitV3;
using ScanSim.Testing;
using static ArchUnitNET.Fluent.ArchRuleDefinition;
using Assembly = System.Reflection.Assembly;

namespace ScanSim.Cli.Tests;

/// <summary>Rules of the house that no compiler checks: direction of dependencies, no mutable statics, file length.</summary>
public class HouseRulesTests
{
    private static readonly string[] Projects = ["Physics", "Scenarios", "Recordings", "Engine", "Display"];

    private static readonly Dictionary<string, string[]> MayUse = new(StringComparer.Ordinal)
    {
        ["Physics"] = [],
        ["Scenarios"] = ["Physics"],
        ["Recordings"] = [],
        ["Engine"] = ["Physics", "Scenarios", "Recordings"],
        ["Display"] = ["Recordings", "Scenarios", "Physics"],
    };

    private static readonly Assembly[] Assemblies = [.. Projects.Append("Cli").Select(p => Assembly.Load(p == "Cli" ? "scansim" : "ScanSim." + p))];

    public static TheoryData<string, string> Forbidden()
    {
        var data = new TheoryData<string, string>();
        foreach (var from in Projects)
        {
            foreach (var to in Projects.Append("Cli").Where(to => to != from && !MayUse[from].Contains(to)))
            {
                data.Add(from, to);
            }
        }

        return data;
    }

    [Theory]
    [MemberData(nameof(Forbidden))]
    public void Dependencies_point_one_way_only(string from, string to)
    {
        var architecture = new ArchLoader().LoadAssemblies(Assemblies).Build();
        Types().That().ResideInNamespaceMatching($@"^ScanSim\.{from}(\..*)?$")
            .Should().NotDependOnAny(Types().That().ResideInNamespaceMatching($@"^ScanSim\.{to}(\..*)?$"))
            .WithoutRequiringPositiveResults()
            .Check(architecture);
    }

    [Fact]
    public void Projects_reference_only_what_they_may_use()
    {
        foreach (var project in Projects)
        {
            var text = File.ReadAllText(Path.Combine(RepositoryRoot.Find(), "src", $"ScanSim.{project}", $"ScanSim.{project}.csproj"));
            var referenced = Regex.Matches(text, @"ScanSim\.(\w+)\.csproj").Select(m => m.Groups[1].Value);
            Assert.Subset(MayUse[project].ToHashSet(), referenced.ToHashSet());
        }
    }

    [Fact]
    public void No_static_state_can_be_changed()
    {
        var mutable =
            from assembly in Assemblies
            from type in assembly.GetTypes()
            where !type.IsDefined(typeof(CompilerGeneratedAttribute)) && type.FullName!.StartsWith("ScanSim.", StringComparison.Ordinal)
            from field in type.GetFields(BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly)
            where !field.IsInitOnly && !field.IsLiteral && !field.IsDefined(typeof(CompilerGeneratedAttribute))
            select $"{type.FullName}.{field.Name}";
        Assert.Empty(mutable);
    }

    [Fact]
    public void Source_files_stay_below_300_lines()
    {
        var tooLong = SourceFiles().Where(f => File.ReadLines(f).Count() > 300);
        Assert.Empty(tooLong);
    }

    [Fact]
    public void Each_source_file_is_named_after_the_type_in_it()
    {
        var misnamed = SourceFiles()
            .Where(f => !f.EndsWith("Program.cs", StringComparison.Ordinal) && !f.EndsWith("AssemblyInfo.cs", StringComparison.Ordinal))
            .Where(f => !Regex.IsMatch(File.ReadAllText(f), $@"\b(class|struct|record|enum|interface|delegate\s+\S+)\s+(struct\s+)?{Regex.Escape(Path.GetFileName(f).Split('.')[0])}\b"));
        Assert.Empty(misnamed);
    }

    [Fact]
    public void The_README_commands_are_those_that_work()
    {
        var readme = File.ReadAllText(Path.Combine(RepositoryRoot.Find(), "README.md"));
        Assert.Contains("dotnet run --project src/ScanSim.Cli -- run scenarios/harbour.json -o out", readme, StringComparison.Ordinal);
        Assert.Contains("dotnet test ScanSim.sln", readme, StringComparison.Ordinal);
        Assert.Contains("dotnet test ScanSim.sln", File.ReadAllText(Path.Combine(RepositoryRoot.Find(), ".ci", "run")), StringComparison.Ordinal);
    }

    private static IEnumerable<string> SourceFiles() =>
        Directory.EnumerateFiles(Path.Combine(RepositoryRoot.Find(), "src"), "*.cs", SearchOption.AllDirectories)
            .Where(f => !f.Contains("/obj/", StringComparison.Ordinal) && !f.Contains("\\obj\\", StringComparison.Ordinal));
}
