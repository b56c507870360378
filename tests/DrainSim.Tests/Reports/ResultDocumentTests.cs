using System.Text.Json;
using DrainSim.Draining;
using DrainSim.Reports;
using DrainSim.Reports.Series;

namespace DrainSim.Tests.Reports;

public sealed class ResultDocumentTests
{
    [Fact]
    public void The_top_level_keys_are_the_approved_ones() => Assert.Equal(
        [
            "title", "drainsim", "outcome", "reason", "sentence", "begins", "stopped_at_s", "stopped_at_clock", "initial_volume_m3",
            "drained_volume_m3", "left_volume_m3", "final_level_m",
            "least_low_point_pressure_Pa", "least_low_point_pressure_at_s", "least_margin_Pa", "least_margin_at_s",
            "least_margin_node", "largest_flow_m3_s", "largest_flow_at_s", "largest_velocity_m_s",
            "largest_velocity_at_s", "receiver_level_m", "headspace_pressure_Pa", "largest_vacuum_Pa", "balance_level_m",
            "events", "times_to",
            "first_instant", "limits", "lines", "warnings", "remedies", "cautions", "prime", "fall_back", "steadiness", "counters",
            "inputs",
        ],
        Document(new InventedRun()).EnumerateObject().Select(key => key.Name));

    [Fact]
    public void What_was_found_reads_back()
    {
        DrainResult result = new InventedRun().Result();
        JsonElement root = Document(new InventedRun());
        Assert.Equal("inlet_uncovered", root.GetProperty("outcome").GetString());
        Assert.Equal("Stops after 1 h 42 min with 312 L left: air reaches the inlet at 0.12 m.",
            root.GetProperty("sentence").GetString());
        Assert.Equal(result.StoppedAt, root.GetProperty("stopped_at_s").GetDouble());
        Assert.Equal(result.LeftVolume, root.GetProperty("left_volume_m3").GetDouble());
        Assert.Equal(result.LeastMargin.Value, root.GetProperty("least_margin_Pa").GetDouble());
        Assert.Equal(JsonValueKind.Null, root.GetProperty("receiver_level_m").ValueKind);
        Assert.Equal(JsonValueKind.Null, root.GetProperty("reason").ValueKind);
        Assert.Equal("0.1.0", root.GetProperty("drainsim").GetString());
    }

    [Fact]
    public void The_events_stand_in_it_with_code_and_text()
    {
        JsonElement events = Document(new InventedRun()).GetProperty("events");
        Assert.Equal(10, events.GetArrayLength());
        JsonElement last = events[9];
        Assert.Equal(["time_s", "code", "text", "level_m", "volume_m3"], last.EnumerateObject().Select(key => key.Name));
        Assert.Equal("inlet_uncovered", last.GetProperty("code").GetString());
        Assert.Equal("air reaches the inlet", last.GetProperty("text").GetString());
    }

    [Fact]
    public void A_fraction_that_is_never_drained_has_no_time()
    {
        JsonElement times = Document(new InventedRun()).GetProperty("times_to");
        Assert.Equal(JsonValueKind.Number, times[8].GetProperty("time_s").ValueKind);
        Assert.Equal(JsonValueKind.Null, times[10].GetProperty("time_s").ValueKind);
    }

    [Fact]
    public void A_run_that_never_starts_tells_its_reason() => Assert.Equal("valve_shut",
        Document(new InventedRun { Outcome = Outcome.NeverStarted, NoStart = NoStart.ValveShut })
            .GetProperty("reason").GetString());

    [Fact]
    public void An_input_tells_its_value_and_how_it_was_written()
    {
        JsonElement inputs = Document(new InventedRun(),
            new UnderstoodInput { Path = "line.bore", Number = 0.038, Unit = "m", AsWritten = "38 mm" },
            new UnderstoodInput { Path = "line.at_vapour", Text = "break", IsDefault = true }).GetProperty("inputs");
        Assert.Equal("""{"path":"line.bore","value":0.038,"unit":"m","as_written":"38 mm","default":false}""",
            JsonSerializer.Serialize(inputs[0]));
        Assert.Equal("""{"path":"line.at_vapour","value":"break","as_written":null,"default":true}""",
            JsonSerializer.Serialize(inputs[1]));
    }

    [Fact]
    public void A_number_that_is_not_finite_is_absent() => Assert.Equal(JsonValueKind.Null,
        Document(new InventedRun { LowestPressure = double.NaN }).GetProperty("least_margin_Pa").ValueKind);

    private static JsonElement Document(InventedRun run, params UnderstoodInput[] inputs)
    {
        using var stream = new MemoryStream();
        ResultDocument.Write(stream, new RunReport { Name = "rinse", Result = run.Result(), Inputs = inputs });
        return JsonDocument.Parse(stream.ToArray()).RootElement;
    }
}
