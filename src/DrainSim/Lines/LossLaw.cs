namespace DrainSim.Lines;

/// <summary>Loss coefficient of one fitting or open valve on the velocity head in its own bore.</summary>
public sealed record LossLaw
{
    /// <summary>The turbulent formula.</summary>
    public required LossMethod Method { get; init; }

    /// <summary>K1 of the laminar rise K1/Re, 1; 0 for a coefficient that does not depend on Re.</summary>
    public double LaminarConstant { get; init => field = Require.NotNegative(value, "laminar constant K1", ""); }

    /// <summary>The turbulent formula's coefficient (K, L/D, K∞ or Ki), 1; at least 0.</summary>
    public required double Coefficient { get; init => field = Require.NotNegative(value, "loss coefficient", ""); }

    /// <summary>Kd of the three-K formula, in^0.3; 0 elsewhere.</summary>
    public double SizeConstant { get; init => field = Require.NotNegative(value, "size constant Kd", ""); }

    /// <summary>The part of K that stays at high Reynolds numbers, 1.</summary>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    public double Turbulent(double bore) => Method == LossMethod.Constant ? Coefficient : throw new NotSupportedException($"no formula yet for a bore of {bore} m");

    /// <summary>K at a Reynolds number, 1.</summary>
    /// <param name="reynolds">Reynolds number in the bore, 1; greater than 0</param>
    /// <param name="bore">inside diameter, m; greater than 0</param>
    public double At(double reynolds, double bore) => LaminarConstant / reynolds + Turbulent(bore);
}
