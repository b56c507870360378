using CsvHelper;
using DrainSim.Scenarios.Units;
using DrainSim.Studies.Forecasting;

namespace DrainSim.Scenarios.Studies;

/// <summary>Reads a CSV file of levels read during a job; everything wrong with it is told with file, line and column.</summary>
internal sealed class ReadingsReader
{
    private const int MostProblems = 20;

    /// <summary>A time of day that lies so much before the one above it is of the next day.</summary>
    private static readonly TimeSpan HalfADay = TimeSpan.FromHours(12);

    /// <summary>The day that stands for an unknown one.</summary>
    private static readonly DateTimeOffset UnknownDay = new(2000, 1, 1, 0, 0, 0, TimeSpan.Zero);

    private static readonly CsvReaderOptions Options = new()
    {
        HasHeader = false,
        CommentPrefix = '#',
        TrimWhitespace = true,
        TrackLineNumbers = true,
        AllowLineBreaksInQuotes = false,
        MalformedData = CsvMalformedDataHandling.Throw,
    };

    private readonly string name;
    private readonly string[] lines;
    private readonly ReadingsFrame frame;
    private readonly List<Problem> problems;
    private readonly int told;
    private readonly List<LevelReading> readings = [];
    private ReadingsColumns columns = new() { Count = 0 };
    private DateTimeOffset? start;
    private DateTimeOffset last;
    private bool hasDate;
    private double lastTime = double.NegativeInfinity;

    private ReadingsReader(string name, string text, ReadingsFrame frame, List<Problem> problems)
    {
        (this.name, this.frame, this.problems, told) = (name, frame, problems, problems.Count);
        lines = text.ReplaceLineEndings("\n").Split('\n');
        (start, hasDate) = (frame.Begins, frame.Begins is not null);
        last = frame.Begins ?? UnknownDay;
    }

    private bool IsFull => problems.Count - told >= MostProblems;

    /// <summary>Reads a file; null, with problems, when it is refused.</summary>
    /// <param name="path">the file</param>
    /// <param name="name">its name for messages</param>
    /// <param name="frame">what the readings are measured from</param>
    /// <param name="problems">takes what is wrong</param>
    public static ReadingsSheet? Read(string path, string name, ReadingsFrame frame, List<Problem> problems)
    {
        if (!WholeText.TryRead(path, ScenarioDocument.LargestFile, out string text, out string fault))
        {
            problems.Add(new Problem(0, 0, "", fault, "") { File = Quote.Plain(name) });
            return null;
        }

        var reader = new ReadingsReader(Quote.Plain(name), text, frame, problems);
        reader.ReadRows(text);
        StartClock? clock = reader.start is { } time ? new StartClock(time, reader.hasDate) : null;
        return problems.Count > reader.told ? null : new ReadingsSheet(reader.readings, clock);
    }

    private void ReadRows(string text)
    {
        try
        {
            using CsvReader csv = CsvReader.FromText(text, Options);
            if (!csv.Read())
            {
                Refuse(0, 0, "the file is empty", ReadingsColumns.Help);
                return;
            }

            int first = (int)csv.LineNumber;
            if (ReadingsColumns.Read(Cells(csv), (place, fault, help) => Refuse(first, place, fault, help)) is not { } found)
                return;
            columns = found;
            while (!IsFull && csv.Read())
                AddRow((int)csv.LineNumber, Cells(csv));
            if (readings.Count == 0 && problems.Count == told)
                Refuse(0, 0, "the file has no readings", "Each row below the titles is a reading");
        }
        catch (CsvFormatException e)
        {
            Refuse((int)e.LineNumber, 0, "the row cannot be read", "A quotation mark may be open");
        }
    }

    private static string[] Cells(CsvReader csv) => [.. Enumerable.Range(0, csv.FieldCount).Select(i => csv.GetString(i).Trim())];

