namespace DrainSim.Integration;

/// <summary>Chooses the length of the next step from the errors and lengths of the last two.</summary>
/// <remarks><code>
/// after an accepted step, the shorter of
///   h_new = h · 0.9 · err^(−α) · err_old^β                              (proportional–integral)
///   h_new = h · 0.9 · err^(−α) · (h / h_old) · (err_old / err)^α        (predictive)
/// after a rejected step
///   h_new = h · 0.9 · err^(−α)
///
/// err  estimated error over tolerance, 1;  err_old  the same of the step before, at least 1e-4
/// q    power of h that the error estimate goes with;  β = 0.04;  α = 1/q − 0.75·β
/// </code>
/// The ratio h_new/h is kept from 0.2 to 10. The predictive part follows a solution whose steps must shrink
/// steadily, as towards a square-root end, where the other alone has every second step rejected.
/// Sources: E. Hairer, G. Wanner, Solving Ordinary Differential Equations II, 2nd ed., Springer 1996, section
/// IV.2 for the first, with the values of their program DOPRI5, and section IV.8 for the second, after
/// K. Gustafsson, ACM Trans. Math. Softw. 20 (1994) 496–517, doi:10.1145/198429.198437.
/// </remarks>
internal struct StepControl
{
    private const double Safety = 0.9;
    private const double Memory = 0.04;
    private const double ProportionalShare = 0.75;
    private const double LeastRatio = 0.2;
    private const double LargestRatio = 10;
    private const double LeastOldError = 1e-4;

    /// <summary>Ratio for a step that left the domain: nothing is known but that it was too long.</summary>
    private const double OutsideRatio = 0.25;

    private readonly double exponent;
    private double oldError;
    private double oldLength;
    private bool isAfterRejection;

    /// <summary>A control without memory, as at a restart.</summary>
    /// <param name="errorOrder">power of h that the error estimate goes with</param>
    public StepControl(int errorOrder)
    {
        exponent = 1.0 / errorOrder - ProportionalShare * Memory;
        (oldError, oldLength) = (LeastOldError, double.PositiveInfinity);
    }

    /// <summary>The next length after an accepted step.</summary>
    public double AfterAcceptance(double h, double error)
    {
        double ratio = LargestRatio;
        if (error > 0)
        {
            double proportional = Safety * Math.Pow(error, -exponent);
            ratio = proportional * Math.Pow(oldError, Memory);
            if (double.IsFinite(oldLength))
                ratio = Math.Min(ratio, proportional * (h / oldLength) * Math.Pow(oldError / error, exponent));
        }
        ratio = Math.Clamp(ratio, LeastRatio, isAfterRejection ? 1 : LargestRatio);
        (oldError, oldLength, isAfterRejection) = (Math.Max(error, LeastOldError), h, false);
        return h * ratio;
    }

    /// <summary>The length to try again with after a rejected step; the error is NaN when it left the domain.</summary>
    public double AfterRejection(double h, double error)
    {
        isAfterRejection = true;
        return double.IsNaN(error) ? h * OutsideRatio : h * Math.Max(LeastRatio, Safety * Math.Pow(error, -exponent));
    }
}
