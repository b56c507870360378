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
    /// <remarks>The row behind those of the lines is that of the pressure, which answers to the flows through the growth of the gas.</remarks>
    public void Jacobian(double t, ReadOnlySpan<double> y, ReadOnlySpan<double> dydt, Span<double> byState, Span<double> byTime)
    {
        double volume = Volume(now, t, y), surface = vessel.Level(volume), gas = GasPressure(now, volume, y);
        double rise = 1 / AreaForSlopes(surface), inflow = now.Inflow(t), growth = -inflow;
        byState.Clear();
        byTime.Clear();
        Span<double> pressure = byState.Slice(LineCount * Dimension, Dimension);
        byTime[LineCount] = -now.InflowSlope(t);
        for (int i = 0; i < LineCount; i++)
        {
            growth += dydt[i];
            if (!now.Modes[i].Flows)
                continue;
            Span<double> row = byState.Slice(i * Dimension, Dimension);
            if (now.Modes[i].IsFilling)
            {
                row[flowAt[i]] = 1;
                pressure[flowAt[i]] += 1;
                byTime[flowAt[i]] = rise * inflow
                    * FillingSlopes(i, surface, gas, rise, y, byState.Slice(flowAt[i] * Dimension, Dimension));
                continue;
            }

            FlowSolutions++;
            LineSlopes slopes = now.Plant.Lines[i].Slopes(new LineConditions(surface, gas, y[i], now.Modes[i].IsLimited), dydt[i]);
            row[..LineCount].Fill(-slopes.BySurface * rise);
            row[i] += slopes.ByDelivered;
            row[LineCount] = slopes.ByGas;
            byTime[i] = slopes.BySurface * rise * inflow;
            byTime[LineCount] += byTime[i];
            for (int j = 0; j <= LineCount; j++)
                pressure[j] += row[j];
        }

        PressureRate rate = now.Plant.Gas.Rate(gas, volume, growth);
        for (int j = 0; j < Dimension; j++)
            pressure[j] *= rate.ByGrowth;
        for (int j = 0; j < LineCount; j++)
            pressure[j] += rate.ByVolume;
        pressure[LineCount] += rate.ByPressure;
        byTime[LineCount] = rate.ByGrowth * byTime[LineCount] - rate.ByVolume * inflow;
    }

    /// <summary>Area of the surface, m²; never less than a small share of the mean: in the point of a top the level has no slope.</summary>
    private double AreaForSlopes(double surface) => Math.Max(vessel.Area(surface), LeastArea * vessel.Capacity / vessel.Height);

    private const double LeastArea = 1e-4;

    /// <summary>
    /// Fills the row of a filling line's acceleration and gives its slope by the level: it is linear in the level and in the gas, and smooth in its own flow and
    /// front, for which differences are good to some nine digits.
    /// </summary>
    private double FillingSlopes(int line, double surface, double gas, double rise, ReadOnlySpan<double> y, Span<double> row)
    {
        const double Share = 1e-6;
        (CompiledLine compiled, int segment) = (now.Plant.Lines[line], now.Modes[line].Segment);
        (double delivered, double flow) = (y[line], y[flowAt[line]]);
        double here = At(surface, gas, delivered, flow);
        double bySurface = At(surface + 1, gas, delivered, flow) - here;
        double dv = Share * compiled.Filling!.Volume, dq = Share * flowScales[line];
        row[..LineCount].Fill(-bySurface * rise);
        row[line] += (At(surface, gas, delivered + dv, flow) - At(surface, gas, delivered - dv, flow)) / (2 * dv);
        row[LineCount] = (At(surface, gas + atmosphere, delivered, flow) - here) / atmosphere;
        row[flowAt[line]] = (At(surface, gas, delivered, flow + dq) - At(surface, gas, delivered, flow - dq)) / (2 * dq);
        return bySurface;

        double At(double z, double p, double volume, double q) => compiled.Acceleration(segment, z, p, volume, q);
    }
}
