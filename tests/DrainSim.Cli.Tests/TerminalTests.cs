using DrainSim.Cli.Terminal;
using DrainSim.Reports.Measures;

namespace DrainSim.Cli.Tests;

/// <summary>Texts set for a terminal.</summary>
public sealed class TerminalTests
{
    [Theory]
    [InlineData(0.3)]
    [InlineData(7)]
    [InlineData(59)]
    [InlineData(60)]
    [InlineData(1130)]
    [InlineData(3600)]
    [InlineData(90_001)]
    [InlineData(30 * 86400.0)]
    [InlineData(3e9)]
    public void Levels_are_told_from_the_start_to_the_end_in_five_to_eleven_even_steps(double end)
    {
        double[] times = [.. LevelTable.Times(end)];
        Assert.Equal((0, end), (times[0], times[^1]));
        Assert.InRange(times.Length, 5, 11);
        double step = times[1];
        Assert.All(Enumerable.Range(0, times.Length - 1), i => Assert.Equal(i * step, times[i], tolerance: 1e-9 * end));
        Assert.True(times[^1] - times[^2] > 0.09 * step, "the last even step stands on the end");
    }

    [Fact]
    public void Where_the_job_has_a_clock_the_crew_dips_at_its_even_steps()
    {
        Clock clock = new(new DateTimeOffset(2031, 5, 4, 6, 42, 0, TimeSpan.FromHours(2)));
        double[] times = [.. LevelTable.ClockTimes(3 * 3600 + 600, clock)];
        Assert.Equal((0, 3 * 3600 + 600), (times[0], times[^1]));
        Assert.All(times[1..^1], time => Assert.Equal(0, clock.At(time).Minute % 30 + clock.At(time).Second));
        Assert.Equal("07:00", clock.OfDay(times[1], 7200));
    }

    [Fact]
    public void A_paragraph_keeps_every_word_and_no_line_is_too_long()
    {
        const string Text = "  - Hot (75 °C): it scalds. A hose rated for it, covered skin, face shield; hoses soften.";
        string[] lines = [.. Paragraph.Lines(Text, 30, hang: 4)];
        Assert.All(lines, line => Assert.InRange(line.Length, 1, 30));
        Assert.All(lines.Skip(1), line => Assert.StartsWith("    ", line, StringComparison.Ordinal));
        Assert.Equal(Text.Split(' ', StringSplitOptions.RemoveEmptyEntries), string.Join(' ', lines).Split(' ', StringSplitOptions.RemoveEmptyEntries));
    }

    [Fact]
    public void A_word_longer_than_a_line_stands_alone()
    {
        Assert.Equal(["see", "a/very/long/path/to/a/file", "there"], Paragraph.Lines("see a/very/long/path/to/a/file there", 10, hang: 0));
    }

    [Fact]
    public void A_wrapped_cell_goes_on_under_its_own_column()
    {
        var table = new ColumnTable(
            new Column { Title = "name", Key = "name" },
            new Column { Title = "what it is", Key = "description", IsWrapped = true });
        table.Add("a", string.Join(' ', Enumerable.Repeat("word", 40)));
        using var text = new StringWriter { NewLine = "\n" };
        table.WriteText(text);
        string[] lines = text.ToString().TrimEnd('\n').Split('\n');
        Assert.Equal(4, lines.Length);
        Assert.StartsWith("      word", lines[3], StringComparison.Ordinal);
    }

    [Fact]
    public void A_cell_with_a_comma_is_quoted_in_CSV()
    {
        var table = new ColumnTable(new Column { Title = "name", Key = "name" }, new Column { Key = "note" });
        table.Add("bend, long", "say \"K\"");
        using var text = new StringWriter();
        table.WriteCsv(text);
        Assert.Equal("name,note\n\"bend, long\",\"say \"\"K\"\"\"\n", text.ToString());
    }
}
