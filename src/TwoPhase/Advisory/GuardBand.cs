using MathNet.Numerics.Distributions;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>How far a set-point must stay from a limit that must not be passed, when what is held to it is known only so well.</summary>
/// <remarks>
/// <para>Set-point = limit − z·u, z the quantile of the normal law at the wanted confidence, u the standard uncertainty of the quality with that of the holding.</para>
/// <para>Range: confidence 0.5 to below 1. Accuracy: that of u, and of its law being normal in the tail.</para>
/// <para>Source: JCGM 106:2012, 8.3.2, guarded acceptance with an upper limit.</para>
/// </remarks>
public static class GuardBand
{
    /// <summary>The confidence of advice: one-sided 95 %.</summary>
    public static Ratio UsualConfidence => Ratio.FromPercent(95);

    /// <summary>The set-point below an upper limit.</summary>
    /// <param name="limit">The limit, 0 to 1.</param>
    /// <param name="standardUncertainty">u, zero or more.</param>
    /// <param name="confidence">That the true quality is not above the limit, 50 % to below 100 %.</param>
    /// <returns>As computed: negative where the uncertainty leaves no room.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits.</exception>
    public static MassFraction Below(MassFraction limit, MassFraction standardUncertainty, Ratio confidence)
    {
        double most = Require.Within(limit.Si(), 0, 1, "Limit", Scale.None, nameof(limit)), u = Require.NotNegative(standardUncertainty.Si(), "Standard uncertainty", Scale.None, nameof(standardUncertainty));
        double sure = Require.Below(Require.Within(confidence.Si(), 0.5, 1, "Confidence", Scale.None, nameof(confidence)), 1, "Confidence", Scale.None, nameof(confidence));
        return MassFraction.FromDecimalFractions(most - (Normal.InvCDF(0, 1, sure) * u));
    }
}
