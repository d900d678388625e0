using System.Globalization;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>One component of a fuel gas and its share by mole.</summary>
public readonly record struct FuelShare
{
    /// <summary>A component and its share.</summary>
    /// <param name="component">Which gas.</param>
    /// <param name="share">Share by mole, 0 to 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The component is none, or the share is outside 0 to 1.</exception>
    public FuelShare(GasComponent component, Ratio share)
    {
        if (component is <= GasComponent.None or > GasComponent.Oxygen) throw new ArgumentOutOfRangeException(nameof(component), $"{component} is no component of a fuel gas.");
        Component = component;
        RawShare = Require.Within(share.Si(), 0, 1, $"Share of {component}", Scale.None, nameof(share));
    }

    /// <summary>Which gas.</summary>
    public GasComponent Component { get; }

    /// <summary>Share by mole.</summary>
    public Ratio Share => Ratio.FromDecimalFractions(RawShare);

    internal double RawShare { get; }

    internal object ToDump() => ToString();

    /// <summary>For example <c>Methane 0.95</c>; invariant.</summary>
    public override string ToString() => string.Format(CultureInfo.InvariantCulture, "{0} {1:G6}", Component, RawShare);
}
