using System.Globalization;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Stability;

/// <summary>The two numbers that place a boiling channel on a stability map.</summary>
/// <remarks>
/// <para>Npch = Q/(ṁ hfg) · (ρl − ρg)/ρg; Nsub = (h′ − h_in)/hfg · (ρl − ρg)/ρg; so outlet quality = (Npch − Nsub) ρg/(ρl − ρg).</para>
/// <para>Q heat [W], ṁ flow [kg/s], hfg latent heat, h′ enthalpy of saturated liquid, h_in of the feed [J/kg], ρl and ρg saturated densities [kg/m³], all
/// saturated values at the outlet pressure of the pass, which is on the safe side: the numbers fall as pressure rises.</para>
/// <para>Range: outlet between saturated liquid and dry steam. Accuracy: exact as definitions; pressure differs along a real pass.</para>
/// <para>Source: Ishii and Zuber, Proc. 4th Int. Heat Transfer Conf., Paris, B5.11 (1970); Saha, Ishii and Zuber, J. Heat Transfer 98(4), 616-622 (1976).</para>
/// </remarks>
public readonly record struct StabilityNumbers
{
    /// <summary>Subcooling number 4 + 2√3 = 7.464 up to which no flow of a bare channel has two others at the same pressure drop.</summary>
    /// <remarks>
    /// <para>With s = λ/L, λ the length up to where boiling begins, Δp ~ s² + (Nsub/2) s (1 − s)²; its slope 2 s + (Nsub/2)(1 − s)(1 − 3 s) touches zero at s = 1/√3.</para>
    /// <para>Range: uniform heat, homogeneous flow, friction only, one friction factor, constant pressure.</para>
    /// <para>Accuracy: exact for that channel. Inlet throttling raises it; bends, slip and acceleration move it either way.</para>
    /// <para>Source: follows from the definitions above; the excursion itself: Ledinegg, Die Wärme 61, 891-898 (1938).</para>
    /// </remarks>
    public static double ExcursionSubcooling { get; } = 4 + (2 * Math.Sqrt(3));

    private StabilityNumbers(double phaseChange, double subcooling) => (PhaseChange, Subcooling) = (phaseChange, subcooling);

    /// <summary>The numbers of a pass; null when its outlet is not wet steam.</summary>
    /// <param name="profile">The steady state of the pass.</param>
    /// <exception cref="ArgumentNullException"><paramref name="profile"/> is null.</exception>
    public static StabilityNumbers? Of(PassProfile profile)
    {
        PassNode outlet = Require.NotNull(profile, nameof(profile)).Nodes[^1];
        if (outlet.EquilibriumQuality is not (> 0 and < 1)) return null;
        double latent = outlet.Flow.LatentHeat, ratio = (outlet.Flow.LiquidDensity - outlet.Flow.VapourDensity) / outlet.Flow.VapourDensity;
        double saturated = outlet.Enthalpy - (outlet.EquilibriumQuality * latent);
        return new((outlet.Enthalpy - profile.Nodes[0].Enthalpy) / latent * ratio, (saturated - profile.Nodes[0].Enthalpy) / latent * ratio);
    }

    /// <summary>Npch, phase-change number: what the heat could do to the volume of the flow.</summary>
    public double PhaseChange { get; }

    /// <summary>Nsub, subcooling number: what of it goes into reaching saturation.</summary>
    public double Subcooling { get; }

    /// <summary>Npch − Nsub: outlet quality times (ρl − ρg)/ρg.</summary>
    public double Excess => PhaseChange - Subcooling;

    /// <summary>Whether a bare homogeneous channel of this subcooling has flows from which it runs away at a constant pressure drop: a screen, see <see cref="FlowCharacteristic"/> for the pass itself.</summary>
    public bool AllowsExcursion => Subcooling > ExcursionSubcooling;

    internal object ToDump() => ToString();

    /// <summary>Both numbers, invariant culture.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "phase-change number {0:F3}, subcooling number {1:F3}", PhaseChange, Subcooling);
}
