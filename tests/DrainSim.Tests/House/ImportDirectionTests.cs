using System.Reflection;
using System.Text.RegularExpressions;

namespace DrainSim.Tests.House;

/// <summary>Imports run one way: Cli → Reports, Scenarios → the library; inside it nothing points back at Draining.</summary>
public sealed partial class ImportDirectionTests
{
    [Theory]
    [InlineData("DrainSim.Core", new string[0])]
    [InlineData("DrainSim.Scenarios", new[] { "DrainSim.Core" })]
    [InlineData("DrainSim.Reports", new[] { "DrainSim.Core" })]
    public void A_project_refers_to_none_above_or_beside_it(string project, string[] allowed)
    {
        IEnumerable<string> own = Assembly.Load(project).GetReferencedAssemblies()
            .Select(reference => reference.Name!)
            .Where(name => name.StartsWith("DrainSim", StringComparison.Ordinal) || name == "drainsim");
        Assert.Empty(own.Except(allowed));
    }

    [Theory]
    [InlineData("Integration", new string[0])]
    [InlineData("Liquids", new string[0])]
    [InlineData("Vessels", new string[0])]
    [InlineData("Lines", new[] { "Liquids" })]
    [InlineData("Gas", new string[0])]
    public void A_folder_of_the_library_knows_only_what_it_is_made_of(string folder, string[] allowed)
    {
        string path = Path.Combine(Repository.Root, "src", "DrainSim", folder);
        IEnumerable<string> known = Directory.EnumerateFiles(path, "*.cs", SearchOption.AllDirectories)
            .SelectMany(file => Imported().Matches(File.ReadAllText(file)))
            .Select(match => match.Groups[1].Value)
            .Distinct();
        Assert.Empty(known.Except(allowed).Except([folder]));
    }

    [Fact]
    public void The_library_touches_no_console_and_no_clock()
    {
        foreach (string file in Directory.EnumerateFiles(Path.Combine(Repository.Root, "src", "DrainSim"), "*.cs", SearchOption.AllDirectories)
            .Where(file => !file.Contains($"{Path.DirectorySeparatorChar}obj{Path.DirectorySeparatorChar}", StringComparison.Ordinal)))
        {
            Assert.DoesNotMatch(@"\bConsole\.|DateTime(Offset)?\.(Utc)?Now", File.ReadAllText(file));
        }
    }

    [GeneratedRegex(@"^using DrainSim\.(\w+)", RegexOptions.Multiline)]
    private static partial Regex Imported();
}
