using TwoPhase.Passes;
using TwoPhase.Units;

namespace TwoPhase.Json;

/// <summary>Return bends of a section: <c>{ "count": 19, "radius": "120 mm", "lossCoefficient": 0.3 }</c>.</summary>
internal sealed class BendsDocument
{
    public int? Count { get; set; }

    public string? Radius { get; set; }

    public double? LossCoefficient { get; set; }

    public static BendsDocument? Of(TubeSection section) => section.ReturnBends == 0 && section.RawBendRadius == 0 && section.BendLossCoefficient == 0 ? null : new()
    {
        Count = section.ReturnBends,
        Radius = QuantityText.Millimetres(section.RawBendRadius),
        LossCoefficient = section.BendLossCoefficient,
    };

    public TubeSection Add(TubeSection section, Place place) => section.WithReturnBends(
        place.Member("count").Required(Count),
        place.Member("radius").Length(Radius),
        place.Member("lossCoefficient").Required(LossCoefficient));
}
