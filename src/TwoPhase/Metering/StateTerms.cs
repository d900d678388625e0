using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Metering;

/// <summary>What the over-reading correlations ask of a state at every quality alike, so that a search works it out once.</summary>
internal readonly struct StateTerms
{
    public StateTerms(in MeterState meter)
    {
        double d = meter.PipeDiameter, rhog = meter.VapourDensity, ratio = rhog / meter.LiquidDensity;
        Ratio = ratio;
        RootRatio = Fast.Sqrt(ratio);
        LogRatio = Math.Log(ratio);
        Froude = 4 * meter.TotalMassFlow / (rhog * Math.PI * d * d) * Fast.Sqrt(rhog / ((meter.LiquidDensity - rhog) * SiDoor.StandardGravity * d));
    }

    /// <summary>r = ρg/ρl [-].</summary>
    public double Ratio { get; }

    /// <summary>√r [-].</summary>
    public double RootRatio { get; }

    /// <summary>ln r [-].</summary>
    public double LogRatio { get; }

    /// <summary>Densiometric Froude number of the gas if all of the flow were gas [-]: times x, that of the gas.</summary>
    public double Froude { get; }
}
