using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>One point of a heat flux shape: how strong the flux is, relative to other points, at a place along a section.</summary>
public readonly record struct FluxPoint
{
    /// <summary>A point of the shape.</summary>
    /// <param name="position">Share of the section's length from its inlet, 0 to 1.</param>
    /// <param name="relativeFlux">Flux relative to the other points; only ratios count. Not negative.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    public FluxPoint(Ratio position, double relativeFlux)
    {
        RawPosition = Require.Within(position.Si(), 0, 1, "Position of a flux point", Scale.None, nameof(position));
        RelativeFlux = Require.NotNegative(relativeFlux, "Relative flux", Scale.None, nameof(relativeFlux));
    }

    /// <summary>Share of the section's length from its inlet.</summary>
    public Ratio Position => Ratio.FromDecimalFractions(RawPosition);

    /// <summary>Flux relative to the other points.</summary>
    public double RelativeFlux { get; }

    internal double RawPosition { get; }
}
