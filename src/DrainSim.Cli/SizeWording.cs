using System.Globalization;
using DrainSim.Reports.Measures;
using DrainSim.Reports.Wording;
using DrainSim.Scenarios.Studies;
using DrainSim.Studies;

namespace DrainSim.Cli;

/// <summary>What a sizing found, in words.</summary>
internal static class SizeWording
{
    /// <summary>What was asked for, and each value found with its bracket and its residual.</summary>
    public static IEnumerable<string> Lines(SizePlan plan, SizingResult result, UnitSystem units)
    {
        var format = new MeasureFormat(units);
        yield return $"{plan.Parameter.Path} for {TargetText(result.Target, format)}, looked for from {Value(plan, result.From)} to {Value(plan, result.To)}:";
        foreach (SizedValue value in result.Values)
            yield return Line(plan, result, value, format);
        if (result.Values.Count == 0)
            yield return Nothing(result, format);
        else if (result.Values.Count > 1)
            yield return string.Create(CultureInfo.InvariantCulture, $"There are {result.Values.Count} of them; give the range with --between to choose.");
    }

    /// <summary>What was asked for and the values found, in one line.</summary>
    public static string Brief(SizePlan plan, SizingResult result, UnitSystem units)
    {
        var format = new MeasureFormat(units);
        string asked = $"{plan.Parameter.Path} for {TargetText(result.Target, format)}: ";
        return asked + (result.Values.Count == 0
            ? Nothing(result, format)
            : string.Join(", ", result.Values.Select(value => Value(plan, value.Value, 4) + (value.IsJump ? " (a jump)" : ""))) + ".");
    }

    /// <summary>A value of the parameter in the unit that people wrote.</summary>
    /// <param name="plan">the sizing</param>
    /// <param name="si">the value in SI</param>
    /// <param name="figures">significant figures</param>
    public static string Value(SizePlan plan, double si, int figures = 5)
    {
        string number = plan.Parameter.Unit!.FromSi(si).ToString($"G{figures}", CultureInfo.InvariantCulture);
        return plan.Parameter.Unit.Spelling == "1" ? number : $"{number} {plan.Parameter.Unit.Spelling}";
    }

    /// <summary>The target in words.</summary>
    public static string TargetText(SizingTarget target, MeasureFormat format) => target.Quantity is { } quantity
        ? $"{quantity.Name} = {ResultWording.Text(quantity, target.Value, format)}"
        : "limits kept";

    private static string Line(SizePlan plan, SizingResult result, SizedValue value, MeasureFormat format)
    {
        string bracket = $"bracket {Value(plan, value.Least, 12)}..{Value(plan, value.Most, 12)}";
        if (result.Target.Quantity is not { } quantity)
        {
            (SizedValue at, bool isKeptAbove) = (value, value.Value >= value.Most);
            return $"{Value(plan, at.Value)}: the limits are kept {(isKeptAbove ? "above" : "below")} it ({bracket}).";
        }

        string given = ResultWording.Text(quantity, result.Target.Value + value.Residual, format);
        string residual = string.Create(CultureInfo.InvariantCulture, $"{value.Residual:0.0e+0} {quantity.SiUnit}");
        return value.IsJump
            ? $"{Value(plan, value.Value)}: no value, the result jumps over the target there; on this side {given} ({OutcomeCodes.Code(value.Run.Outcome)}; {bracket})."
            : $"{Value(plan, value.Value)} gives {given} ({OutcomeCodes.Code(value.Run.Outcome)}; residual {residual}, {bracket}).";
    }

    private static string Nothing(SizingResult result, MeasureFormat format)
    {
        if (result.Target.Quantity is not { } quantity)
        {
            bool isKept = result.Scan.Any(point => point.Result.Run is { } run && run.BrokenLimits.IsEmpty && run.NoStart is null);
            return isKept ? "The limits are kept all the way." : "The limits are broken all the way.";
        }

        return result.Reached is var (least, most)
            ? $"No value reaches it: {quantity.Name} goes from {ResultWording.Text(quantity, least, format)} to {ResultWording.Text(quantity, most, format)}."
            : $"No value reaches it: no case has a {quantity.Name}; the first ends as {Ending(result.Scan[0].Result)}, the last as {Ending(result.Scan[^1].Result)}.";
    }

    private static string Ending(CaseResult result) => result.Run is { } run ? OutcomeCodes.Code(run.Outcome) : $"impossible ({result.Cause})";
}
