namespace DrainSim.Gas;

/// <summary>Churchill's explicit friction factor and its slope, for the air in a vent line.</summary>
/// <remarks><code>
/// f = 8 · [ (8/Re)^12 + 1/(A + B)^1.5 ]^(1/12)
/// A = { 2.457 · ln[ 1 / ((7/Re)^0.9 + 0.27·e) ] }^16
/// B = (37530/Re)^16
///
/// f   Darcy friction factor, 1;  Re  Reynolds number on the bore, 1;  e  relative roughness, 1
/// </code>
/// All regimes in one smooth expression, which an implicit solver needs; in turbulent flow within about 2 % of
/// Colebrook–White, which moves the flow by 1 % at most. Source: S. W. Churchill, Chem. Eng. 84 no. 24 (1977) 91–92.
/// </remarks>
internal static class ChurchillFriction
{
    /// <summary>The Darcy friction factor, 1.</summary>
    /// <param name="re">Reynolds number, 1; greater than 0</param>
    /// <param name="e">relative roughness, 1; at least 0</param>
    /// <param name="exponent">d ln f/d ln Re, 1; −1 in laminar flow</param>
    public static double Darcy(double re, double e, out double exponent)
    {
        if (re < 1)
        {
            // The other terms are below the last bit here, and B would overflow further down.
            exponent = -1;
            return 64 / re;
        }
        double laminar = Math.Pow(8 / re, 12);
        double smooth = Math.Pow(7 / re, 0.9);
        double w = smooth + 0.27 * e;
        double z = -2.457 * Math.Log(w);
        double z15 = Math.Pow(z, 15);
        double b = Math.Pow(37530 / re, 16);
        double sum = z15 * z + b;
        double turbulent = Math.Pow(sum, -1.5);
        double sumByLogRe = 16 * z15 * 2.457 * 0.9 * smooth / w - 16 * b;
        exponent = (-laminar - turbulent * sumByLogRe / (8 * sum)) / (laminar + turbulent);
        return 8 * Math.Pow(laminar + turbulent, 1.0 / 12);
    }
}
