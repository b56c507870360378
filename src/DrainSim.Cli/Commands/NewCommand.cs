using System.CommandLine;
using System.Text;
using DrainSim.Cli.Terminal;
using DrainSim.Reports.Files;

namespace DrainSim.Cli.Commands;

/// <summary>Writes a commented scenario to start from.</summary>
internal sealed class NewCommand : ExplainedCommand
{
    private readonly Argument<string?> name = new("name")
    {
        Description = "Name of the scenario; NAME.yaml is written into the current folder.",
        Arity = ArgumentArity.ZeroOrOne,
    };

    private readonly Option<string> template = new("--from")
    {
        Description = "Template to start from; --list tells what each is.",
        HelpName = "template",
        DefaultValueFactory = _ => ScenarioTemplate.Usual,
    };

    private readonly Option<bool> list = new("--list") { Description = "Shows the templates." };

    public NewCommand() : base("new", "Writes a commented scenario to start from.")
    {
        Arguments.Add(name);
        Options.Add(template);
        Options.Add(list);
        SetAction(Write);
    }

    /// <inheritdoc/>
    public override IReadOnlyList<Example> Examples =>
    [
        new("drainsim new --list", "Shows what there is to start from."),
        new("drainsim new rinse --from over-the-rim", "Writes rinse.yaml; an older one is not overwritten."),
    ];

    private int Write(ParseResult parsed)
    {
        TextWriter output = parsed.InvocationConfiguration.Output;
        TextWriter error = parsed.InvocationConfiguration.Error;
        if (parsed.GetValue(list))
        {
            ShowTemplates(output);
            return ExitCode.Ran;
        }
        if (parsed.GetValue(name) is not { Length: > 0 } given)
            return Refuse(error, "new: a name is needed, as in 'drainsim new rinse'; 'drainsim new --list' shows the templates.");
        string stem = given.EndsWith(".yaml", StringComparison.OrdinalIgnoreCase) ? given[..^".yaml".Length] : given;
        if (stem.Length == 0 || stem.Any(letter => !char.IsAsciiLetterOrDigit(letter) && letter is not ('-' or '_' or '.')) || stem[0] is '.' or '-')
            return Refuse(error, $"new: '{given}' is no name; letters, digits, '-', '_' and '.' make one, without a folder.");
        if (ScenarioTemplate.Find(parsed.GetRequiredValue(template)) is not { } from)
        {
            return Refuse(error, $"new: there is no template '{parsed.GetValue(template)}'; there are "
                + string.Join(", ", ScenarioTemplate.All.Select(known => known.Name)) + ".");
        }
        return WriteFiles(from.Files(stem), stem, output, error);
    }

    private static int WriteFiles(
        IReadOnlyList<(string Path, string Text)> files, string stem, TextWriter output, TextWriter error)
    {
        if (files.Select(file => file.Path).FirstOrDefault(path => File.Exists(path) || Directory.Exists(path)) is { } standing)
            return Refuse(error, $"new: '{standing}' is already there and is left as it is; choose another name.");
        try
        {
            using var folder = new OutputFolder(".");
            foreach ((string path, string text) in files)
                folder.Write(path, stream => stream.Write(Encoding.UTF8.GetBytes(text)));
            folder.Complete();
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            error.WriteLine($"drainsim new: {files[0].Path} cannot be written: {fault.Message}");
            return ExitCode.NotWritten;
        }
        foreach ((string path, _) in files)
            output.WriteLine($"Wrote {path}");
        output.WriteLine($"Fill in your own numbers, then: drainsim run {stem}.yaml");
        return ExitCode.Ran;
    }

    private static void ShowTemplates(TextWriter output)
    {
        var table = new ColumnTable(
            new Column { Title = "template" },
            new Column { Title = "what it is", IsWrapped = true });
        foreach (ScenarioTemplate known in ScenarioTemplate.All)
            table.Add(known.Name, known.Summary);
        table.WriteText(output);
    }

    private static int Refuse(TextWriter error, string fault)
    {
        error.WriteLine("drainsim " + fault);
        return ExitCode.Refused;
    }
}
