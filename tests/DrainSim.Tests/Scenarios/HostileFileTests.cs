using System.Text;
using CsCheck;
using DrainSim.Scenarios;

namespace DrainSim.Tests.Scenarios;

public sealed class HostileFileTests
{
    public static TheoryData<string> Files => [.. Directory.GetFiles(ApprovedText.Beside("Hostile"), "*.yaml")
        .Select(Path.GetFileNameWithoutExtension).OfType<string>().Order(StringComparer.Ordinal)];

    public static TheoryData<string> Made => [.. Texts.Keys];

    private static Dictionary<string, Func<string>> Texts { get; } = new()
    {
        ["made-brackets"] = () => "title: " + new string('[', 900_000),
        ["made-braces"] = () => string.Concat(Enumerable.Repeat("{a: ", 200_000)),
        ["made-hyphens"] = () => string.Concat(Enumerable.Repeat("- ", 400_000)),
        ["made-too-large"] = () => "notes: " + new string('x', 1 << 20),
        ["made-unknown-keys"] = () => string.Concat(Enumerable.Range(0, 80_000).Select(i => $"k{i}: 1\n")),
        ["made-duplicates"] = () => string.Concat(Enumerable.Repeat("tank: 1\n", 100_000)),
        ["made-long-value"] = () => "title: x\nliquid: {name: " + new string('w', 500_000) + "}\n",
        ["made-long-line"] = () => "title: " + new string(' ', 300_000) + "{a\n",
        ["made-bom-twice"] = () => "\uFEFF\uFEFFtitle: [",
        ["made-nul"] = () => "title: \0\nliquid: 1",
        ["made-escapes"] = () => "\"\\e[31mtank\\x07\": \"\\e[2J\"",
        ["made-bad-escape"] = () => "title: \"\\UFFFFFFFF\"",
        ["made-empty"] = () => "",
        ["made-comment-only"] = () => "# nothing\n",
        ["made-fuzz-colon"] = () => " : >",
        ["made-fuzz-dots"] = () => "...\n? [",
        ["made-fuzz-tag"] = () => "!!!!A!0+!!$",
    };

    [Theory]
    [MemberData(nameof(Files))]
    public void A_hostile_file_is_refused_in_the_approved_words(string name)
    {
        string file = ApprovedText.Beside(Path.Combine("Hostile", name + ".yaml"));
        ScenarioReading reading = ScenarioReader.ReadText(File.ReadAllText(file), name + ".yaml", Path.GetDirectoryName(file)!);
        ApprovedText.Matches(name, ProblemReport.Refusal(reading) + ProblemReport.Entries(reading.FileName, reading.Warnings));
    }

    [Theory]
    [MemberData(nameof(Made))]
    public void A_hostile_text_is_refused_in_the_approved_words(string name)
    {
        ScenarioReading reading = ScenarioReader.ReadText(Texts[name](), name + ".yaml", ".");
        // The first problems tell the form; a hundred of a kind tell no more.
        string text = ProblemReport.Refusal(reading with { Problems = [.. reading.Problems.Take(4)], Untold = reading.Untold + Math.Max(0, reading.Problems.Count - 4) });
        ApprovedText.Matches(name, text);
    }

    [Fact]
    public void A_file_that_is_not_there_is_refused() =>
        Assert.Equal("no/such.yaml: there is no such file.\n1 problem. Nothing was run and nothing was written.\n",
            ProblemReport.Refusal(ScenarioReader.Read("no/such.yaml")));

    [Fact]
    public void A_file_that_is_no_text_is_refused()
    {
        string path = Path.GetTempFileName();
        File.WriteAllBytes(path, [0xFF, 0xFE, 0x74, 0x00]);
        Assert.Equal("the file is not UTF-8 text", Assert.Single(ScenarioReader.Read(path).Problems).Fault);
        File.Delete(path);
    }

    [Fact]
    public void A_file_without_an_end_is_refused_at_its_limit()
    {
        if (!File.Exists("/dev/zero"))
            Assert.Skip("the system has no such file");
        Assert.Equal("the file is larger than 1024 KiB", Assert.Single(ScenarioReader.Read("/dev/zero").Problems).Fault);
    }

    [Fact]
    public void A_folder_is_no_scenario() =>
        Assert.Equal("this is a folder, not a file", Assert.Single(ScenarioReader.Read(Path.GetTempPath()).Problems).Fault);

    [Fact]
    public void A_byte_order_mark_changes_nothing() =>
        Assert.False(ScenarioReader.ReadText("\uFEFF" + GoodScenario.Text, "a.yaml", ".").IsRefused);

    [Fact]
    public void No_damage_to_a_scenario_ends_in_an_exception()
    {
        string good = GoodScenario.Text;
        Gen<string> piece = Gen.String[Gen.Char["{}[]:-,&*!|>'\"%@`#?\t\n\0 <~0e.\u0085\u2028\uFEFF"], 0, 6];
        Gen.Select(Gen.Int[0, good.Length - 1], Gen.Int[0, 20], piece)
            .Sample((at, cut, put) =>
            {
                StringBuilder text = new(good);
                text.Remove(at, Math.Min(cut, good.Length - at)).Insert(at, put);
                ScenarioReading reading = ScenarioReader.ReadText(text.ToString(), "damaged.yaml", ".");
                return reading.IsRefused == (reading.Problems.Count > 0);
            }, iter: 3_000);
    }

    [Fact]
    public void No_short_text_ends_in_an_exception() =>
        Gen.String[Gen.Char["ab{}[]:-,&*!|>'\"%@`#?\t\n\0 <~0\u0085\uFEFF$+"], 0, 14]
            .Sample(text => ScenarioReader.ReadText(text, "noise.yaml", ".").IsRefused, iter: 20_000);
}
