using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>First-order lags with which the heat that a pass absorbs follows the fire. <c>default</c>: none.</summary>
/// <remarks>
/// <para>Q = (1 − f) L(q, τg) + f L(q, τr): q heat that the fire asks for, at rest what is absorbed; L(q, τ) the first-order lag τ dL/dt = q − L;
/// f the share of the heat that comes by way of the refractory, τg the lag of the gas side, τr that of the refractory.</para>
/// <para>Typical: some seconds for gas, burner and fan together, many minutes for refractory, f a few per cent with fibre and more with brick
/// (common practice, no source): fit them to a step of the firing.</para>
/// </remarks>
public readonly record struct HeatLags
{
    /// <summary>Lags of the heat.</summary>
    /// <param name="gas">Time constant of the gas side, zero or more.</param>
    /// <param name="refractoryShare">Share of the heat that comes by way of the refractory, 0 to 1; none unless given.</param>
    /// <param name="refractory">Time constant of the refractory, zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A lag is negative, or the share is outside 0 to 1.</exception>
    public HeatLags(Duration gas, Ratio refractoryShare = default, Duration refractory = default)
    {
        RawGas = Require.NotNegative(gas.Si(), "Lag of the gas side", Scale.Seconds, nameof(gas));
        RawShare = Require.Within(refractoryShare.Si(), 0, 1, "Share of the refractory", Scale.None, nameof(refractoryShare));
        RawRefractory = Require.NotNegative(refractory.Si(), "Lag of the refractory", Scale.Seconds, nameof(refractory));
    }

    /// <summary>Time constant of the gas side.</summary>
    public Duration Gas => Duration.FromSeconds(RawGas);

    /// <summary>Share of the heat that comes by way of the refractory.</summary>
    public Ratio RefractoryShare => Ratio.FromDecimalFractions(RawShare);

    /// <summary>Time constant of the refractory.</summary>
    public Duration Refractory => Duration.FromSeconds(RawRefractory);

    internal double RawGas { get; }

    internal double RawShare { get; }

    internal double RawRefractory { get; }
}
