using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Slip;

/// <summary>Vgj of the drift-flux model: velocity of the vapour against that of the mixture's volume, averaged over the tube.</summary>
/// <remarks>
/// <para>Upflow and level flow; the laws do not turn their sign in downflow.</para>
/// <para>A law of your own derives from this class and overrides <see cref="Core"/>.</para>
/// </remarks>
public abstract class DriftVelocity
{
    private delegate double Law(in FlowState flow);

    /// <summary>No drift: Vgj = 0.</summary>
    public static DriftVelocity None { get; } = new Formula("no drift", static (in FlowState _) => 0);

    /// <summary>Rouhani and Axelsson (1970), with the factor that lets drift vanish with the liquid: Vgj = 1.18 (1 − x) u, u = [g σ (ρl − ρg)/ρl²]^(1/4).</summary>
    public static DriftVelocity RouhaniAxelsson { get; } =
        new Formula("drift of Rouhani-Axelsson", static (in FlowState flow) => 1.18 * (1 - flow.Quality) * BubbleVelocity(flow));

    /// <summary>Rouhani and Axelsson (1970) for vertical tubes: Vgj = 1.18 u, u = [g σ (ρl − ρg)/ρl²]^(1/4).</summary>
    public static DriftVelocity RouhaniAxelssonVertical { get; } =
        new Formula("drift of Rouhani-Axelsson, vertical", static (in FlowState flow) => 1.18 * BubbleVelocity(flow));

    /// <summary>Churn-turbulent bubbly flow, Zuber and Findlay (1965): Vgj = 1.41 u, u = [g σ (ρl − ρg)/ρl²]^(1/4).</summary>
    public static DriftVelocity Churn { get; } =
        new Formula("drift of churn flow", static (in FlowState flow) => 1.41 * BubbleVelocity(flow));

    /// <summary>Bubbly flow, Harmathy (1960): Vgj = 1.53 u, u = [g σ (ρl − ρg)/ρl²]^(1/4).</summary>
    public static DriftVelocity Bubbly { get; } =
        new Formula("drift of bubbly flow", static (in FlowState flow) => 1.53 * BubbleVelocity(flow));

    /// <summary>Slug flow in vertical tubes, Zuber and Findlay (1965): Vgj = 0.35 [g D (ρl − ρg)/ρl]^(1/2).</summary>
    public static DriftVelocity Slug { get; } = new Formula(
        "drift of slug flow",
        static (in FlowState flow) => 0.35 * Fast.Sqrt(SiDoor.StandardGravity * flow.Bore * (flow.LiquidDensity - flow.VapourDensity) / flow.LiquidDensity));

    /// <summary>Dix (1971): Vgj = 2.9 u, u = [g σ (ρl − ρg)/ρl²]^(1/4).</summary>
    public static DriftVelocity Dix { get; } =
        new Formula("drift of Dix", static (in FlowState flow) => 2.9 * BubbleVelocity(flow));

    /// <summary>Bestion (1990): Vgj = 0.188 [g D (ρl − ρg)/ρg]^(1/2).</summary>
    public static DriftVelocity Bestion { get; } = new Formula(
        "drift of Bestion",
        static (in FlowState flow) => 0.188 * Fast.Sqrt(SiDoor.StandardGravity * flow.Bore * (flow.LiquidDensity - flow.VapourDensity) / flow.VapourDensity));

    /// <summary>The name of the law.</summary>
    public abstract string Name { get; }

    /// <summary>A fixed Vgj.</summary>
    /// <param name="value">Vgj, not negative.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="value"/> is negative.</exception>
    public static DriftVelocity Constant(Speed value)
    {
        var scale = new Scale("m/s", 1);
        double metresPerSecond = Require.NotNegative(value.Si(), "Drift velocity", scale, nameof(value));
        return new Formula($"drift {scale.Text(metresPerSecond)}", (in FlowState _) => metresPerSecond);
    }

    /// <summary>Vgj for a flow.</summary>
    /// <param name="flow">The flow.</param>
    public Speed Of(in TwoPhaseFlow flow) => Speed.FromMetersPerSecond(Core(flow.State));

    /// <summary>Vgj [m/s] for a raw flow; SI in, arguments trusted, no allocation.</summary>
    /// <param name="flow">The flow in SI units.</param>
    protected internal abstract double Core(in FlowState flow);

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    /// <summary>u = [g σ (ρl − ρg)/ρl²]^(1/4) [m/s], the velocity on which the rise of bubbles in boiling liquids scales.</summary>
    private static double BubbleVelocity(in FlowState flow) =>
        Fast.Sqrt(Fast.Sqrt(SiDoor.StandardGravity * flow.SurfaceTension * (flow.LiquidDensity - flow.VapourDensity)) * (1 / flow.LiquidDensity));

    private sealed class Formula(string name, Law law) : DriftVelocity
    {
        public override string Name => name;

        protected internal override double Core(in FlowState flow) => law(flow);
    }
}
