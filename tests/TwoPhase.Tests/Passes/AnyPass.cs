using FsCheck;
using FsCheck.Fluent;
using TwoPhase.Passes;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

/// <summary>A unit system: the same measure, told another way.</summary>
internal sealed record Told(
    Func<double, Length> Length, Func<double, Volume> Volume, Func<double, MassFlow> Flow, Func<double, Temperature> Temperature, Func<double, Pressure> Pressure, Func<double, Power> Power)
{
    public static Told Si { get; } = new(
        m => UnitsNet.Length.FromMeters(m),
        m3 => UnitsNet.Volume.FromCubicMeters(m3),
        kgs => MassFlow.FromKilogramsPerSecond(kgs),
        kelvins => UnitsNet.Temperature.FromKelvins(kelvins),
        pascals => UnitsNet.Pressure.FromPascals(pascals),
        watts => UnitsNet.Power.FromWatts(watts));

    // By definition: inch 25.4 mm, foot 304.8 mm, pound 0.45359237 kg, standard gravity 9.80665 m/s², British thermal unit (International Table) 1055.05585262 J.
    public static Told Imperial { get; } = new(
        m => UnitsNet.Length.FromInches(m / 0.0254),
        m3 => UnitsNet.Volume.FromCubicFeet(m3 / (0.3048 * 0.3048 * 0.3048)),
        kgs => MassFlow.FromPoundsPerHour(kgs * 3600 / 0.45359237),
        kelvins => UnitsNet.Temperature.FromDegreesFahrenheit((kelvins * 1.8) - 459.67),
        pascals => UnitsNet.Pressure.FromPoundsForcePerSquareInch(pascals * 0.0254 * 0.0254 / (0.45359237 * 9.80665)),
        watts => UnitsNet.Power.FromBritishThermalUnitsPerHour(watts * 3600 / 1055.05585262));
}

/// <summary>A random pass with conditions that it can carry, as plain SI numbers: from subcooled to superheated outlet, up and down, with bends, lines and shapes of flux.</summary>
internal sealed record AnyPass(AnyPass.Section[] Sections, double LineLoss, double Flux, double FeedTemperature, double Pressure, double Rise)
{
    public sealed record Section(double Bore, double Length, int Tubes, int Parallel, double Roughness, int Bends, double BendLoss, double Loss, double Rise, HeatZone Zone, double Weight, double Slope)
    {
        public double Area => Math.PI / 4 * Bore * Bore * Parallel;

        public TubeSection Tell(string name, Told told)
        {
            TubeSection section = new TubeSection(name, told.Length(Bore), told.Length(Bore + 0.011), told.Length(Length), Tubes)
                .WithParallelTubes(Parallel)
                .WithRoughness(told.Length(Roughness))
                .WithReturnBends(Bends, told.Length(1.5 * Bore), BendLoss)
                .WithLossCoefficient(Loss)
                .WithRise(told.Length(Rise));
            return Zone switch { HeatZone.Convective => section.AsConvective(), HeatZone.Unheated => section.AsUnheated(), _ => section };
        }
    }

    // What keeps the loss at a tenth of the pressure or so, whatever the tubes.
    private double Flow => Flux * Math.Sqrt(0.2 * Pressure * 60 / Sections.Sum(it => ((0.04 * it.Length * it.Tubes / it.Bore) + (3 * it.Bends * it.BendLoss) + it.Loss + LineLoss) / (it.Area * it.Area)));

    public Pass Tell(Told told)
    {
        var pass = new Pass("any", [.. Sections.Select((section, i) => section.Tell($"s{i}", told))]);
        if (pass.Heat is not null)
        {
            double sum = Sections.Sum(section => section.Zone == HeatZone.Unheated ? 0 : section.Weight);
            pass = pass.WithHeat(new([.. Sections.Select((section, i) => (section, i)).Where(item => item.section.Zone != HeatZone.Unheated).Select(item => new SectionHeat(
                $"s{item.i}", Ratio.FromDecimalFractions(item.section.Weight / sum), new FluxPoint(Ratio.Zero, 1), new FluxPoint(Ratio.FromPercent(100), item.section.Slope)))]));
        }

        return LineLoss == 0 ? pass : pass.WithOutletLine(new(told.Length(0.06), LineLoss, told.Volume(0.05)));
    }

    // The heat per kilogram of water goes with the rise of enthalpy asked for: 0 to 2600 kJ/kg.
    public PassConditions TellConditions(Told told) => new(
        told.Flow(Flow), told.Temperature(FeedTemperature), told.Pressure(Pressure), told.Power(Array.Exists(Sections, section => section.Zone != HeatZone.Unheated) ? Flow * Rise : 0));

    public static Arbitrary<AnyPass> All() => (
        from count in Gen.Choose(1, 4)
        from sections in Gen.ArrayOf(OneSection(), count)
        from line in Gen.Elements(0.0, 2.5)
        from flux in Gen.Choose(10, 60)
        from feed in Gen.Choose(350, 470)
        from pressure in Gen.Choose(20, 150)
        from rise in Gen.Choose(0, 2600)
        select new AnyPass(sections, line, flux / 100.0, feed, pressure * 1e5, rise * 1e3)).ToArbitrary();

    private static Gen<Section> OneSection() =>
        from n in Gen.ArrayOf(Gen.Choose(0, 999), 10)
        from zone in Gen.Elements(HeatZone.Radiant, HeatZone.Radiant, HeatZone.Convective, HeatZone.Unheated)
        let length = 3 + (n[1] / 60.0)
        let tubes = 1 + (n[2] % 12)
        select new Section(
            0.02 + (n[0] / 12000.0), length, tubes, 1 + (n[3] % 3), n[4] / 2e7, tubes - 1, 0.2 + (n[5] / 5000.0), n[6] / 300.0, (n[7] - 500) / 1000.0 * length, zone, 1 + n[8], n[9] / 500.0);
}
