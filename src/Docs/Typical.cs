using TwoPhase.Flow;
using TwoPhase.Friction;
using TwoPhase.HeatTransfer;
using TwoPhase.Metering;
using TwoPhase.Slip;
using TwoPhase.Steam;
using UnitsNet;

namespace Docs;

/// <summary>What each family gives at one typical, invented pass condition: 9.6 MPa, 970 kg/(m²·s), 77.9 mm bore, horizontal, 60 kW/m².</summary>
internal static class Typical
{
    private const string Where = "9.6 MPa, 970 kg/(m²·s), 77.9 mm bore, horizontal";

    private static readonly Length Bore = Length.FromMillimeters(77.9);
    private static readonly HeatFlux Flux = HeatFlux.FromKilowattsPerSquareMeter(60);
    private static readonly double[] Qualities = Range(0.01, 0.99), Pressures = Range(4, 14), Fluxes = Range(10, 200);

    public static Spread VoidFraction { get; } = new(
        $"Void fraction against quality at {Where}", "Quality [kg/kg]", "Void fraction [-]", Qualities,
        [.. VoidFractionModel.All.Select(static model => (model.Name, (Func<double, double>)(x => model.VoidFraction(At(x)).DecimalFractions)))]);

    public static Spread Friction { get; } = new(
        $"Friction gradient against quality at {Where}, roughness 46 µm", "Quality [kg/kg]", "Friction gradient [kPa/m]", Qualities,
        [.. FrictionModel.All.Select(static model => (model.Name, (Func<double, double>)(x => model.Gradient(At(x), Length.FromMicrometers(46)).KilopascalsPerMetre)))]);

    public static Spread Film { get; } = new(
        $"Film coefficient against quality at {Where}, 60 kW/m²", "Quality [kg/kg]", "Film coefficient [kW/(m²·K)]", Qualities,
        [.. FilmModel.All.Select(static model => (model.Name, (Func<double, double>)(x => model.Coefficient(At(x), Flux).WattsPerSquareMeterKelvin / 1e3)))]);

    public static Spread CriticalQuality { get; } = new(
        "Critical quality of the tube's top against pressure at 970 kg/(m²·s), 77.9 mm bore, horizontal, 60 kW/m²", "Pressure [MPa]", "Critical quality [kg/kg]", Pressures,
        [.. CriticalQualityModel.All.Select(static model => (model.Name, (Func<double, double>)(p => model.Critical(At(0.5, p), Flux).Top.DecimalFractions)))]);

    public static Spread Onset { get; } = new(
        "Wall superheat of the first bubbles against heat flux at 9.6 MPa", "Heat flux [kW/m²]", "Superheat [K]", Fluxes,
        [.. OnsetModel.All.Select(static model => (model.Name, (Func<double, double>)(q => model.Superheat(At(0), HeatFlux.FromKilowattsPerSquareMeter(q)).Kelvins)))]);

    public static Spread NetVapour { get; } = new(
        $"Subcooling at net vapour against heat flux at {Where}", "Heat flux [kW/m²]", "Subcooling [kJ/kg]", Fluxes,
        [.. NetVapourModel.All.Select(static model => (model.Name, (Func<double, double>)(q => model.Subcooling(At(0), HeatFlux.FromKilowattsPerSquareMeter(q)).KilojoulesPerKilogram)))]);

    public static Spread WetSteam { get; } = new(
        "Quality that each model reads from the differential that the homogeneous one makes of 0.78, against pressure; venturi 77.9/49 mm, 4.8 kg/s", "Pressure [MPa]", "Quality [kg/kg]", Pressures,
        [.. WetSteamModel.All.Select(static model => (model.Name, (Func<double, double>)(p => Reads(model, p))))]);

    private static double Reads(WetSteamModel model, double megapascals)
    {
        var venturi = new ClassicalVenturi(Bore, Length.FromMillimeters(49), ConvergentFinish.Machined);
        var flow = MassFlow.FromKilogramsPerSecond(4.8);
        var pressure = Pressure.FromMegapascals(megapascals);
        Pressure differential = new QualityMeter(venturi, WetSteamModel.Homogeneous).Differential(flow, pressure, MassFraction.FromPercent(78));
        return new QualityMeter(venturi, model).Quality(flow, pressure, differential).Quality.DecimalFractions;
    }

    private static TwoPhaseFlow At(double quality, double megapascals = 9.6) => new(
        Saturation.FromPressure(Pressure.FromMegapascals(megapascals)), MassFraction.FromDecimalFractions(quality), MassFlux.FromKilogramsPerSecondPerSquareMeter(970), Bore, Angle.Zero);

    private static double[] Range(double from, double to) => MathNet.Numerics.Generate.LinearSpaced(99, from, to);
}