    private void AddRow(int line, string[] cells)
    {
        if (cells.Length != columns.Count)
        {
            Refuse(line, 0, $"the row has {cells.Length} cells and the first line {columns.Count}", "Each row has a cell for each column");
            return;
        }

        double? time = columns.Clock is { } clock ? ClockTime(line, clock, cells[clock]) : Number(line, columns.Time!.Value, cells);
        double? level = Number(line, columns.Level, cells);
        double? resolution = columns.Resolution is { } column ? Number(line, column, cells) : frame.Resolution;
        if (time is { } t)
            JudgeTime(line, t);
        if (level is { } read && columns.IsUllage)
            level = frame.GaugePoint - read;
        if (level is { } h)
            JudgeLevel(line, h);
        if (resolution is <= 0)
            Refuse(line, columns.Resolution!.Value.Place, "the resolution is not greater than 0", "");
        if (problems.Count == told)
            readings.Add(new LevelReading(time!.Value, level!.Value, resolution!.Value));
    }

    private void JudgeTime(int line, double time)
    {
        int place = columns.Clock ?? columns.Time!.Value.Place;
        if (time < 0)
            Refuse(line, place, "the time lies before the job begins", "Times count from the start of the job");
        else if (time <= lastTime)
            Refuse(line, place, "the time does not rise from the row before", "Rows stand in time order, each time once");
        lastTime = Math.Max(lastTime, time);
    }

    private void JudgeLevel(int line, double level)
    {
        if (level < 0)
            Refuse(line, columns.Level.Place, "the level lies below the tank's lowest point", columns.IsUllage ? "Look at the gauge point and the unit" : "Look at the unit");
        else if (level > frame.Height)
            Refuse(line, columns.Level.Place, FormattableString.Invariant($"the level, {level:0.###} m, lies above the tank's {frame.Height:0.###} m"),
                columns.IsUllage ? "Look at the gauge point and the unit" : "Look at the unit, or name the column 'ullage' where it is measured from above");
    }

    /// <summary>Seconds since the start by the clock; the first reading is the start where nothing else says when it was.</summary>
    private double? ClockTime(int line, int place, string cell)
    {
        if (cell.Length == 0 || !ClockText.TryRead(cell, last, out DateTimeOffset time, out bool isDated))
        {
            Refuse(line, place, cell.Length == 0 ? "the clock is missing" : $"{Quote.Of(cell)} is no clock", ClockText.Help);
            return null;
        }

        if (!isDated && start is not null && last - time > HalfADay)
            time = time.AddDays(1);
        if (start is null)
            (start, hasDate) = (time, isDated);
        last = time;
        return (time - start.Value).TotalSeconds;
    }

    private double? Number(int line, (int Place, Unit Unit) column, string[] cells)
    {
        string cell = cells[column.Place];
        if (NumberText.TryRead(cell, out double number))
            return column.Unit.ToSi(number);
        if (cell.Length == 0)
            Refuse(line, column.Place, "the cell is empty", "Leave the whole row out where a reading is missing");
        else if (cell.Contains(',', StringComparison.Ordinal))
            Refuse(line, column.Place, $"{Quote.Of(cell)} has a comma", "Write a decimal point and no thousands sign");
        else
            Refuse(line, column.Place, $"{Quote.Of(cell)} is not a finite number", "The unit stands in the first line");
        return null;
    }

    private void Refuse(int line, int place, string fault, string accepted)
    {
        int column = line > 0 ? ColumnOf(line, place) : 0;
        var problem = new Problem(line, column, "", fault, accepted) { File = name };
        problems.Add(line > 0 ? new Yaml.SourceText(string.Join('\n', lines)).Show(problem) : problem);
    }

    /// <summary>Where a cell begins in its line, from 1.</summary>
    private int ColumnOf(int line, int place)
    {
        if (line > lines.Length)
            return 1;
        string text = lines[line - 1];
        int at = 0;
        for (bool isQuoted = false; place > 0 && at < text.Length; at++)
        {
            isQuoted ^= text[at] == '"';
            place -= text[at] == ',' && !isQuoted ? 1 : 0;
        }

        while (at < text.Length && text[at] == ' ')
            at++;
        return at + 1;
    }
}
