using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Steam;
using TwoPhase.Units;

namespace TwoPhase.HeatTransfer;

// What several flow-boiling correlations share.
public abstract partial class FilmModel
{
    // M of water: IAPWS R6-95(2018).
    private const double MolarMass = 18.015268;   // kg/kmol

    /// <summary>1 − x, kept above zero, where the correlations read 0 · ∞; so small that the limit is reached.</summary>
    private static double LiquidShare(in FlowState flow) => Math.Max(1 - flow.Quality, 1e-100);

    /// <summary>x + (1 − x) ρg/ρl: homogeneous volume flow over that of the vapour density [-].</summary>
    private static double VapourShare(in FlowState flow) => flow.Quality + ((1 - flow.Quality) * (flow.VapourDensity / flow.LiquidDensity));

    /// <summary>ln(1/Xtt), 1/Xtt = (x/(1 − x))^0.9 (ρl/ρg)^0.5 (μg/μl)^0.1; minus infinity at x = 0.</summary>
    private static double LogInverseMartinelli(in FlowState flow, double liquidShare)
    {
        double ratio = flow.LiquidDensity / flow.VapourDensity, square = ratio * ratio;
        return (0.9 * Math.Log(flow.Quality / liquidShare)) + (0.1 * Math.Log(square * square * ratio * flow.VapourViscosity / flow.LiquidViscosity));
    }

    /// <summary>Fr = G²/(ρl² g D) [-], all the flow as liquid.</summary>
    private static double LiquidFroude(in FlowState flow) => flow.MassFlux * flow.MassFlux / FroudeScale(flow);

    /// <summary>Whether Gungor and Winterton's correction for a partly wetted tube applies: near the horizontal and Fr below 0.05.</summary>
    private static bool IsPartlyWetted(in FlowState flow) =>
        flow.MassFlux * flow.MassFlux < 0.05 * FroudeScale(flow) && Math.Abs(flow.Inclination) < Math.PI / 4;

    private static double FroudeScale(in FlowState flow) => flow.LiquidDensity * flow.LiquidDensity * SiDoor.StandardGravity * flow.Bore;

    /// <summary>Fr^(0.1 − 2 Fr) [-], Gungor and Winterton's factor of the convective term below Fr = 0.05.</summary>
    private static double HorizontalFactor(double froude) => Math.Pow(froude, 0.1 - (2 * froude));

    /// <summary>The range of Gungor and Winterton's data bank.</summary>
    private static Applicability GungorWintertonRange(in FlowState flow, double heatFlux) => Applicability.Inside
        .Check(ApplicabilityLimits.Bore, flow.Bore, 0.00295, 0.032)
        .Check(ApplicabilityLimits.Pressure, flow.Pressure, 0.08e6, 20.3e6)
        .Check(ApplicabilityLimits.MassFlux, flow.MassFlux, 12.4, 61518)
        .Check(ApplicabilityLimits.HeatFlux, heatFlux, 350, 9.534e6);

    /// <summary>
    /// The larger of h and Dittus-Boelter for all the flow as vapour, to which a wet-wall formula must hand over at x = 1. The latter
    /// over the liquid share's coefficient is (kg/kl)^0.6 (μl cpg / (μg cpl))^0.4 (1 − x)^−0.8: one power.
    /// </summary>
    private static double NotBelowDrySteam(in FlowState flow, double liquidShare, double liquidCoefficient, double h)
    {
        double conductivity = flow.VapourConductivity / flow.LiquidConductivity;
        double capacity = flow.LiquidViscosity * flow.VapourHeatCapacity / (flow.VapourViscosity * flow.LiquidHeatCapacity);
        double power = conductivity * Fast.Sqrt(conductivity) * capacity / (liquidShare * liquidShare);
        return Math.Max(h, liquidCoefficient * Math.Exp(0.4 * Math.Log(power)));
    }
}
