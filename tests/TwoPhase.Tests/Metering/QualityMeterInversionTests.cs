using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

/// <summary>Every meter with every model, there and back: what one direction says the others give again.</summary>
public class QualityMeterInversionTests
{
    // Residual 1e-12 of every inversion; quality to 1e-10 where one root exists and ∂lnΔp/∂x ≥ 0.05.
    [Property(MaxTest = 50)]
    public Property Directions_EveryMeterAndModel_InvertEachOther() => Prop.ForAll(Cases(0, 1).ToArbitrary(), c =>
    {
        foreach (QualityMeter meter in Meters(c))
        {
            if (c.Quality.DecimalFractions < 0.1 && meter.Model == WetSteamModel.SmithLeang) continue;   // below its range
            Pressure differential = meter.Differential(c.Flow, c.Pressure, c.Quality);
            Approx.Relative(c.Flow.KilogramsPerSecond, meter.TotalFlow(c.Pressure, c.Quality, differential).KilogramsPerSecond, 2e-12, meter.ToString());

            QualityReading reading = meter.Quality(c.Flow, c.Pressure, differential);
            Approx.Relative(differential.Pascals, meter.Differential(c.Flow, c.Pressure, reading.Quality).Pascals, 2e-12, meter.ToString());
            bool oneRoot = (reading.Applicability.Exceeded & ApplicabilityLimits.SecondRoot) == 0;
            if (oneRoot && Slope(meter, c) >= 0.05)
                Approx.Absolute(c.Quality.DecimalFractions, reading.Quality.DecimalFractions, 1e-10, meter.ToString());
            else if (!oneRoot)
                Assert.True(reading.Quality.DecimalFractions <= c.Quality.DecimalFractions + 1e-9);
        }
    });

    // Dry steam itself is then the second quality, give or take a rounding: the lower one is returned and the flag must not hang on it.
    [Fact]
    public void Quality_DryReadingThatAlsoFitsWetSteam_IsFlagged()
    {
        var venturi = new ClassicalVenturi(Length.FromMillimeters(110), Length.FromMillimeters(77), ConvergentFinish.Machined);
        var meter = new QualityMeter(venturi, WetSteamModel.ReaderHarrisGraham);
        MassFlow flow = MassFlow.FromKilogramsPerSecond(2.27);
        Pressure pressure = Pressure.FromKilopascals(11_362), dry = meter.Differential(flow, pressure, MassFraction.FromDecimalFractions(1));
        foreach (double factor in new[] { 1 - 1e-15, 1, 1 + 1e-15 })
        {
            QualityReading reading = meter.Quality(flow, pressure, dry * factor);
            Assert.InRange(reading.Quality.DecimalFractions, 0.92, 0.95);
            Assert.True(reading.Applicability.Exceeded.HasFlag(ApplicabilityLimits.SecondRoot));
        }
    }

    [Property(MaxTest = 25)]
    public Property Directions_ContinuedOutsideTheFormula_StillInvert() => Prop.ForAll(Cases(1, 1.6).ToArbitrary(), c =>
    {
        foreach (QualityMeter meter in Meters(c))
        {
            Pressure differential = meter.Differential(c.Flow, c.Pressure, c.Quality);
            Approx.Relative(c.Flow.KilogramsPerSecond, meter.TotalFlow(c.Pressure, c.Quality, differential).KilogramsPerSecond, 2e-12, meter.ToString());
            QualityReading reading = meter.Quality(c.Flow, c.Pressure, differential);
            if ((reading.Applicability.Exceeded & ApplicabilityLimits.SecondRoot) == 0)
                Approx.Absolute(c.Quality.DecimalFractions, reading.Quality.DecimalFractions, 1e-10, meter.ToString());
        }
    });

    // Below its lowest quality every model goes on at the homogeneous slope, here until half of its volume is left.
    [Property(MaxTest = 25)]
    public Property Directions_ContinuedBelowTheFormula_StillInvert() => Prop.ForAll(Cases(0, 0.5).ToArbitrary(), c =>
    {
        TwoPhase.Steam.Saturation steam = TwoPhase.Steam.Saturation.FromPressure(c.Pressure);
        MeterState state = new() { LiquidDensity = steam.Liquid.Density.KilogramsPerCubicMeter, VapourDensity = steam.Vapour.Density.KilogramsPerCubicMeter };
        double slope = (1 / state.VapourDensity) - (1 / state.LiquidDensity);
        foreach (QualityMeter meter in Meters(c))
        {
            // A model of the Froude number has the volume of water at x = 0.
            double low = meter.Model.LowestQuality, atLow = meter.Model.NeedsGeometry ? 1 / state.LiquidDensity : 1 / WetSteamModelTests.Density(meter.Model, state, low);
            double x = low - (c.Quality.DecimalFractions * atLow / slope);
            MassFraction quality = MassFraction.FromDecimalFractions(x);
            Pressure differential = meter.Differential(c.Flow, c.Pressure, quality);
            Approx.Relative(c.Flow.KilogramsPerSecond, meter.TotalFlow(c.Pressure, quality, differential).KilogramsPerSecond, 2e-12, meter.ToString());
            QualityReading reading = meter.Quality(c.Flow, c.Pressure, differential);
            Approx.Absolute(x, reading.Quality.DecimalFractions, 1e-10, meter.ToString());
            Assert.Equal(reading.Quality.DecimalFractions < 0 ? ReadingStatus.SubcooledOutlet : ReadingStatus.WetSteam, reading.Status);
        }
    });

