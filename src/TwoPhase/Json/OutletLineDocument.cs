using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>The line between tube end and the place where the outlet pressure is measured: <c>{ "bore": "73.7 mm", "lossCoefficient": 3, "volume": "0.08 m3" }</c>.</summary>
internal sealed class OutletLineDocument
{
    public string? Bore { get; set; }

    public double? LossCoefficient { get; set; }

    public string? Volume { get; set; }

    public bool? NonReturnValve { get; set; }

    public bool? MeterAtTubeEnd { get; set; }

    public static OutletLineDocument? Of(OutletLine? line) => line is null ? null : new()
    {
        Bore = QuantityText.Millimetres(line.RawBore),
        LossCoefficient = line.LossCoefficient,
        Volume = QuantityText.Write(line.RawVolume, "m3", UnitKind.Volume, "m3"),
        NonReturnValve = line.HasNonReturnValve ? true : null,
        MeterAtTubeEnd = line.IsMeterAtTubeEnd ? true : null,
    };

    public OutletLine Read(Place place)
    {
        OutletLine line = new(
            place.Member("bore").Length(Bore),
            place.Member("lossCoefficient").Required(LossCoefficient),
            UnitsNet.Volume.FromCubicMeters(place.Member("volume").Quantity(Volume, UnitKind.Volume)));
        if (NonReturnValve == true) line = line.WithNonReturnValve();
        return MeterAtTubeEnd == true ? line.WithMeterAtTubeEnd() : line;
    }
}
