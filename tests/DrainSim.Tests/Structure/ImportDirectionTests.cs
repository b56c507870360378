using System.Reflection;
using System.Text.RegularExpressions;
using System.Xml.Linq;

namespace DrainSim.Tests.Structure;

/// <summary>Imports run one way: Cli → Reports, Scenarios → DrainSim, and in the library towards what stands below.</summary>
public sealed partial class ImportDirectionTests
{
    private static readonly string Root = FindRoot();

    [Theory]
    [InlineData("DrainSim", "")]
    [InlineData("DrainSim.Scenarios", "DrainSim")]
    [InlineData("DrainSim.Reports", "DrainSim")]
    [InlineData("DrainSim.Cli", "DrainSim,DrainSim.Reports,DrainSim.Scenarios")]
    public void A_project_refers_only_to_those_below_it(string project, string allowed)
    {
        XDocument file = XDocument.Load(Path.Combine(Root, "src", project, $"{project}.csproj"));
        string[] references = [.. file.Descendants("ProjectReference")
            .Select(r => Path.GetFileNameWithoutExtension(r.Attribute("Include")!.Value.Replace('\\', '/')))];
        Assert.Empty(references.Except(allowed.Split(',')));
    }

    [Theory]
    [InlineData("Integration", "")]
    [InlineData("Vessels", "")]
    [InlineData("Gas", "")]
    [InlineData("Liquids", "")]
    [InlineData("Lines", "Liquids")]
    [InlineData("Draining", "Integration,Vessels,Gas,Liquids,Lines")]
    public void A_folder_of_the_library_knows_only_those_below_it(string folder, string allowed)
    {
        string[] folders = [.. Directory.GetDirectories(Path.Combine(Root, "src", "DrainSim")).Select(path => Path.GetFileName(path)!)];
        string[] forbidden = [.. folders.Except([folder, .. allowed.Split(',')])];
        foreach (string path in Directory.EnumerateFiles(Path.Combine(Root, "src", "DrainSim", folder), "*.cs", SearchOption.AllDirectories))
        {
            string code = Comment().Replace(File.ReadAllText(path), "");
            foreach (string other in forbidden)
                Assert.False(Names(code, other), $"{Path.GetRelativePath(Root, path)} knows {other}");
        }
    }

    [Theory]
    [InlineData("DrainSim")]
    [InlineData("DrainSim.Scenarios")]
    [InlineData("DrainSim.Reports")]
    public void Only_the_program_touches_the_console(string project)
    {
        foreach (string path in Sources(project))
            Assert.False(ConsoleUse().IsMatch(Comment().Replace(File.ReadAllText(path), "")), Path.GetRelativePath(Root, path));
    }

    /// <summary>Whether code names a namespace of the library, in a using or in front of a type.</summary>
    private static bool Names(string code, string folder) =>
        Regex.IsMatch(code, $@"(?<![\w.])(global::)?DrainSim\.{folder}\b|(?<![\w.]){folder}\.[A-Z]\w+\.?\w*(?=[\s(.;,>)])");

    private static IEnumerable<string> Sources(string project) =>
        Directory.EnumerateFiles(Path.Combine(Root, "src", project), "*.cs", SearchOption.AllDirectories)
            .Where(path => !path.Split(Path.DirectorySeparatorChar).Any(part => part is "obj" or "bin"));

    private static string FindRoot()
    {
        string? folder = Path.GetDirectoryName(Assembly.GetExecutingAssembly().Location);
        while (folder is not null && !File.Exists(Path.Combine(folder, "DrainSim.sln")))
            folder = Path.GetDirectoryName(folder);
        return folder ?? throw new InvalidOperationException("the tests do not stand under DrainSim.sln");
    }

    [GeneratedRegex(@"//[^\n]*")]
    private static partial Regex Comment();

    [GeneratedRegex(@"(?<![\w.])(System\.)?Console\.")]
    private static partial Regex ConsoleUse();
}
