using System.Numerics;

namespace TwoPhase.Tests.Dynamics;

/// <summary>What leaves a uniformly heated channel, and where it begins to boil, in closed form.</summary>
/// <param name="Onset">λ, boiling boundary [m].</param>
/// <param name="MassFlux">G at the outlet [kg/(m²·s)].</param>
/// <param name="Quality">x at the outlet.</param>
internal readonly record struct ChannelAnswer(double Onset, double MassFlux, double Quality);

/// <summary>
/// Closed forms of a uniformly heated channel of homogeneous flow at constant pressure after a step at t = 0. Liquid of constant
/// density boils τ after it entered, so λ is the integral of the inlet velocity over the last τ; where it boils Dv/Dt = Ω v, so
/// du/dz = Ω, Ω = q′ vfg/(A hfg).
/// </summary>
/// <remarks>
/// Wallis and Heasley, J. Heat Transfer 83, 363 (1961): the boundary; Gonzalez-Santalo and Lahey, J. Heat Transfer 95, 470 (1973): the flow.
/// Derived anew from the five lines above; they agree with an independent Lagrangian slug model to 7e-6.
/// </remarks>
internal static class UniformChannel
{
    public const double Bore = 0.0779, Length = 671, MassFlux = 1007, LinearHeat = 12180, Lacking = 6.75e5;
    public const double Area = Math.PI / 4 * Bore * Bore;
    private const double LiquidVolume = 1 / 688.0, VapourVolume = 1 / 55.5, Latent = 1.317e6;
    private const double Velocity = MassFlux * LiquidVolume, Expansion = LinearHeat * (VapourVolume - LiquidVolume) / (Area * Latent);
    private const double Delay = Area * Lacking / (LiquidVolume * LinearHeat);

    /// <summary>Inlet flow times <paramref name="ratio"/>.</summary>
    public static ChannelAnswer FlowStep(double ratio, double t)
    {
        double u1 = Velocity * ratio, wet1 = Length - (u1 * Delay);
        if (t <= Delay)
        {
            double onset = (Velocity * Delay) + ((u1 - Velocity) * t), wet = Length - onset;
            return Answer(onset, u1 + (Expansion * wet), 1 + (Expansion * wet / Velocity));
        }

        double e = Math.Exp(Expansion * (t - Delay)), end = 1 + (Expansion * wet1 / u1), speed = u1 + (Expansion * wet1);
        return Answer(u1 * Delay, speed, e < end ? (speed - ((u1 - Velocity) * e)) / Velocity : end);
    }

    /// <summary>Heat times <paramref name="ratio"/>.</summary>
    public static ChannelAnswer HeatStep(double ratio, double t)
    {
        double delay = Delay / ratio, expansion = ratio * Expansion, wet1 = Length - (Velocity * delay);
        if (t <= delay)
        {
            double onset = Velocity * (Delay - ((ratio - 1) * t)), wet = Length - onset;
            return Answer(onset, Velocity + (expansion * wet), 1 + (Expansion * wet / Velocity));
        }

        double e = Math.Exp(expansion * (t - delay)), end = 1 + (expansion * wet1 / Velocity);
        return Answer(Velocity * delay, Velocity + (expansion * wet1), e < end ? (e * (1 - (1 / ratio))) + (end / ratio) : end);
    }

    /// <summary>Heat times <paramref name="ratio"/> on a channel that does not boil yet, since its feed lacks <paramref name="lacking"/> [J/kg]: the boundary enters from the outlet.</summary>
    /// <remarks>As <see cref="HeatStep"/> for t ≤ τ/ratio: the liquid that was in the channel at the step boils first where it is hottest.</remarks>
    public static ChannelAnswer FirstBoiling(double lacking, double ratio, double t)
    {
        double onset = Velocity * ((Delay * lacking / Lacking) - ((ratio - 1) * t)), wet = Math.Max(0, Length - onset);
        return Answer(onset, Velocity + (ratio * Expansion * wet), 1 + (Expansion * wet / Velocity));
    }

    /// <summary>Feed that lacks <paramref name="lacking"/> [J/kg] to boil, behind liquid so cold that it leaves without boiling: it boils within, and drives that liquid out.</summary>
    /// <remarks>The first of the new feed boils at t = τ, at ζ = 0 before the boundary λ = u₀τ; from there dζ/dt = u₀ + Ω ζ, and the liquid ahead of it has its velocity. All cold liquid has left when it is at the outlet.</remarks>
    public static ChannelAnswer ColdSlug(double lacking, double t)
    {
        double delay = Delay * lacking / Lacking, growth = t > delay ? Math.Exp(Expansion * (t - delay)) : 1, front = (Velocity * delay) + (Velocity / Expansion * (growth - 1));
        return front > Length ? throw new ArgumentOutOfRangeException(nameof(t), t, "The front has left.") : Answer(Velocity * delay, Velocity * growth, 1);
    }

    /// <summary>Feed that lacks <paramref name="lacking"/> [J/kg] to boil in place of <see cref="Lacking"/>.</summary>
    public static ChannelAnswer FeedStep(double lacking, double t)
    {
        double delay = Delay * lacking / Lacking, first = Math.Min(Delay, delay), last = Math.Max(Delay, delay);
        double end = 1 + (Expansion * (Length - (Velocity * delay)) / Velocity);
        if (t <= first) return Answer(Velocity * Delay, Velocity + (Expansion * (Length - (Velocity * Delay))), 1 + (Expansion * (Length - (Velocity * Delay)) / Velocity));
        double e0 = Math.Exp(Expansion * (t - Delay)), e1 = Math.Exp(Expansion * (t - delay));
        if (t < last && delay > Delay)
        {
            double wet = Length - (Velocity * t);
            return Answer(Velocity * t, Velocity + (Expansion * wet), e0 + (Expansion * wet / Velocity));
        }

        if (t < last)
        {
            // A second boiling zone below a slug of liquid; the answer's onset is the lower one.
            double upper = (Velocity * (Delay + delay - t)) + (Velocity / Expansion * (e1 - 1));
            return Answer(Velocity * delay, (Velocity * e1) + (Expansion * (Length - upper)), 1 + (Expansion * (Length - upper) / Velocity));
        }

        return Answer(Velocity * delay, Velocity * end, e1 < end ? end + e0 - e1 : end);
    }

    /// <summary>Outlet flow over inlet flow for an inlet flow that swings with an angular frequency: (1 + Ω K) e^(−Ω θ), K = e^(−pτ) (e^((Ω−p) θ) − 1)/(Ω − p), p = iω, θ time of boiling water in the channel.</summary>
    public static Complex FlowResponse(double angularFrequency)
    {
        var p = new Complex(0, angularFrequency);
        double boiling = Math.Log(1 + (Expansion * (Length - (Velocity * Delay)) / Velocity)) / Expansion;
        Complex k = Complex.Exp(-p * Delay) * (Complex.Exp((Expansion - p) * boiling) - 1) / (Expansion - p);
        return (1 + (Expansion * k)) * Math.Exp(-Expansion * boiling);
    }

    private static ChannelAnswer Answer(double onset, double speed, double volumes) =>
        new(onset, speed / (volumes * LiquidVolume), (volumes - 1) * LiquidVolume / (VapourVolume - LiquidVolume));
}
