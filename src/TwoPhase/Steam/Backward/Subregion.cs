using TwoPhase.Numerics;

namespace TwoPhase.Steam.Backward;

/// <summary>What stands around the sum of a subregion of region 3.</summary>
internal enum Outer
{
    None = 0,
    FourthPower,
    Exponential,
}

/// <summary>One of the 26 equations v(p,T) of region 3: v/v* = [Σ n·(π − a)^(c·I)·(θ − b)^(d·J)]^e, and exp(Σ …) for subregion 3n.</summary>
/// <remarks>
/// c and d are 1, 1/2 or 1/4, here 0, 1 or 2 square roots; e is 1 or 4.
/// <para>Range: the subregion's own piece of region 3.</para>
/// <para>Accuracy: v within 0.001 % in most subregions, within 0.1 % beside the critical point, of the forward equation.</para>
/// <para>Source: IAPWS SR5-05(2016), Eqs. (4) and (5), Tables 4 and 12.</para>
/// </remarks>
internal sealed class Subregion(
    double volume,
    double pressure,
    double temperature,
    double a,
    double b,
    TermTable terms,
    int rootsOfPressure = 0,
    int rootsOfTemperature = 0,
    Outer outer = Outer.None)
{
    /// <summary>v [m³/kg] at p [Pa] and T [K].</summary>
    public double Volume(double p, double T)
    {
        double sum = terms.Sum(Root((p / pressure) - a, rootsOfPressure), Root((T / temperature) - b, rootsOfTemperature));
        return volume * outer switch
        {
            Outer.FourthPower => sum * sum * (sum * sum),
            Outer.Exponential => Math.Exp(sum),
            _ => sum,
        };
    }

    private static double Root(double x, int times)
    {
        for (; times > 0; times--) x = Fast.Sqrt(x);
        return x;
    }
}
