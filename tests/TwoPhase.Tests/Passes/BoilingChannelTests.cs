using TwoPhase.Flow;
using TwoPhase.Friction;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Steam;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

/// <summary>Heated vertical tubes of the textbooks, and how far correlations lie apart on them.</summary>
public class BoilingChannelTests
{
    // Massoud, Engineering Thermofluids (2005), example Va.2.9: water at 7 MPa up a tube of 20 mm, 318.3 kg/(m²·s), smooth, 1 m to boiling and
    // 3 m beyond, uniform heat. Printed, by Thom's method, friction + acceleration + gravity [kPa]: before boiling 0.068 + 0.018 + 7.8, after it
    // 1.74 + 1.90 + 5.2, in all 16.7. Inferred, not printed: 211 °C at the inlet, from the acceleration before boiling, and then 0.71
    // at the outlet, from the lengths.
    private const double Friction = 1.81, Acceleration = 1.92, Gravity = 13.0, Total = 16.7;

    // Thom's multipliers are read off charts for the whole channel, and his friction is his own: so near, not equal.
    [Fact]
    public void Solve_TubeOfMassoud_ComesNearThePrintedParts()
    {
        PassProfile profile = Massoud(PassModels.Default.WithSlip(VoidFractionModel.Thom));
        Approx.Absolute(1.0, profile.First(row => Math.Abs(row.EquilibriumQuality.DecimalFractions) < 1e-9).Position.Meters, 0.03, "onset, from the lengths");
        Approx.Absolute(0.71, profile.OutletQuality.DecimalFractions, 1e-3);
        Approx.Relative(Total, profile.PressureDrop.Total.Kilopascals, 0.05);
        Approx.Relative(Gravity, profile.PressureDrop.Gravity.Kilopascals, 0.06);
        Approx.Relative(Friction, profile.PressureDrop.Friction.Kilopascals, 0.15);
        Approx.Relative(Acceleration, profile.PressureDrop.Acceleration.Kilopascals, 0.15);
    }

    // All pairs of slip and friction: 15.4 to 23 kPa, half of them 17.1 to 19. Friction goes from 1.3 to 4.1 kPa, the static head from 12.2 to 17.1.
    [Fact]
    public void Solve_TubeOfMassoud_LiesWithinTheSpreadOfTheCorrelations()
    {
        PressureDrop[] all = [.. VoidFractionModel.All.SelectMany(slip => FrictionModel.All.Select(friction => Massoud(new(slip, friction)).PressureDrop))];
        double[] totals = [.. all.Select(drop => drop.Total.Kilopascals).Order()];
        Assert.InRange(Total, totals[0], totals[^1]);
        Approx.Relative(Total, totals[totals.Length / 2], 0.1, "the one in the middle");
        Assert.True(totals[3 * totals.Length / 4] - totals[totals.Length / 4] < 0.2 * Total, "half of them together");
        Assert.InRange(Friction, all.Min(drop => drop.Friction.Kilopascals), all.Max(drop => drop.Friction.Kilopascals));
        Assert.InRange(Gravity, all.Min(drop => drop.Gravity.Kilopascals), all.Max(drop => drop.Gravity.Kilopascals));

        // Read off a chart a little above what flow without slip, the most of all, would need.
        Approx.Relative(Acceleration, all.Max(drop => drop.Acceleration.Kilopascals), 0.02);
    }

    // Todreas and Kazimi, Nuclear Systems I, 2nd ed. (2012), problem 11-11: 0.29 kg/s of water saturated at 7.2 MPa up 3 m of a channel of
    // 1.5 cm² (a round tube here) to a quality of 0.15, uniform heat, homogeneous, f = 0.184 Re^-0.2 with the viscosity of the liquid. With
    // constant properties, v = vf + x vfg: friction f L G² (vf + x vfg/2)/(2 D), acceleration G² x vfg, gravity g L ln(1 + x vfg/vf)/(x vfg).
    [Fact]
    public void Solve_ChannelOfTodreasAndKazimi_FollowsTheHomogeneousClosedForm()
    {
        const double flow = 0.29, area = 1.5e-4, length = 3, x = 0.15;
        var steam = Saturation.FromPressure(Pressure.FromMegapascals(7.2));
        double vf = steam.Liquid.SpecificVolume.CubicMetersPerKilogram, vfg = steam.Vapour.SpecificVolume.CubicMetersPerKilogram - vf;
        double flux = flow / area, bore = Math.Sqrt(4 * area / Math.PI), f = 0.184 * Math.Pow(flux * bore / steam.Liquid.DynamicViscosity.PascalSeconds, -0.2);
        PassConditions conditions = new PassConditions(MassFlow.FromKilogramsPerSecond(flow), steam.Temperature, steam.Pressure, Power.FromWatts(flow * x * steam.LatentHeat.JoulesPerKilogram))
            .WithFeedEnthalpy(steam.Liquid.SpecificEnthalpy);
        PressureDrop drop = SteadyState.Solve(Upward(Length.FromMeters(bore), length), conditions, new(VoidFractionModel.Homogeneous, new LiquidViscosity())).PressureDrop;

        // Pressure, and with it the volume of steam, changes by 0.6 % along the channel; the feed is saturated at the outlet, not at the inlet.
        Approx.Relative(f * length * flux * flux * (vf + (x * vfg / 2)) / (2 * bore), drop.Friction.Pascals, 0.015);
        Approx.Relative(flux * flux * x * vfg, drop.Acceleration.Pascals, 0.015);
        Approx.Relative(9.80665 * length * Math.Log(1 + (x * vfg / vf)) / (x * vfg), drop.Gravity.Pascals, 0.015);
    }

    private static PassProfile Massoud(PassModels models)
    {
        var steam = Saturation.FromPressure(Pressure.FromMegapascals(7));
        var feed = SteamState.FromPressureTemperature(steam.Pressure, Temperature.FromDegreesCelsius(211));
        double rise = steam.Liquid.SpecificEnthalpy.JoulesPerKilogram + (0.71 * steam.LatentHeat.JoulesPerKilogram) - feed.SpecificEnthalpy.JoulesPerKilogram;
        return SteadyState.Solve(Upward(Length.FromMillimeters(20), 4), new(MassFlow.FromKilogramsPerSecond(0.1), feed.Temperature, steam.Pressure, Power.FromWatts(0.1 * rise)), models);
    }

    private static Pass Upward(Length bore, double metres) =>
        new("1", [new TubeSection("tube", bore, bore + Length.FromMillimeters(5), Length.FromMeters(metres)).WithInclination(Angle.FromDegrees(90)).WithRoughness(Length.Zero)]);

    private sealed class LiquidViscosity : FrictionModel
    {
        public override string Name => "f = 0.184 Re^-0.2";

        protected internal override double GradientCore(in FlowState flow, double roughness) =>
            0.184 * Math.Pow(flow.MassFlux * flow.Bore / flow.LiquidViscosity, -0.2) * flow.MassFlux * flow.MassFlux * ((flow.Quality / flow.VapourDensity) + ((1 - flow.Quality) / flow.LiquidDensity)) / (2 * flow.Bore);

        protected internal override Applicability CheckCore(in FlowState flow) => Applicability.Inside;
    }
}
