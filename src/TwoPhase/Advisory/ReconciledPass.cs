using TwoPhase.Uncertainty;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>One pass of a reconciled generator; null where the measurements do not determine a value.</summary>
public sealed class ReconciledPass
{
    internal ReconciledPass(string name, UncertainValue<MassFlow>? feedFlow, UncertainValue<MassFraction>? outletQuality, UncertainValue<Power>? absorbedHeat) =>
        (Name, FeedFlow, OutletQuality, AbsorbedHeat) = (name, feedFlow, outletQuality, absorbedHeat);

    /// <summary>Name of the pass.</summary>
    public string Name { get; }

    /// <summary>Feed flow.</summary>
    public UncertainValue<MassFlow>? FeedFlow { get; }

    /// <summary>Quality at the outlet.</summary>
    public UncertainValue<MassFraction>? OutletQuality { get; }

    /// <summary>Heat absorbed.</summary>
    public UncertainValue<Power>? AbsorbedHeat { get; }

    internal object ToDump() => ToString();

    /// <summary>Name and values, invariant culture.</summary>
    public override string ToString() => $"pass '{Name}': feed {Text(FeedFlow)}, quality {Text(OutletQuality)}, heat {Text(AbsorbedHeat)}";

    private static string Text<TQuantity>(UncertainValue<TQuantity>? value)
        where TQuantity : struct => value?.ToString() ?? "not determined";
}