    // The formula and its continuation meet at both ends: a quality 1e-12 to either side has the same differential. C of ISO/TR 11583 goes as the root of 1 − x.
    [Property(MaxTest = 25)]
    public Property Differential_AtBothEndsOfTheFormula_IsContinuous() => Prop.ForAll(Cases(0, 1).ToArbitrary(), c =>
    {
        foreach (QualityMeter meter in Meters(c))
        {
            foreach (double end in new[] { meter.Model.LowestQuality, 1 })
            {
                double At(double x) => meter.Differential(c.Flow, c.Pressure, MassFraction.FromDecimalFractions(x)).Pascals;
                Approx.Relative(At(end - 1e-12), At(end + 1e-12), 1e-6, meter.ToString());
            }
        }
    });

    [Property(MaxTest = 25)]
    public Property Quality_OfASmallerDifferential_IsLower() => Prop.ForAll(Cases(0.1, 0.9).ToArbitrary(), c =>
    {
        foreach (QualityMeter meter in Meters(c))
        {
            Pressure differential = meter.Differential(c.Flow, c.Pressure, c.Quality);
            double Read(double factor) => meter.Quality(c.Flow, c.Pressure, Pressure.FromPascals(differential.Pascals * factor)).Quality.DecimalFractions;
            Assert.True(Read(0.97) < Read(1) && Read(1) < Read(1.03), meter.ToString());
        }
    });

    // ṁ²/Δp is all that a model without Froude or Reynolds number sees, once no expansibility comes between.
    [Property(MaxTest = 25)]
    public Property Quality_FlowAndRootOfDifferentialScaledTogether_Stays() => Prop.ForAll(Cases(0.05, 1).ToArbitrary(), Gen.Choose(5, 40).ToArbitrary(), (c, tenths) =>
    {
        double factor = tenths / 20.0;
        foreach (WetSteamModel model in WetSteamModel.All.Where(model => !model.NeedsGeometry))
        {
            var meter = new QualityMeter(QualityMeterTests.SiteConstant(), model);
            double first = meter.Quality(c.Flow, c.Pressure, Pressure.FromKilopascals(30)).Quality.DecimalFractions;
            double second = meter.Quality(c.Flow * factor, c.Pressure, Pressure.FromKilopascals(30 * factor * factor)).Quality.DecimalFractions;
            Approx.Absolute(first, second, 1e-12 * Math.Max(1, Math.Abs(first)), model.Name);
        }
    });

    // The tube twice as large with four times the flow has the same differential, where neither Froude nor Reynolds number enters.
    [Property(MaxTest = 25)]
    public Property Quality_LargerTubeAtTheSameMassFlux_Stays() => Prop.ForAll(Cases(0.1, 0.95).ToArbitrary(), c =>
    {
        var small = new QualityMeter(new ClassicalVenturi(c.Pipe, c.Throat, ConvergentFinish.Machined), WetSteamModel.Homogeneous);
        var large = new QualityMeter(new ClassicalVenturi(c.Pipe * 2, c.Throat * 2, ConvergentFinish.Machined), WetSteamModel.Homogeneous);
        Pressure differential = small.Differential(c.Flow, c.Pressure, c.Quality);
        Approx.Absolute(c.Quality.DecimalFractions, large.Quality(c.Flow * 4, c.Pressure, differential).Quality.DecimalFractions, 1e-11);
    });

    // The same Froude number in a tube of another size: flow as the diameter to the power of 2.5.
    [Property(MaxTest = 50)]
    public Property EffectiveDensity_LargerTubeAtTheSameFroudeNumber_Stays() => Prop.ForAll(WetSteamModelTests.States().ToArbitrary(), Gen.Choose(5, 40).ToArbitrary(), Gen.Choose(10, 100).ToArbitrary(), (state, tenths, percent) =>
    {
        double scale = tenths / 10.0, x = percent / 100.0;
        MeterState larger = state with { PipeDiameter = scale * state.PipeDiameter, ThroatDiameter = scale * state.ThroatDiameter, TotalMassFlow = Math.Pow(scale, 2.5) * state.TotalMassFlow };
        foreach (WetSteamModel model in WetSteamModel.All)
        {
            Approx.Relative(WetSteamModelTests.Density(model, state, x), WetSteamModelTests.Density(model, larger, x), 1e-12, model.Name);
            Approx.Relative(model.DischargeCoefficientCore(state, x), model.DischargeCoefficientCore(larger, x), 1e-12, model.Name);
        }
    });

