using DrainSim.Gas;

namespace DrainSim.Draining;

/// <content>The slopes of the balance, for implicit steps.</content>
internal sealed partial class DrainModel
{
    /// <summary>
    /// Whether the gas is confined and more than one line moves it: a wide vent wears a pressure off within microseconds, and under a narrow
    /// one, or none, the vacuum holds the liquid and the flow follows what comes in as fast; either while the level takes hours.
    /// </summary>
    public bool IsStiff => hasPressure && now.Plant.Gas.IsConfined;

    /// <inheritdoc/>
    /// <remarks>The last row is that of the pressure, which answers to the flows through the growth of the gas.</remarks>
    public void Jacobian(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> byState, Span<double> byTime)
    {
        double volume = Volume(now, t, y), surface = vessel.Level(volume), gas = GasPressure(now, volume, y);
        double rise = 1 / vessel.Area(surface), inflow = now.Inflow(t), growth = -inflow;
        byState.Clear();
        byTime.Clear();
        Span<double> last = byState[(LineCount * Dimension)..];
        byTime[LineCount] = -now.InflowSlope(t);
        for (int i = 0; i < LineCount; i++)
        {
            growth += dydt[i];
            if (!now.Modes[i].IsAtWork)
                continue;
            FlowSolutions++;
            LineSlopes slopes = now.Plant.Lines[i].Slopes(new LineConditions(surface, gas, y[i], now.Modes[i].IsLimited), dydt[i]);
            Span<double> row = byState.Slice(i * Dimension, Dimension);
            row[..LineCount].Fill(-slopes.BySurface * rise);
            row[i] += slopes.ByDelivered;
            row[LineCount] = slopes.ByGas;
            byTime[i] = slopes.BySurface * rise * inflow;
            byTime[LineCount] += byTime[i];
            for (int j = 0; j <= LineCount; j++)
                last[j] += row[j];
        }

        PressureRate rate = now.Plant.Gas.Rate(gas, volume, growth);
        for (int j = 0; j < LineCount; j++)
            last[j] = rate.ByGrowth * last[j] + rate.ByVolume;
        last[LineCount] = rate.ByGrowth * last[LineCount] + rate.ByPressure;
        byTime[LineCount] = rate.ByGrowth * byTime[LineCount] - rate.ByVolume * inflow;
    }
}
