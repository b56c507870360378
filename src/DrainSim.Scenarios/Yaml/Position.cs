namespace DrainSim.Scenarios.Yaml;

/// <summary>A place in the scenario's text.</summary>
/// <param name="Line">from 1; 0 for what was set from outside the file</param>
/// <param name="Column">from 1; 0 with line 0</param>
internal readonly record struct Position(int Line, int Column)
{
    /// <summary>The place of what was set from outside the file.</summary>
    public static Position Outside => default;
}
