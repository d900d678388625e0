using TwoPhase.Metering;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Json;

/// <summary>An outlet meter: <c>{ "kind": "classicalVenturi", "pipe": "77.9 mm", "throat": "49.0 mm", "finish": "machined" }</c>.</summary>
internal sealed class MeterDocument
{
    private const string Venturi = "classicalVenturi", Orifice = "orificePlate", Isa = "isa1932Nozzle", LongRadius = "longRadiusNozzle", NozzleVenturi = "venturiNozzle", SiteConstant = "siteConstant";

    public string? Kind { get; set; }

    public string? Pipe { get; set; }

    public string? Throat { get; set; }

    public string? Finish { get; set; }

    public string? Tappings { get; set; }

    public string? K { get; set; }

    /// <summary>C in place over C of the standard; 1 when left out.</summary>
    public double? CalibrationFactor { get; set; }

    public ColdDocument? MeasuredCold { get; set; }

    public static MeterDocument Of(DifferentialPressureMeter meter) => meter switch
    {
        SiteConstantMeter site => new() { Kind = SiteConstant, K = QuantityText.Write(site.K.Si(), "mm2", UnitKind.Area, "m2") },
        ClassicalVenturi venturi => OfElement(venturi, Venturi, finish: Names.Of(venturi.Finish)),
        OrificePlate plate => OfElement(plate, Orifice, tappings: Names.Of(plate.Tappings)),
        Isa1932Nozzle nozzle => OfElement(nozzle, Isa),
        LongRadiusNozzle nozzle => OfElement(nozzle, LongRadius),
        VenturiNozzle nozzle => OfElement(nozzle, NozzleVenturi),
        _ => throw new NotSupportedException($"A document has no form for a {meter.Name}."),
    };

    public DifferentialPressureMeter Read(Place place)
    {
        string kind = place.Member("kind").Required(Kind);
        if (kind == SiteConstant)
        {
            double k = place.Member("k").Quantity(K, UnitKind.Area);
            return place.Member("k").Make(() => new SiteConstantMeter(Area.FromSquareMeters(k)));
        }

        Func<Length, Length, PrimaryElement> make = kind switch
        {
            Venturi => Venturis(place),
            Orifice => Plates(place),
            Isa => (pipe, throat) => new Isa1932Nozzle(pipe, throat),
            LongRadius => (pipe, throat) => new LongRadiusNozzle(pipe, throat),
            NozzleVenturi => (pipe, throat) => new VenturiNozzle(pipe, throat),
            _ => throw place.Member("kind").Fault($"'{kind}' is none of {Venturi}, {Orifice}, {Isa}, {LongRadius}, {NozzleVenturi}, {SiteConstant}"),
        };
        Length pipe = place.Member("pipe").Length(Pipe), throat = place.Member("throat").Length(Throat);
        return new Change<PrimaryElement>(place, place.Member("throat").Make(() => make(pipe, throat)))
            .With("measuredCold", MeasuredCold, (it, cold, at) => cold.Add(it, at))
            .With("calibrationFactor", CalibrationFactor, (it, factor, _) => it.Calibrated(factor!.Value))
            .Made;
    }

    private Func<Length, Length, PrimaryElement> Venturis(Place place)
    {
        ConvergentFinish finish = Names.Read<ConvergentFinish>(Finish, place.Member("finish"));
        return (pipe, throat) => new ClassicalVenturi(pipe, throat, finish);
    }

    private Func<Length, Length, PrimaryElement> Plates(Place place)
    {
        OrificeTappings tappings = Names.Read<OrificeTappings>(Tappings, place.Member("tappings"));
        return (pipe, throat) => new OrificePlate(pipe, throat, tappings);
    }

    private static MeterDocument OfElement(PrimaryElement element, string kind, string? finish = null, string? tappings = null) => new()
    {
        Kind = kind,
        Pipe = QuantityText.Millimetres(element.PipeDiameter.Si()),
        Throat = QuantityText.Millimetres(element.ThroatDiameter.Si()),
        Finish = finish,
        Tappings = tappings,
        CalibrationFactor = element.CalibrationFactor == 1 ? null : element.CalibrationFactor,
        MeasuredCold = ColdDocument.Of(element),
    };
}
