using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.Metering;
using UnitsNet;

namespace TwoPhase.Tests.Metering;

/// <summary>The formulas of the wet-steam models alone, on rounded property values, without steam tables.</summary>
public class WetSteamModelTests
{
    // Steam at 10 MPa, rounded so that the test needs no steam properties; a 77.9 mm pipe with a 49 mm Venturi throat.
    internal static readonly MeterState Reference = new()
    {
        Pressure = 10e6,
        LiquidDensity = 688.4,
        VapourDensity = 55.45,
        IsentropicExponent = 1.238,
        TotalMassFlow = 4.8,
        PipeDiameter = 0.0779,
        ThroatDiameter = 0.049,
        DiameterRatio = 0.049 / 0.0779,
        DischargeCoefficient = 0.995,
        Expansibility = 1,
    };

    // From memory of the publications, evaluated with another program: over-reading and differential at ε = 1 for two qualities.
    // Froude numbers of that evaluation use g = 9.81 m/s², hence the tolerances.
    public static TheoryData<WetSteamModel, double, double, double, double> EvaluatedElsewhere => new()
    {
        { WetSteamModel.Homogeneous, 1.470067, 26891.68, 1.145067, 39705.84 },
        { WetSteamModel.Chisholm, 1.328340, 21956.44, 1.095132, 36318.29 },
        { WetSteamModel.Chisholm1967, 1.328340, 21956.44, 1.095132, 36318.29 },
        { WetSteamModel.Murdock, 1.357603, 22934.48, 1.100862, 36699.38 },
        { WetSteamModel.Lin, 1.283226, 20490.37, 1.079884, 35314.01 },
        { WetSteamModel.SmithLeang, 1.190221, 17627.83, 1.039099, 32696.90 },
        { WetSteamModel.DeLeeuw, 1.507358, 28273.27, 1.173695, 41716.05 },
        { WetSteamModel.ReaderHarrisGraham, 1.459299, 27789.04, 1.147167, 41212.03 },
        { WetSteamModel.ReaderHarrisGrahamWith(1.35), 1.411931, 26014.28, 1.139002, 40627.45 },
        { WetSteamModel.James, 1.273772, 20189.58, 1.083267, 35535.63 },
        { WetSteamModel.StevenOrifice, 1.342917, 22441.00, 1.105999, 37042.66 },
    };

    [Theory, MemberData(nameof(EvaluatedElsewhere))]
    public void EffectiveDensity_SteamAtTenMegapascals_GivesKnownOverReadingAndDifferential(WetSteamModel model, double overReadingHalf, double differentialHalf, double overReading, double differential)
    {
        double tolerance = model.NeedsGeometry ? 3e-5 : 1e-6;
        Approx.Relative(overReadingHalf, OverReading(model, Reference, 0.5), tolerance);
        Approx.Relative(overReading, OverReading(model, Reference, 0.78), tolerance);
        Approx.Relative(differentialHalf, Differential(model, Reference, 0.5), 2 * tolerance);
        Approx.Relative(differential, Differential(model, Reference, 0.78), 2 * tolerance);
    }

    // ISO/TR 11583:2012, example 1: C and gas flow from ε = 0.994236, as the fluids library's tests carry it. The example uses g = 9.81 m/s².
    [Fact]
    public void ReaderHarrisGraham_FirstExampleOfTheReport_GivesCoefficientAndGasFlow()
    {
        MeterState state = Example(800, 5.31926, 0.5);
        WetSteamModel model = WetSteamModel.ReaderHarrisGrahamWith(1);
        double x = 1 / 1.5;
        Approx.Relative(0.9754211, model.DischargeCoefficientCore(state, x), 3e-6);
        double gas = model.DischargeCoefficientCore(state, x) * 0.994236 * state.FlowArea() * Math.Sqrt(2 * 50 * 0.05e6) / OverReading(model, state, x);
        Approx.Relative(5.31926, gas, 5e-6);
    }

    // Example 2: water at ambient temperature (H = 1.35); the liquid flow solved back to 0.434947 kg/s by the author of that test file.
    [Fact]
    public void ReaderHarrisGraham_SecondExampleOfTheReport_GivesCoefficient()
    {
        MeterState state = Example(1000, 6.3817, 0.434947 / 6.3817);
        Approx.Relative(0.976992, WetSteamModel.ReaderHarrisGrahamWith(1.35).DischargeCoefficientCore(state, 6.3817 / (6.3817 + 0.434947)), 4e-6);
    }

