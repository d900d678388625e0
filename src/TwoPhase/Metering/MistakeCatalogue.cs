using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>The common mistakes, each with its usual size and what it does to a reading.</summary>
internal static class MistakeCatalogue
{
    private const double LegDensity = 992.2;   // kg/m³, water at 40 °C

    public static readonly IReadOnlyList<MistakeEntry> Entries =
    [
        new(ReadingMistake.GaugeForAbsolute, "gauge pressure taken as absolute", "compare the transmitter's range and the scaling in the control system with a gauge at the same tapping",
            (reading, _) => new ReadingDistortion { PressureShift = -reading.Setup.Atmosphere }),

        new(ReadingMistake.HeaderPressure, "pressure of the header taken for that at the meter", "read both pressures at full load",
            (_, megapascals) => new ReadingDistortion { PressureShift = -megapascals * 1e6 })
        { Unit = "MPa lower", UsualAmount = 0.1, LeastAmount = 0, GreatestAmount = 1 },

        new(ReadingMistake.ColdBore, "diameters measured cold and used hot", "see whether the calculation corrects bore and pipe for temperature",
            (reading, _) => reading.Element is { IsMeasuredCold: false } ? new ReadingDistortion { DifferentialFactor = 1 / reading.Growth } : null)
        { Source = "thermal expansion of the setup, carbon steel 12e-6 1/K by default (common practice, no source)" },

        new(ReadingMistake.ThroatScale, "scale on the wall of the throat", "inspect or gauge the throat at the next outage; until then, watch whether the same pass drifts alone",
            Scale)
        { Unit = "mm thick", UsualAmount = 0.05, LeastAmount = 0, GreatestAmount = 1 },

        new(ReadingMistake.FeedDensity, "feed meter ranged for another density of water", "compare the density constant on the data sheet with the feed temperature",
            (reading, _) => FeedDensity(reading.Setup)),

        new(ReadingMistake.FeedScale, "feed meter reads high", "compare the sum of the passes with the total feed",
            (_, percent) => new ReadingDistortion { FlowFactor = 1 + (percent / 100) })
        { Unit = "% of reading", UsualAmount = 1, LeastAmount = -20, GreatestAmount = 20 },

        new(ReadingMistake.RootTwice, "square root extracted twice", "compare output and differential at a quarter of the span: one root gives half of the output",
            (reading, _) => Root(reading, 0.5)),

        new(ReadingMistake.RootMissing, "square root missing", "compare output and differential at a quarter of the span: one root gives half of the output",
            (reading, _) => Root(reading, 2)),

        new(ReadingMistake.UnequalLegs, "high-pressure leg with more cold water than the low-pressure leg, or a zero that has moved", "check the zero with the manifold equalised, both legs full and cold; legs and pots are hot and pressurised",
            (reading, metres) => new ReadingDistortion { DifferentialShift = (LegDensity - reading.VapourDensity) * SiDoor.StandardGravity * metres })
        { Unit = "m of water", UsualAmount = 0.1, LeastAmount = -2, GreatestAmount = 2 },

        new(ReadingMistake.WrongExponent, "cp/cv taken for the isentropic exponent", "see which exponent the calculation uses: near 1.24 at 10 MPa, where cp/cv is 2.3",
            (reading, _) => reading.Element is { } element ? new ReadingDistortion { DifferentialFactor = reading.ExpansibilityRatio(element, reading.HeatCapacityRatio) } : null),

        new(ReadingMistake.MixedCoefficient, "wet discharge coefficient and dry one exchanged", "see which coefficient the calculation uses: the wet one belongs to ISO/TR 11583 alone",
            (reading, _) => reading.Meter.OtherCoefficient(reading.Raw) is { } ratio && ratio != 1 ? new ReadingDistortion { DifferentialFactor = ratio * ratio } : null),

        new(ReadingMistake.DrainHole, "drain or vent hole through the plate, left out of its bore", "see the plate's drawing, or the plate at the next outage",
            DrainHole)
        { Unit = "mm wide", UsualAmount = 3, LeastAmount = 0, GreatestAmount = 10, Source = "effective bore d (1 + 0.55 (dk/d)²) with dk the hole, ISO/TR 15377 (from memory), for holes up to d/10" },

        new(ReadingMistake.PlateReversedOrWorn, "orifice plate the wrong way round, or its edge worn", "see the stamp on the plate's handle; look at the edge at the next outage",
            (reading, percent) => reading.Element is OrificePlate ? new ReadingDistortion { DifferentialFactor = 1 - (percent / 100) } : null)
        { Unit = "% of differential lost", UsualAmount = 10, LeastAmount = 0, GreatestAmount = 20, Source = "10 % to 20 % of the differential (common practice, no source)" },
    ];

    private static ReadingDistortion? Scale(AuditedReading reading, double millimetres)
    {
        if (reading.Element is not { } element) return null;
        double pipe = element.PipeDiameter.Si(), throat = element.ThroatDiameter.Si(), scaled = throat - (2e-3 * millimetres);
        if (scaled <= throat / 2) return null;
        double ratio = new MeterGeometry(pipe, throat).FlowArea / new MeterGeometry(pipe, scaled).FlowArea;
        return new ReadingDistortion { DifferentialFactor = ratio * ratio };
    }

    private static ReadingDistortion? DrainHole(AuditedReading reading, double millimetres)
    {
        if (reading.Element is not OrificePlate plate) return null;
        double hole = millimetres * 1e-3 / plate.ThroatDiameter.Si();
        double grown = 1 + (0.55 * hole * hole);
        double ratio = new MeterGeometry(plate.PipeDiameter.Si(), plate.ThroatDiameter.Si()).FlowArea / new MeterGeometry(plate.PipeDiameter.Si(), plate.ThroatDiameter.Si() * grown).FlowArea;
        return new ReadingDistortion { DifferentialFactor = ratio * ratio };
    }

    private static ReadingDistortion? FeedDensity(AuditSetup setup)
    {
        if (setup.ActualFeedDensity is not { } actual || setup.Principle == FeedMeterPrinciple.Mass) return null;
        MassFlow unit = MassFlow.FromKilogramsPerSecond(1);
        FeedFlowMeter meter = new(setup.Principle, Density.FromKilogramsPerCubicMeter(setup.FeedBaseDensity));
        return new ReadingDistortion { FlowFactor = 1 / meter.TrueFlow(unit, Density.FromKilogramsPerCubicMeter(actual)).Si() };
    }

    private static ReadingDistortion? Root(AuditedReading reading, double power) =>
        reading.Setup.SpanCore is { } span ? new ReadingDistortion { Power = power, Span = span } : null;
}
