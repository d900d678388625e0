using System.Globalization;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Limits;

/// <summary>Where a pass first reaches a correlated critical quality, or comes nearest to it; how far it goes beyond; and the metal that would lead to.</summary>
public readonly record struct CriticalPlace
{
    private readonly double _quality, _critical, _dryMetal, _hotter;

    internal CriticalPlace(bool isReached, string section, in PassNode first, double quality, double critical, double dryMetal, double hotter) =>
        (IsReached, Section, Node, _quality, _critical, _dryMetal, _hotter) = (isReached, section, first, quality, critical, dryMetal, hotter);

    /// <summary>True where quality reaches the critical one; false where it only comes nearest here.</summary>
    public bool IsReached { get; }

    /// <summary>Name of the section.</summary>
    public string Section { get; }

    /// <summary>Distance from the inlet of the pass.</summary>
    public Length Position => Length.FromMeters(Node.Position);

    /// <summary>Quality of the flow where it is furthest beyond the critical one, or nearest below.</summary>
    public MassFraction Quality => MassFraction.FromDecimalFractions(_quality);

    /// <summary>Critical quality at that same place.</summary>
    public MassFraction CriticalQuality => MassFraction.FromDecimalFractions(_critical);

    /// <summary>Outside metal at the hottest place that would then be dry, by <see cref="HeatTransfer.FilmModel.DougallRohsenow"/>.</summary>
    public Temperature DryMetal => Temperature.FromKelvins(_dryMetal);

    /// <summary>How much hotter that is than with a wet wall at the same place.</summary>
    public TemperatureDelta HotterBy => TemperatureDelta.FromKelvins(_hotter);

    internal PassNode Node { get; }

    internal double RawQuality => _quality;

    internal double RawCritical => _critical;

    internal object ToDump() => ToString();

    /// <summary>The place in a line, invariant culture.</summary>
    public override string ToString() => string.Format(
        CultureInfo.InvariantCulture, "{0} {1:F0} m; dry metal would be {2:F0} °C, {3:F0} K hotter", IsReached ? "reached from" : "nearest at", Node.Position, _dryMetal - 273.15, _hotter);
}
