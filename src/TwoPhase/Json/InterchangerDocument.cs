using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>A feed interchanger: <c>{ "coldSection": "feed", "hotSection": "return", "conductance": "25 kW/K", "bypass": 0.1 }</c>, or <c>"effectiveness": 0.6</c> for the conductance.</summary>
internal sealed class InterchangerDocument
{
    public string? ColdSection { get; set; }

    public string? HotSection { get; set; }

    public string? Conductance { get; set; }

    public double? Effectiveness { get; set; }

    public double? Bypass { get; set; }

    public static InterchangerDocument? Of(FeedInterchanger? interchanger) => interchanger is null ? null : new()
    {
        ColdSection = interchanger.ColdSection,
        HotSection = interchanger.HotSection,
        Conductance = interchanger.WattsPerKelvin > 0 ? QuantityText.Write(interchanger.WattsPerKelvin, "kW/K", UnitKind.ThermalConductance, "W/K") : null,
        Effectiveness = interchanger.Effectiveness > 0 ? interchanger.Effectiveness : null,
        Bypass = interchanger.RawBypass > 0 ? interchanger.RawBypass : null,
    };

    public FeedInterchanger Read(Place place)
    {
        string cold = place.Member("coldSection").Required(ColdSection), hot = place.Member("hotSection").Required(HotSection);
        if (Conductance is null == Effectiveness is null) throw place.Fault("needs either a conductance or an effectiveness");
        FeedInterchanger made = Effectiveness is { } effectiveness
            ? FeedInterchanger.FromEffectiveness(cold, hot, effectiveness)
            : FeedInterchanger.FromSurface(cold, hot, HeatTransferCoefficient.FromWattsPerSquareMeterKelvin(place.Member("conductance").Quantity(Conductance, UnitKind.ThermalConductance)), Area.FromSquareMeters(1));
        return Bypass is { } bypass ? made.WithBypass(Ratio.FromDecimalFractions(bypass)) : made;
    }
}
