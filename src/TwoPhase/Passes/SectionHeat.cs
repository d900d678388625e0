using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>The heat of one section: its share of the pass's absorbed heat, and how the flux runs along it.</summary>
public sealed class SectionHeat
{
    private readonly FluxPoint[] _shape;

    /// <summary>Heat of one section.</summary>
    /// <param name="section">Name of the section.</param>
    /// <param name="share">Its share of the heat absorbed by the pass, 0 to 1.</param>
    /// <param name="shape">Flux shape, linear between points from inlet (0) to outlet (1); none for uniform flux.</param>
    /// <exception cref="ArgumentOutOfRangeException">The share is outside 0 to 1.</exception>
    /// <exception cref="ArgumentException">The shape does not run from 0 to 1 with rising positions, or is zero everywhere.</exception>
    public SectionHeat(string section, Ratio share, params FluxPoint[] shape)
    {
        Section = Require.NotNull(section, nameof(section));
        RawShare = Require.Within(share.Si(), 0, 1, $"Heat share of section '{section}'", Scale.None, nameof(share));
        _shape = (FluxPoint[])Require.NotNull(shape, nameof(shape)).Clone();
        Curve = _shape.Length == 0 ? FluxCurve.Uniform : FluxCurve.Through(_shape, section, nameof(shape));
    }

    /// <summary>Name of the section.</summary>
    public string Section { get; }

    /// <summary>Share of the heat absorbed by the pass.</summary>
    public Ratio Share => Ratio.FromDecimalFractions(RawShare);

    /// <summary>Flux shape; empty for uniform flux.</summary>
    public IReadOnlyList<FluxPoint> Shape => _shape;

    internal double RawShare { get; }

    internal FluxCurve Curve { get; }

    internal SectionHeat WithShare(double share) => new(Section, Ratio.FromDecimalFractions(share), _shape);
}