    [Property(MaxTest = 25)]
    public Property Directions_ImperialAndSiDoors_Agree() => Prop.ForAll(Cases(0.1, 0.9).ToArbitrary(), c =>
    {
        var meter = new QualityMeter(new ClassicalVenturi(c.Pipe, c.Throat, ConvergentFinish.Machined), WetSteamModel.ReaderHarrisGraham);
        var imperial = new QualityMeter(new ClassicalVenturi(Length.FromInches(c.Pipe.Meters / 0.0254), Length.FromInches(c.Throat.Meters / 0.0254), ConvergentFinish.Machined), WetSteamModel.ReaderHarrisGraham);
        Pressure differential = meter.Differential(c.Flow, c.Pressure, c.Quality);
        const double psi = 6894.757293168361;   // exact to the digits of a double: 0.45359237 · 9.80665 / 0.0254²
        QualityReading si = meter.Quality(c.Flow, c.Pressure, differential);
        QualityReading other = imperial.Quality(
            MassFlow.FromPoundsPerHour(c.Flow.KilogramsPerSecond * 3600 / 0.45359237),
            Pressure.FromPoundsForcePerSquareInch(c.Pressure.Pascals / psi),
            Pressure.FromPoundsForcePerSquareInch(differential.Pascals / psi));
        Approx.Absolute(si.Quality.DecimalFractions, other.Quality.DecimalFractions, 1e-12);

        MassFraction quality = MassFraction.FromPercent(100 * c.Quality.DecimalFractions);
        Pressure back = imperial.Differential(MassFlow.FromPoundsPerHour(c.Flow.KilogramsPerSecond * 3600 / 0.45359237), Pressure.FromPoundsForcePerSquareInch(c.Pressure.Pascals / psi), quality);
        Approx.Relative(differential.Pascals, back.Pascals, 1e-12);
        MassFlow total = imperial.TotalFlow(Pressure.FromPoundsForcePerSquareInch(c.Pressure.Pascals / psi), quality, Pressure.FromPoundsForcePerSquareInch(differential.Pascals / psi));
        Approx.Relative(c.Flow.KilogramsPerSecond, total.KilogramsPerSecond, 2e-12);
    });

    private static double Slope(QualityMeter meter, in Case c)
    {
        double x = c.Quality.DecimalFractions, low = Math.Max(meter.Model.LowestQuality, x - 1e-5), high = Math.Min(1, x + 1e-5);
        double Log(double quality, in Case at) => Math.Log(meter.Differential(at.Flow, at.Pressure, MassFraction.FromDecimalFractions(quality)).Pascals);
        return (Log(high, c) - Log(low, c)) / (high - low);
    }

    private static IEnumerable<QualityMeter> Meters(Case c)
    {
        DifferentialPressureMeter[] meters =
        [
            new ClassicalVenturi(c.Pipe, c.Throat, ConvergentFinish.Machined),
            new OrificePlate(c.Pipe, c.Throat, OrificeTappings.Flange),
            new Isa1932Nozzle(c.Pipe, c.Throat),
            new LongRadiusNozzle(c.Pipe, c.Throat),
            new VenturiNozzle(c.Pipe, c.Throat),
            new SiteConstantMeter(c.Throat * c.Throat),
        ];
        return meters.SelectMany(meter => WetSteamModel.All.Where(model => meter.HasGeometry || !model.NeedsGeometry).Select(model => new QualityMeter(meter, model)));
    }

    private static Gen<Case> Cases(double lowest, double highest) =>
        from kilopascals in Gen.Choose(500, 20000)
        from millimetres in Gen.Choose(50, 150)
        from beta in Gen.Choose(50, 75)
        from flux in Gen.Choose(100, 1000)
        from quality in Gen.Choose(0, 10000)
        let pipe = millimetres * 1e-3
        // The flux falls with the pressure, so that the differential stays a small part of it.
        let scaled = flux * Math.Sqrt(Math.Min(1, kilopascals / 10000.0))
        select new Case(
            MassFlow.FromKilogramsPerSecond(scaled * Math.Sqrt(Math.Min(1, kilopascals / 10000.0)) * Math.PI / 4 * pipe * pipe),
            Pressure.FromKilopascals(kilopascals),
            MassFraction.FromDecimalFractions(lowest + ((highest - lowest) * quality / 10000)),
            Length.FromMeters(pipe),
            Length.FromMeters(pipe * beta / 100));

    private readonly record struct Case(MassFlow Flow, Pressure Pressure, MassFraction Quality, Length Pipe, Length Throat);
}