    // The open-source library pvtlib, full case of its tests: C_wet and over-reading.
    [Fact]
    public void ReaderHarrisGraham_IndependentLibrary_Agrees()
    {
        double total = 30217.522925625468 / 3600 * 1.5;
        var state = new MeterState { LiquidDensity = 850, VapourDensity = 40, TotalMassFlow = total, PipeDiameter = 0.12, ThroatDiameter = 0.08, DiameterRatio = 2.0 / 3 };
        WetSteamModel model = WetSteamModel.ReaderHarrisGrahamWith(1);
        Approx.Relative(1.2250949095211476, OverReading(model, state, 2.0 / 3), 1e-5);
        Approx.Relative(0.9725727761407659, model.DischargeCoefficientCore(state, 2.0 / 3), 1e-5);
    }

    public static TheoryData<int> GridRows => [.. Enumerable.Range(0, Grid.Rows.Count)];

    private static readonly ReferenceTable Grid = ReferenceTable.Load("Metering/Data/wet-venturi.csv");

    [Theory, MemberData(nameof(GridRows))]
    public void Models_IndependentGrid_Agree(int index)
    {
        ReferenceTable.Row row = Grid.Rows[index];
        MeterState state = State(row);
        double x = row["x"];
        WetSteamModel venturi = WetSteamModel.ReaderHarrisGrahamWith(row["H"]);
        Approx.Relative(row["C"], venturi.DischargeCoefficientCore(state, x), 1e-9, "C");
        Approx.Relative(row["phi"], OverReading(venturi, state, x), 1e-9, "over-reading");
        double bare = state.TotalMassFlow / (row["C"] * row["epsilon"] * state.FlowArea());
        Approx.Relative(row["dP_Pa"], bare * bare / 2 * venturi.EffectiveVolume(state, x), 1e-9, "differential");
        Approx.Relative(row["phi_homogeneous"], OverReading(WetSteamModel.Homogeneous, state, x), 1e-9, "homogeneous");
        Approx.Relative(row["phi_murdock"], OverReading(WetSteamModel.Murdock, state, x), 1e-9, "Murdock");
        Approx.Relative(row["phi_chisholm_n025"], OverReading(WetSteamModel.Chisholm1967, state, x), 1e-9, "Chisholm");
        // Between the published change of law at Fr = 1.5 and the point where the laws meet, the greater exponent is taken.
        if (row["Fr_gas"] is < 1.5 or > 1.5131) Approx.Relative(row["phi_de_leeuw"], OverReading(WetSteamModel.DeLeeuw, state, x), 1e-9, "de Leeuw");
        Assert.Equal(row["in_limits"] == 1, venturi.Check(state, MassFraction.FromDecimalFractions(x)).IsInside);
    }

    public static TheoryData<WetSteamModel> All => [.. WetSteamModel.All];

    [Theory, MemberData(nameof(All))]
    public void EffectiveDensity_DrySteam_IsTheVapours(WetSteamModel model)
    {
        double expected = model == WetSteamModel.SmithLeang ? 55.45 * Math.Pow(0.637 + 0.421 - 0.00183, 2) : 55.45;
        Approx.Relative(expected, Density(model, Reference, 1), 1e-12);
    }

    // Each in its own limit as quality goes to 0: Murdock and Lin keep the square of their slope over the liquid's volume.
    [Theory, MemberData(nameof(All))]
    public void EffectiveDensity_NoSteam_IsTheLiquidsUpToTheModelsSlope(WetSteamModel model)
    {
        if (model == WetSteamModel.SmithLeang) return;
        double slope = model == WetSteamModel.Murdock ? 1.26 : model == WetSteamModel.Lin ? 0.997936 : 1;
        Approx.Relative(688.4 / (slope * slope), Density(model, Reference, 0), 2e-6);
        Approx.Relative(Density(model, Reference, 0), Density(model, Reference, 1e-12), 1e-6);
    }

