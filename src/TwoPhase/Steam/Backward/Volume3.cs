namespace TwoPhase.Steam.Backward;

/// <summary>Region 3: v(p,T) in its 26 subregions. SI in, SI out, arguments trusted.</summary>
/// <remarks>
/// <para>Range: region 3 of the formulation, on either side of the saturation line; saturation itself counts as liquid.</para>
/// <para>Accuracy: v within 0.001 % of the forward equation in the subregions a to t, within 0.1 % in u to z beside the critical point.</para>
/// <para>Source: IAPWS SR5-05(2016), Tables 2 and 10 for the choice of a subregion.</para>
/// </remarks>
internal static partial class Volume3
{
    // Tables 2 and 10: pressures [Pa] at which the set of subregions changes.
    private const double SaturationAt643 = 2.104336732e7;
    private const double SaturationOnBorderCd = 1.900881189173929e7;
    private const double SaturationOnLiquidBorderUv = 2.193161551e7;
    private const double SaturationOnVapourBorderWx = 2.190096265e7;

    /// <summary>v [m³/kg] at p [Pa] and T [K]; the phase is the one that <paramref name="T"/> has against Ts(p).</summary>
    public static double At(double p, double T) => At(p, T, p <= Water97.CriticalPressure && T > Region4.Temperature(p));

    /// <summary>v [m³/kg] of the phase that the caller has decided on; <paramref name="vapour"/> is idle above the critical pressure.</summary>
    public static double At(double p, double T, bool vapour) => Choose(p, T, vapour).Volume(p, T);

    private static Subregion Choose(double p, double T, bool vapour)
    {
        double pi = p / 1e6;
        if (p > 40e6) return T <= Ab(pi) ? A : B;
        if (p > 25e6) return T <= Cd(pi) ? C : T <= Ab(pi) ? D : T <= Ef(pi) ? E : F;
        if (p > 23.5e6) return T <= Cd(pi) ? C : T <= Gh(pi) ? G : T <= Ef(pi) ? H : T <= Ij(pi) ? I : T <= Jk(pi) ? J : K;
        if (p > 23e6) return T <= Cd(pi) ? C : T <= Gh(pi) ? L : T <= Ef(pi) ? H : T <= Ij(pi) ? I : T <= Jk(pi) ? J : K;
        if (p > 22.5e6)
            return T <= Cd(pi) ? C : T <= Gh(pi) ? L : T <= Mn(pi) ? M : T <= Ef(pi) ? N : T <= Op(pi) ? O : T <= Ij(pi) ? P : T <= Jk(pi) ? J : K;
        if (p > SaturationAt643) return T <= Cd(pi) ? C : T <= Qu(pi) ? Q : T <= Rx(pi) ? ChooseNearCritical(p, T, vapour) : T <= Jk(pi) ? R : K;
        if (!vapour) return p > SaturationOnBorderCd && T > Cd(pi) ? S : C;
        return p <= 20.5e6 ? Volume3.T : T <= Jk(pi) ? R : K;
    }

    private static Subregion ChooseNearCritical(double p, double T, bool vapour)
    {
        double pi = p / 1e6;
        if (p > 22.11e6) return T <= Uv(pi) ? U : T <= Ef(pi) ? V : T <= Wx(pi) ? W : X;
        if (p > Water97.CriticalPressure) return T <= Uv(pi) ? U : T <= Ef(pi) ? Y : T <= Wx(pi) ? Z : X;
        if (vapour) return p <= SaturationOnVapourBorderWx || T > Wx(pi) ? X : Z;
        return p <= SaturationOnLiquidBorderUv || T <= Uv(pi) ? U : Y;
    }
}
