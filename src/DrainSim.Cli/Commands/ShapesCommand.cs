using System.CommandLine;
using DrainSim.Cli.Terminal;

namespace DrainSim.Cli.Commands;

/// <summary>Shows the shapes of tanks with the dimensions that a scenario gives.</summary>
internal sealed class ShapesCommand() : TableCommand("shapes", "Shows the shapes of tanks and of their ends.")
{
    /// <inheritdoc/>
    protected override ColumnTable Table(ParseResult parsed)
    {
        var table = new ColumnTable(
            new Column { Title = "key", Key = "key" },
            new Column { Title = "name", Key = "id" },
            new Column { Title = "dimensions", Key = "dimensions", IsWrapped = true },
            new Column { Title = "what it is", Key = "description", IsWrapped = true });
        table.Add("shape", "vertical_cylinder", "diameter, height, bottom, top", "A standing tank; height is that of the straight shell");
        table.Add("shape", "horizontal_cylinder", "diameter, length, heads", "A lying drum; length is that of the straight shell");
        table.Add("shape", "sphere", "diameter", "A ball");
        table.Add("shape", "box", "length, width, height", "A rectangular tank");
        table.Add("shape", "cone", "bottom_diameter, top_diameter, height", "A frustum, or a cone where one of the diameters is 0");
        table.Add("shape", "basin", "bottom_length, bottom_width, side_slope, depth", "A pond with sloping sides; side_slope is metres out for each metre up");
        table.Add("shape", "stack", "sections", "Shapes on top of each other, from the bottom up");
        table.Add("shape", "table", "file", "A strapping table as CSV: level against volume");
        table.Add("end", "flat", "", "A flat bottom, top or head");
        table.Add("end", "cone", "depth or angle", "A cone");
        table.Add("end", "hemisphere", "", "Half a ball");
        table.Add("end", "ellipsoidal", "depth", "A dished end, 2:1 unless its depth is given");
        table.Add("end", "torispherical", "crown_radius, knuckle_radius", "A dished end of a crown and a knuckle");
        table.Notes.Add("All dimensions are inside ones. An end stands at bottom:, top: or heads: of a cylinder.");
        return table;
    }
}