    [Theory, MemberData(nameof(All))]
    public void EffectiveDensity_OutsideItsRange_GoesOnAtTheHomogeneousSlope(WetSteamModel model)
    {
        double slope = (1 / 55.45) - (1 / 688.4), low = model.LowestQuality;
        Approx.Relative((1 / Density(model, Reference, 1)) + (0.2 * slope), 1 / Density(model, Reference, 1.2), 1e-12);
        Approx.Relative((1 / Density(model, Reference, low)) - (0.02 * slope), 1 / Density(model, Reference, low - 0.02), 1e-12);
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => model.EffectiveDensity(Reference, MassFraction.FromDecimalFractions(-5)));
        Assert.Contains("Quality = -5", error.Message, StringComparison.Ordinal);
    }

    // The trend that each model states is true over pressures, flows and meters of the trade: what the search for quality relies on.
    [Property(MaxTest = 300)]
    public Property Differential_OverQuality_FollowsTheTrendThatTheModelStates() => Prop.ForAll(States().ToArbitrary(), state =>
    {
        foreach (WetSteamModel model in WetSteamModel.All)
        {
            double[] differentials = [.. Enumerable.Range(0, 401).Select(i => Differential(model, state, model.LowestQuality + ((1 - model.LowestQuality) * i / 400)))];
            int turns = Enumerable.Range(1, 399).Count(i => differentials[i] > differentials[i - 1] && differentials[i + 1] <= differentials[i]);
            int valleys = Enumerable.Range(1, 399).Count(i => differentials[i] < differentials[i - 1] && differentials[i + 1] >= differentials[i]);
            Assert.True(differentials[1] > differentials[0] && valleys == 0 && turns <= (model.Trend == DifferentialTrend.Rising ? 0 : 1), $"{model} at {state}: {turns} peaks, {valleys} valleys");
        }
    });

    [Fact]
    public void Differential_ReaderHarrisGrahamNearDryness_PassesAPeak()
    {
        MeterState state = Reference with { TotalMassFlow = 3 };
        double Dp(double x) => Differential(WetSteamModel.ReaderHarrisGraham, state, x);
        Assert.True(Dp(0.98) > Dp(1) && Dp(0.98) > Dp(0.9));
    }

    [Fact]
    public void Check_OutsideAPublishedRange_SaysWhich()
    {
        Assert.Equal(ApplicabilityLimits.Quality | ApplicabilityLimits.Pressure, WetSteamModel.James.Check(Reference, MassFraction.FromDecimalFractions(0.78)).Exceeded);
        Assert.Equal(ApplicabilityLimits.LockhartMartinelli, WetSteamModel.ReaderHarrisGraham.Check(Reference, MassFraction.FromDecimalFractions(0.45)).Exceeded);
        Assert.True(WetSteamModel.ReaderHarrisGraham.Check(Reference, MassFraction.FromDecimalFractions(0.78)).IsInside);
        Assert.Equal(ApplicabilityLimits.Quality, WetSteamModel.Homogeneous.Check(Reference, MassFraction.FromDecimalFractions(1.1)).Exceeded);
    }

    internal static double Density(WetSteamModel model, in MeterState state, double x) => model.EffectiveDensity(state, MassFraction.FromDecimalFractions(x)).KilogramsPerCubicMeter;

    internal static Gen<MeterState> States() =>
        from liquid in Gen.Choose(500, 880)
        from ratio in Gen.Choose(10, 200)
        from pipe in Gen.Choose(50, 150)
        from beta in Gen.Choose(40, 75)
        from flux in Gen.Choose(200, 2500)
        select new MeterState
        {
            Pressure = 8e6,
            LiquidDensity = liquid,
            VapourDensity = liquid * ratio / 1000.0,
            IsentropicExponent = 1.25,
            TotalMassFlow = flux * Math.PI / 4 * pipe * pipe * 1e-6,
            PipeDiameter = pipe * 1e-3,
            ThroatDiameter = pipe * beta * 1e-5,
            DiameterRatio = beta / 100.0,
            DischargeCoefficient = 0.995,
            Expansibility = 1,
        };

    private static double OverReading(WetSteamModel model, in MeterState state, double x) => Math.Sqrt(state.VapourDensity * model.EffectiveVolume(state, x)) / x;

    private static double Differential(WetSteamModel model, in MeterState state, double x)
    {
        double bare = state.TotalMassFlow / (model.DischargeCoefficientCore(state, x) * state.FlowArea());
        return bare * bare / 2 * model.EffectiveVolume(state, x);
    }

    private static MeterState Example(double liquidDensity, double gasFlow, double liquidToGas) => new()
    {
        Pressure = 6e6,
        LiquidDensity = liquidDensity,
        VapourDensity = 50,
        TotalMassFlow = gasFlow * (1 + liquidToGas),
        PipeDiameter = 0.1,
        ThroatDiameter = 0.06,
        DiameterRatio = 0.6,
    };

    private static MeterState State(ReferenceTable.Row row) => new()
    {
        Pressure = row["p_Pa"],
        LiquidDensity = row["rhol_kg_m3"],
        VapourDensity = row["rhog_kg_m3"],
        TotalMassFlow = row["m_kg_s"],
        PipeDiameter = row["D_m"],
        ThroatDiameter = row["d_m"],
        DiameterRatio = Math.Round(row["d_m"] / row["D_m"], 12),   // as printed: the grid has tubes on the limit of 0.75
    };
}

internal static class MeterStateExtensions
{
    /// <summary>E·A of a state, independent of the library's own geometry.</summary>
    public static double FlowArea(this in MeterState state) => Math.PI / 4 * state.ThroatDiameter * state.ThroatDiameter / Math.Sqrt(1 - Math.Pow(state.DiameterRatio, 4));
}
