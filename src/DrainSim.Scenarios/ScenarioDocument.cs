using System.Text;
using DrainSim.Scenarios.Reading;
using DrainSim.Scenarios.Studies;
using DrainSim.Scenarios.Yaml;

namespace DrainSim.Scenarios;

/// <summary>A scenario's tree before it is read, in which single values can be set by their dotted path.</summary>
/// <remarks>
/// A dotted path is the keys joined by points; an item of a list is called by its <c>name</c>, or by its
/// place from 1 where it has none: <c>line.path.outer_leg.length</c>, <c>line.path[2].count</c>. A document
/// never changes; what is wrong with it is told by <see cref="Read"/>.
/// </remarks>
public sealed class ScenarioDocument
{
    /// <summary>Largest file that is read, bytes.</summary>
    public const int LargestFile = 1 << 20;

    /// <summary>What is said of a path that leads nowhere.</summary>
    internal const string NoSuchParameter = "no such parameter";

    /// <summary>What is said of a key that nobody asks for.</summary>
    internal const string NoSuchKey = "no such key";

    private readonly SourceText source;
    private readonly IReadOnlyList<Problem> problems;
    private readonly BlockNode? root;

    private ScenarioDocument(string fileName, string folder, SourceText source, BlockNode? root, IReadOnlyList<Problem> problems)
    {
        FileName = fileName;
        Folder = folder;
        this.source = source;
        this.root = root;
        this.problems = problems;
    }

    /// <summary>The file as the user named it.</summary>
    public string FileName { get; }

    /// <summary>Folder in which a strapping table is looked for.</summary>
    public string Folder { get; }

    /// <summary>The file's name without folder and ending.</summary>
    public string Name => Path.GetFileNameWithoutExtension(FileName);

    /// <summary>Dotted paths of all single values in the file, in file order.</summary>
    public IReadOnlyList<string> Parameters => root is null ? [] : ParameterPath.All(root);

    /// <summary>Loads a file; one that cannot be opened or understood gives its problems when read.</summary>
    /// <param name="path">the file as the user named it</param>
    public static ScenarioDocument Load(string path)
    {
        ArgumentException.ThrowIfNullOrEmpty(path);
        string folder = Path.GetDirectoryName(Path.GetFullPath(path)) ?? ".";
        return WholeText.TryRead(path, LargestFile, out string text, out string fault)
            ? FromText(text, path, folder)
            : new ScenarioDocument(path, folder, new SourceText(""), null, [new Problem(0, 0, "", fault, "")]);
    }

    /// <summary>Makes a document of a text.</summary>
    /// <param name="text">the whole scenario</param>
    /// <param name="fileName">name of the file for messages</param>
    /// <param name="folder">folder in which a strapping table is looked for</param>
    public static ScenarioDocument FromText(string text, string fileName, string folder)
    {
        ArgumentNullException.ThrowIfNull(text);
        string content = text.TrimStart('\uFEFF');
        SourceText source = new(content);
        List<Problem> problems = [];
        BlockNode? root = null;
        if (Encoding.UTF8.GetByteCount(content) > LargestFile)
            problems.Add(new Problem(0, 0, "", WholeText.TooLarge(LargestFile), ""));
        else if (source.FindControlCharacter() is { } at)
            problems.Add(new Problem(at.Line, at.Column, "", "a control character stands here", "A scenario is plain text"));
        else
            root = YamlTree.Load(content, problems);
        return new ScenarioDocument(fileName, folder, source, root, problems);
    }

    /// <summary>The document with one value set; a path that leads nowhere is a problem of the new document.</summary>
    /// <param name="path">dotted path of the parameter</param>
    /// <param name="text">the value as it would be written in the file, with its unit</param>
    public ScenarioDocument With(string path, string text)
    {
        ArgumentNullException.ThrowIfNull(path);
        ArgumentNullException.ThrowIfNull(text);
        if (root is null)
            return this;
        if (ParameterPath.Set(root, path, text) is { } changed)
            return new ScenarioDocument(FileName, Folder, source, changed, problems);
        string help = Nearest.Find(path, Parameters) is { } near ? $"did you mean {Quote.Of(near)}?" : "'drainsim check' lists them";
        Problem problem = new(0, 0, Quote.Plain(path), NoSuchParameter, help);
        return new ScenarioDocument(FileName, Folder, source, root, [.. problems, problem]);
    }

    /// <summary>What stands at a dotted path; null when nothing does.</summary>
    internal Node? Find(string path) => root is null ? null : ParameterPath.Find(root, path);

    /// <summary>The path as the reading calls it.</summary>
    internal string WholePath(string path) => root is null ? path : ParameterPath.Whole(root, path);

    /// <summary>The block of a study; what is wrong with its form is a problem.</summary>
    internal StudyBlock StudyBlock(string key, List<Problem> found)
    {
        if (root is null)
            return new StudyBlock();
        Findings findings = new(source);
        StudyBlock block = Scenarios.Studies.StudyBlock.Read(new BlockReader(root, "", root.At, findings), key);
        found.AddRange(findings.Problems);
        return block;
    }

    /// <summary>The block of a study as its own reader takes it; what is wrong with its form is a problem.</summary>
    /// <param name="read">reads the block from the whole file</param>
    /// <param name="none">what stands for a file that could not be read at all</param>
    /// <param name="found">takes the problems</param>
    internal T StudyBlock<T>(Func<BlockReader, T> read, T none, List<Problem> found)
    {
        if (root is null)
            return none;
        Findings findings = new(source);
        T block = read(new BlockReader(root, "", root.At, findings));
        found.AddRange(findings.Problems);
        return block;
    }

    /// <summary>The document without the blocks of its studies, which its job does not need.</summary>
    internal ScenarioDocument WithoutStudies() => root is null || !root.Entries.Any(entry => ParameterPath.IsStudy(entry.Key))
        ? this
        : new ScenarioDocument(FileName, Folder, source,
            root with { Entries = [.. root.Entries.Where(entry => !ParameterPath.IsStudy(entry.Key))] }, problems);

    /// <summary>Reads the document into a job, or into everything that is wrong with it.</summary>
    public ScenarioReading Read()
    {
        Findings findings = new(source);
        foreach (Problem problem in problems)
            findings.Add(new Position(problem.Line, problem.Column), source.Show(problem));
        Scenario? scenario = root is null ? null : JobReader.Read(root, Name, Folder, findings);
        return new ScenarioReading
        {
            FileName = FileName,
            Scenario = findings.IsRefused ? null : scenario,
            Problems = findings.Problems,
            Untold = findings.Untold,
            Warnings = findings.Warnings,
            Understood = findings.Understood,
        };
    }
}
