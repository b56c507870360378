namespace DrainSim.Draining;

/// <summary>Makes the result of one line.</summary>
internal static class LineReport
{
    /// <summary>The result of a line.</summary>
    /// <param name="model">the balance, run to its end</param>
    /// <param name="history">its course</param>
    /// <param name="survey">its extremes</param>
    /// <param name="index">which line</param>
    public static LineResult Of(DrainModel model, RunHistory history, RunSurvey survey, int index)
    {
        Job job = model.Job;
        LineMode mode = model.Epochs[^1].Modes[index];
        CompiledLine line = model.Epochs[0].Plant.Lines[index];
        double stopped = mode.Ending is null ? history.EndTime : mode.EndedAt;
        double delivered = history.State(history.EndTime)[index];
        Extreme margin = survey.LeastMargin(index), flow = survey.LargestFlow(index);
        double fullFlow = line.Filling is null ? flow.Value : survey.LargestFullFlow(index);
        bool parts = mode.Ending is Outcome.VapourBreak or Outcome.AirBreak;
        return new LineResult
        {
            DrawOff = job.DrawOffs[index],
            Outcome = mode.Ending,
            NoStart = mode.Ending == Outcome.NeverStarted
                ? StartCheck.Refusal(job, line, history.Instants[0].HeadspacePressure ?? job.Site.AtmosphericPressure) ?? NoStart.FrontStops
                : null,
            StoppedAt = stopped,
            DeliveredVolume = delivered,
            LeastMargin = margin,
            LeastLowPointPressure = margin with { Value = margin.Value + line.Threshold },
            LeastMarginNode = survey.LowPointNode(index, margin.Time),
            LargestFlow = flow,
            LargestVelocity = flow with { Value = line.Hydraulics.LargestVelocity(Math.Max(0, flow.Value)) },
            RanFullAt = RanFullAt(model, index),
            OuterLegFroude = line.Hydraulics.RisesAboveInlet ? line.OuterLegFroude(Math.Max(0, fullFlow)) : null,
            YieldHead = job.Liquid.FlowCurve.YieldStress > 0 ? line.Hydraulics.YieldHead : null,
            ReceiverLevel = line.ReceiverDepth(delivered),
            FallBack = parts ? FallBackAt(job, line, history.Read(stopped), mode.IsFilling ? delivered : null) : null,
            Prime = StartCheck.Prime(job, line),
        };
    }

    private static double? RanFullAt(DrainModel model, int index)
    {
        if (!model.Epochs[0].Modes[index].IsFilling)
            return null;
        return model.Epochs.FirstOrDefault(epoch => !epoch.Modes[index].IsFilling)?.From;
    }

    private static FallBack FallBackAt(Job job, CompiledLine line, Instant parting, double? filled)
    {
        double empty = filled is { } volume ? line.Filling!.Volume - volume : 0;
        double intoTank = line.InnerLegVolumeAbove(parting.Level);
        double level = job.Vessel.Level(Math.Min(job.Vessel.Capacity, parting.Volume + intoTank));
        return new FallBack(intoTank, line.Hydraulics.OuterLegVolume - empty, level);
    }
}
