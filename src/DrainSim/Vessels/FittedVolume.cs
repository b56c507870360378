namespace DrainSim.Vessels;

/// <summary>What a <see cref="FittedVolume"/> is made from: A = s^a·p(s) and dh/ds = s^b·e(s), smooth p and e.</summary>
/// <param name="Area">p, the area with its power of s taken out</param>
/// <param name="Rise">e, the rise of the level per s with its power of s taken out</param>
/// <param name="AreaPower">a: 0 or more, 1</param>
/// <param name="RisePower">b: 0 or more, 1</param>
internal sealed record FittedQuantity(Func<double, double> Area, Func<double, double> Rise, int AreaPower, int RisePower);

/// <summary>A volume and its area over one smooth variable s from 0, as pieces halved until each fit is exact.</summary>
internal sealed class FittedVolume
{
    private const int MostHalvings = 40;
    private const int MostHalvingsInside = 8;

    private readonly List<FittedPiece> pieces = [];

    /// <summary>Fits from s = 0 to the end.</summary>
    /// <param name="end">greatest s</param>
    /// <param name="startVolume">volume at s = 0, m³</param>
    /// <param name="quantity">area and rise of the level over s</param>
    public FittedVolume(double end, double startVolume, FittedQuantity quantity) =>
        Add(0, end, startVolume, quantity, MostHalvings);

    /// <summary>The volume at s, m³.</summary>
    public double Volume(double s) => PieceAt(s).Volume(s);

    /// <summary>The area at s, m².</summary>
    public double Area(double s) => PieceAt(s).Area(s);

    private FittedPiece PieceAt(double s)
    {
        int i = 0;
        while (i < pieces.Count - 1 && s > pieces[i].End)
            i++;
        return pieces[i];
    }

    // Only a piece that begins at s = 0 can keep the powers of s apart; elsewhere they are smooth factors.
    private double Add(double from, double to, double startVolume, FittedQuantity quantity, int halvingsLeft)
    {
        FittedQuantity here = from == 0
            ? quantity
            : new FittedQuantity(
                s => quantity.Area(s) * Math.Pow(s, quantity.AreaPower),
                s => quantity.Rise(s) * Math.Pow(s, quantity.RisePower),
                AreaPower: 0, RisePower: 0);
        double[] area = FittedPiece.FitArea(from, to, here);
        if (halvingsLeft == 0 || FittedPiece.IsResolved(area))
        {
            pieces.Add(new FittedPiece(from, to, startVolume, area, here));
            return pieces[^1].Volume(to);
        }
        double middle = from + (to - from) / 2;
        double middleVolume = Add(from, middle, startVolume, quantity, halvingsLeft - 1);
        return Add(middle, to, middleVolume, quantity, Math.Min(halvingsLeft - 1, MostHalvingsInside));
    }
}
