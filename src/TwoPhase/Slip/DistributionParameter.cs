using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Units;

namespace TwoPhase.Slip;

/// <summary>C0 of the drift-flux model: how far vapour gathers where the flow is fast; 1 for a flat profile.</summary>
/// <remarks>A law of your own derives from this class and overrides <see cref="Core"/>.</remarks>
public abstract class DistributionParameter
{
    private delegate double Law(in FlowState flow);

    /// <summary>Rouhani and Axelsson (1970): C0 = 1 + 0.2 (1 − x).</summary>
    public static DistributionParameter RouhaniAxelsson { get; } =
        new Formula("C0 of Rouhani-Axelsson", static (in FlowState flow) => 1 + (0.2 * (1 - flow.Quality)));

    /// <summary>Rouhani and Axelsson (1970), the form with mass flux: C0 = 1 + 0.2 (1 − x) (g D)^(1/4) (ρl/G)^(1/2).</summary>
    public static DistributionParameter RouhaniAxelssonMassFlux { get; } = new Formula(
        "C0 of Rouhani-Axelsson with mass flux",
        static (in FlowState flow) => 1 + (0.2 * (1 - flow.Quality) * Fast.Sqrt(Fast.Sqrt(SiDoor.StandardGravity * flow.Bore) * flow.LiquidDensity / flow.MassFlux)));

    /// <summary>Steiner's for horizontal tubes: C0 = 1 + 0.12 (1 − x).</summary>
    public static DistributionParameter Steiner { get; } =
        new Formula("C0 of Steiner", static (in FlowState flow) => 1 + (0.12 * (1 - flow.Quality)));

    /// <summary>Dix (1971): C0 = β [1 + (1/β − 1)^b], b = (ρg/ρl)^0.1, β void fraction of homogeneous flow. Falls below 1 for small β.</summary>
    public static DistributionParameter Dix { get; } = new Formula(
        "C0 of Dix",
        static (in FlowState flow) =>
        {
            // β and β (1/β − 1)^b from the volume shares, so that x = 0 needs no special case.
            double vapour = flow.Quality / flow.VapourDensity, liquid = (1 - flow.Quality) / flow.LiquidDensity;
            double b = Math.Pow(flow.VapourDensity / flow.LiquidDensity, 0.1);
            return (vapour + (vapour > 0 ? vapour * Math.Pow(liquid / vapour, b) : 0)) / (vapour + liquid);
        });

    /// <summary>The name of the law.</summary>
    public abstract string Name { get; }

    /// <summary>A fixed C0. Unless it is 1 the void fraction ends at 1/C0, and every model made with it is flagged.</summary>
    /// <param name="value">C0, greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="value"/> is not greater than zero.</exception>
    public static DistributionParameter Constant(double value)
    {
        Require.Positive(value, "Distribution parameter", Scale.None, nameof(value));
        return new Formula($"C0 = {Scale.None.Text(value)}", (in FlowState _) => value);
    }

    /// <summary>C0 for a flow.</summary>
    /// <param name="flow">The flow.</param>
    public double Of(in TwoPhaseFlow flow) => Core(flow.State);

    /// <summary>C0 for a raw flow; SI in, arguments trusted, no allocation.</summary>
    /// <param name="flow">The flow in SI units.</param>
    protected internal abstract double Core(in FlowState flow);

    /// <summary>The name.</summary>
    public override string ToString() => Name;

    private sealed class Formula(string name, Law law) : DistributionParameter
    {
        public override string Name => name;

        protected internal override double Core(in FlowState flow) => law(flow);
    }
}
