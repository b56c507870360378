using DrainSim.Draining;
using DrainSim.Lines;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.LinearAlgebra;

namespace DrainSim.Studies.Forecasting;

/// <summary>Tries whether a leak or an inflow that nobody knows of explains the readings better.</summary>
internal static class AlternativeSearch
{
    /// <summary>Discharge coefficient of a sharp-edged hole: 0.6 to 0.62 in the textbooks.</summary>
    private const double HoleCoefficient = 0.61;

    /// <summary>Least flow that is tried, of the flow at the start.</summary>
    private const double LeastShare = 1e-6;

    /// <summary>Fits each alternative and compares it with the fit without it.</summary>
    /// <param name="study">the study</param>
    /// <param name="plain">the fit without an alternative</param>
    /// <param name="scales">scales of the parameters</param>
    /// <param name="run">the run of the plain fit</param>
    /// <param name="cancellation">ends the search</param>
    public static IReadOnlyList<Alternative> Find(
        ForecastStudy study, LevelFit plain, double[] scales, DrainResult run, CancellationToken cancellation)
    {
        int left = study.Readings.Count - study.Parameters.Count - 1;
        double scale = 0.1 * Math.Abs(run.LargestFlow.Value);
        if (left < 1 || scale == 0)
            return [];
        return [.. Enum.GetValues<AlternativeKind>().Select(kind => Of(study, kind, plain, [.. scales, scale], cancellation))];
    }

    private static Alternative Of(
        ForecastStudy study, AlternativeKind kind, LevelFit plain, double[] scales, CancellationToken cancellation)
    {
        double head = study.Readings[0].Level;
        var model = new LevelModel(values => With(study.Make([.. values.Take(values.Count - 1)]), kind, values[^1], head, LeastShare * scales[^1]),
            scales, study.Readings, cancellation);
        if (Start(model, plain) is not { } start || LevelFit.Find(model, start) is not { } fit || fit.Scaled[^1] <= LeastShare)
            return None(kind);
        int left = study.Readings.Count - scales.Length;
        double f = (plain.Misfit - fit.Misfit) / (fit.Misfit / left);
        if (!(f > 0))
            return None(kind);
        double widening = Math.Sqrt(Math.Max(1, fit.Misfit / left));
        return new Alternative
        {
            Kind = kind,
            Flow = fit.Scaled[^1] * scales[^1],
            FlowError = fit.IsBounded ? Math.Sqrt(fit.Covariance()[scales.Length - 1, scales.Length - 1]) * widening * scales[^1] : null,
            PValue = 1 - FisherSnedecor.CDF(1, left, f),
            CriterionGain = Criterion(plain.Misfit, study.Readings.Count, scales.Length - 1)
                - Criterion(fit.Misfit, study.Readings.Count, scales.Length),
            Run = model.Run(fit.Scaled),
        };
    }

    private static Alternative None(AlternativeKind kind) => new() { Kind = kind, Flow = 0, PValue = 1 };

    /// <summary>
    /// One step of Gauss and Newton with the new parameter from 0; null where it leads below 0, so that the readings want none
    /// of it.
    /// </summary>
    private static double[]? Start(LevelModel model, LevelFit plain)
    {
        double[] point = [.. plain.Scaled, 0];
        if (model.Predict(point) is not { } predicted)
            return null;
        Vector<double> residual = Vector<double>.Build.Dense(model.Observed) - Vector<double>.Build.Dense(predicted);
        Vector<double> step = Matrix<double>.Build.DenseOfArray(model.Jacobian(point)).Svd().Solve(residual);
        if (!(step[^1] > 0))
            return null;
        for (double part = 1; part > 1e-3; part /= 4)
        {
            double[] start = [.. point.Select((x, j) => x + part * step[j])];
            if (model.Predict(start) is not null)
                return start;
        }

        return null;
    }

    /// <summary>The job with the unknown added; below the least flow it stands as it is.</summary>
    private static CaseJob With(CaseJob made, AlternativeKind kind, double flow, double head, double least)
    {
        if (made.IsRefused)
            return made;
        if (flow < 0)
            return CaseJob.Refused("a flow below 0");
        if (flow < least)
            return made;
        Job job = made.Job;
        return CaseJob.Of(() => kind == AlternativeKind.Inflow
            ? job with { Inflow = Plus(job.Inflow, flow) }
            : job with { DrawOffs = [.. job.DrawOffs, Hole(flow, head, job.Site.Gravity)] });
    }

    private static Inflow Plus(Inflow? known, double flow) => known is null
        ? Inflow.Constant(flow)
        : new Inflow { Points = [.. known.Points.Select(point => (point.Time, point.Flow + flow))] };

    /// <summary>A hole in the floor that passes a flow at a head: Q = Cd·a·√(2·g·h).</summary>
    private static DrawOff Hole(double flow, double head, double gravity)
    {
        double area = flow / (HoleCoefficient * Math.Sqrt(2 * gravity * head));
        return new DrawOff
        {
            Line = new Line
            {
                Name = "leak",
                Bore = Math.Sqrt(4 * area / Math.PI),
                Roughness = 0,
                Inlet = new Inlet { Elevation = 0, Facing = InletFacing.Down, EdgeLoss = 1 / (HoleCoefficient * HoleCoefficient) - 1 },
                Path = [],
            },
        };
    }

    /// <summary>Akaike's criterion with Hurvich and Tsai's correction; the variance is the one parameter more. Null for too few readings.</summary>
    private static double? Criterion(double misfit, int readings, int parameters)
    {
        int k = parameters + 1;
        return readings - k - 1 > 0 && misfit > 0
            ? readings * Math.Log(misfit / readings) + 2.0 * k + 2.0 * k * (k + 1) / (readings - k - 1)
            : null;
    }
}
