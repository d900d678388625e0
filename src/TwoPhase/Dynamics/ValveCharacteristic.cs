using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>How much a control valve passes at an opening, of what it passes fully open at the same pressure drop: its inherent characteristic.</summary>
/// <remarks>Derive from it for a curve of the maker's: <see cref="RelativeFlowCore"/> is all there is to write.</remarks>
public abstract class ValveCharacteristic
{
    /// <summary>Linear: equal travel, equal flow.</summary>
    /// <remarks>
    /// <para>φ = h; h opening [-], φ relative flow coefficient [-].</para>
    /// <para>Range: 0 ≤ h ≤ 1; the leakage of a real valve near its seat is left out.</para>
    /// <para>Accuracy: none stated for the ideal curve; makers' deviations of 10 % and more are usual (from memory).</para>
    /// <para>Source: IEC 60534-2-4, inherent flow characteristics, with Φ0 = 0 (from memory).</para>
    /// </remarks>
    public static ValveCharacteristic Linear { get; } = new LinearTravel();

    /// <summary>Equal percentage: equal travel changes the flow by an equal share of what it is.</summary>
    /// <remarks>
    /// <para>φ = R^(h − 1); h opening [-], φ relative flow coefficient [-], R inherent rangeability [-].</para>
    /// <para>Range: 0 &lt; h ≤ 1; at h = 0 the curve leaves 1/R where a real valve shuts, so it must not be trusted below a few per cent.</para>
    /// <para>Accuracy: none stated for the ideal curve; makers' deviations of 10 % and more are usual (from memory).</para>
    /// <para>Source: IEC 60534-2-4, inherent flow characteristics, Φ = Φ0 exp(n h) with n = ln R (from memory).</para>
    /// </remarks>
    /// <param name="rangeability">R, greater than 1; 50 is usual.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="rangeability"/> is not greater than 1.</exception>
    public static ValveCharacteristic EqualPercentage(double rangeability = 50) =>
        new EqualShares(Require.Positive(rangeability - 1, "Rangeability less one", Scale.None, nameof(rangeability)) + 1);

    /// <summary>φ, flow over that of the valve fully open at the same pressure drop.</summary>
    /// <param name="opening">h, 0 to 100 %.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="opening"/> is outside its limits.</exception>
    public double RelativeFlow(Ratio opening) => RelativeFlowCore(Require.Within(opening.Si(), 0, 1, "Valve opening", Scale.None, nameof(opening)));

    /// <summary>φ from h, both 0 to 1; rising. Arguments trusted.</summary>
    /// <param name="opening">h [-].</param>
    protected internal abstract double RelativeFlowCore(double opening);

    private sealed class LinearTravel : ValveCharacteristic
    {
        protected internal override double RelativeFlowCore(double opening) => opening;
    }

    private sealed class EqualShares(double rangeability) : ValveCharacteristic
    {
        protected internal override double RelativeFlowCore(double opening) => Math.Pow(rangeability, opening - 1);
    }
}
