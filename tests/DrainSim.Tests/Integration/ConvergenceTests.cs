using DrainSim.Integration;
using DrainSim.Tests.Integration.Problems;

namespace DrainSim.Tests.Integration;

/// <summary>Orders measured with steps of one length on the logistic equation.</summary>
public sealed class ConvergenceTests
{
    private const double End = 4;

    [Fact]
    public void Halving_the_step_cuts_the_error_of_the_solution_by_two_to_the_fifth() =>
        Assert.InRange(Math.Log2(Errors(40).AtEnds / Errors(80).AtEnds), 4.8, 5.2);

    [Fact]
    public void Halving_the_step_cuts_the_error_between_steps_by_two_to_the_fifth_within_one_step()
    {
        // An output of order 4 has a local error of order 5, and it is not carried on to the next step.
        Assert.InRange(Math.Log2(Errors(40).Between / Errors(80).Between), 4.8, 5.3);
    }

    [Fact]
    public void Halving_the_step_cuts_the_error_of_the_slope_between_steps_by_two_to_the_fourth() =>
        Assert.InRange(Math.Log2(Errors(40).Slope / Errors(80).Slope), 3.8, 4.2);

    [Fact]
    public void Halving_the_step_cuts_the_error_estimate_by_two_to_the_fifth() =>
        Assert.InRange(Math.Log2(Errors(40).Estimate / Errors(80).Estimate), 4.7, 5.3);

    private static (double AtEnds, double Between, double Slope, double Estimate) Errors(int steps)
    {
        Logistic problem = new();
        EmbeddedRungeKutta<Logistic> stepper = new(problem, DormandPrince54.Tableau);
        double[] coefficients = new double[DenseStep.Terms];
        Span<double> y = [0];
        Span<double> slope = [0];
        Span<double> exactSlope = [0];
        double atEnds = 0, between = 0, slopeError = 0, estimate = 0;
        stepper.Begin(0, problem.InitialState);
        for (int i = 0; i < steps; i++)
        {
            double start = End * i / steps;
            double h = End / steps;
            estimate = Math.Max(estimate, stepper.Try(h, 1e-8));
            stepper.WriteDense(coefficients);
            DenseStep dense = new(start, start + h, h, coefficients);
            stepper.Accept(End * (i + 1) / steps);
            atEnds = Math.Max(atEnds, Math.Abs(stepper.State[0] - problem.Exact(stepper.Time)[0]));
            for (int part = 1; part < 16; part++)
            {
                double t = start + h * part / 16;
                dense.Evaluate(t, y);
                dense.EvaluateDerivative(t, slope);
                problem.Derivative(t, problem.Exact(t), exactSlope);
                between = Math.Max(between, Math.Abs(y[0] - problem.Exact(t)[0]));
                slopeError = Math.Max(slopeError, Math.Abs(slope[0] - exactSlope[0]));
            }
        }
        return (atEnds, between, slopeError, estimate);
    }
}
