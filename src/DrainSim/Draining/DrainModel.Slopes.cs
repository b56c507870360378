namespace DrainSim.Draining;

/// <content>The slopes of the balance, for implicit steps.</content>
internal sealed partial class DrainModel
{
    /// <summary>
    /// Whether the gas breathes: a wide vent wears a pressure off within microseconds, and under a narrow one the liquid
    /// follows the gas as fast; either while the level takes hours.
    /// </summary>
    public bool IsStiff => now.Plant.Gas.HasRate;

    /// <inheritdoc/>
    public void Jacobian(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> byState, Span<double> byTime)
    {
        double volume = Volume(now, t, y), surface = vessel.Level(volume);
        double gas = now.Plant.Gas.Pressure(volume, hasMass ? y[LineCount] : StartMass, out double gasByVolume, out double gasByMass);
        double rise = 1 / vessel.Area(surface), inflow = now.Inflow(t);
        byState.Clear();
        byTime.Clear();
        for (int i = 0; i < LineCount; i++)
        {
            if (!now.Modes[i].IsAtWork)
                continue;
            FlowSolutions++;
            LineSlopes slopes = now.Plant.Lines[i].Slopes(
                new LineConditions(surface, gas, y[i], now.Modes[i].IsLimited), dydt[i]);
            Write(i, slopes.BySurface * rise + slopes.ByGas * gasByVolume, slopes.ByGas * gasByMass, inflow, byState, byTime);
            byState[i * Dimension + i] += slopes.ByDelivered;
        }

        if (!hasMass)
            return;
        now.Plant.Gas.MassFlow(gas, out double breathing);
        Write(LineCount, breathing * gasByVolume, breathing * gasByMass, inflow, byState, byTime);
    }

    /// <summary>One row: every line takes from the volume of liquid, what runs in adds to it.</summary>
    private void Write(int row, double byVolume, double byMass, double inflow, Span<double> byState, Span<double> byTime)
    {
        Span<double> slopes = byState.Slice(row * Dimension, Dimension);
        slopes[..LineCount].Fill(-byVolume);
        if (hasMass)
            slopes[LineCount] = byMass;
        byTime[row] = byVolume * inflow;
    }
}
