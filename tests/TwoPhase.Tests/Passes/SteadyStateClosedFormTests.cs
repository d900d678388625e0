using TwoPhase.Flow;
using TwoPhase.Passes;
using TwoPhase.Slip;
using UnitsNet;

namespace TwoPhase.Tests.Passes;

/// <summary>
/// Uniform heat, constant pressure, homogeneous flow. With u0 = G/ρf, Ω = q′ vfg/(A hfg) and τ = ρf A Δh/q′ a particle starts to
/// boil at λ = u0 τ, then Dv/Dt = Ω v (energy at constant pressure with v linear in h), so u = u0 + Ω (z − λ): the outlet
/// volume is vf (1 + Ω (L − λ)/u0) and it gets there after ln(1 + Ω (L − λ)/u0)/Ω. The mass held is ṁ times the sum of both times.
/// </summary>
public class SteadyStateClosedFormTests
{
    private const double Bore = 0.0779, Length = 671, MassFlux = 1007, LinearHeat = 12180, Lacking = 6.75e5;
    private const double Area = Math.PI / 4 * Bore * Bore;

    private static readonly PassModels Homogeneous = new(VoidFractionModel.Homogeneous);

    // No pressure drop at all: the closed form's constant pressure.
    private static readonly SteadyOptions ConstantPressure = SteadyOptions.Default.WithoutFriction().WithoutGravity().WithoutAcceleration();

    [Fact]
    public void Solve_UniformlyHeatedChannel_FollowsTheClosedForm()
    {
        double u0 = MassFlux / 688, omega = LinearHeat * ((1 / 55.5) - (1 / 688.0)) / (Area * 1.317e6), tau = 688 * Area * Lacking / LinearHeat;
        double lambda = u0 * tau, rest = Math.Log(1 + (omega * (Length - lambda) / u0)) / omega;
        PassProfile profile = Solve(Base);
        Approx.Relative(lambda, profile.First(row => Math.Abs(row.EquilibriumQuality.DecimalFractions) < 1e-9).Position.Meters, 1e-9, "onset");
        Approx.Relative(MassFlux * Area * (tau + rest), Held(profile), 1e-8, "mass held");
        Approx.Relative((u0 + (omega * (Length - lambda))) * 1e3, profile.Outlet.VapourVelocity!.Value.MetersPerSecond * 1e3, 1e-9, "outlet velocity");
        Assert.Equal(profile.Inlet.Pressure, profile.Outlet.Pressure);
    }

    // Printed with the derivation for ρf 688, ρg 55.5, hfg 1.317e6, Δh 6.75e5, D 0.0779, L 671, G 1007, q′ 12180: computed once
    // by an independent script, seven digits.
    [Fact]
    public void Solve_BaseCase_MatchesTheTable()
    {
        PassProfile profile = Solve(Base);
        Approx.Absolute(0.780445, profile.OutletQuality.DecimalFractions, 5e-7);
        Approx.Relative(1214.4108, Held(profile), 5e-8);
        Approx.Relative(14.48187, profile.Outlet.VapourVelocity!.Value.MetersPerSecond, 5e-7);
    }

    [Fact]
    public void Solve_SectionSplitInTwo_ChangesNothing()
    {
        PassProfile whole = Solve(Base), split = Solve(new Pass("1", [Tubes("a", 300), Tubes("b", Length - 300)]));
        Approx.Relative(Held(whole), Held(split), 1e-9);
        Approx.Absolute(whole.OutletQuality.DecimalFractions, split.OutletQuality.DecimalFractions, 1e-12);
    }

    [Fact]
    public void Solve_TriangularFlux_PutsTheOnsetWhereTheHeatIs()
    {
        // Flux falls linearly to zero: heat up to s is Q (2 s − s²), so boiling starts at s = 1 − √(1 − r), r the share that heats the liquid.
        Pass pass = Base.WithHeat(new(new SectionHeat("tubes", Ratio.FromPercent(100), new FluxPoint(Ratio.Zero, 1), new FluxPoint(Ratio.FromPercent(100), 0))));
        double share = Lacking * MassFlux * Area / (LinearHeat * Length);
        double onset = Solve(pass).First(row => Math.Abs(row.EquilibriumQuality.DecimalFractions) < 1e-9).Position.Meters;
        Approx.Relative(Length * (1 - Math.Sqrt(1 - share)), onset, 1e-9);
    }

    private static Pass Base => new("1", [Tubes("tubes", Length)]);

    private static TubeSection Tubes(string name, double length) => new(name, UnitsNet.Length.FromMeters(Bore), UnitsNet.Length.FromMillimeters(88.9), UnitsNet.Length.FromMeters(length));

    private static PassProfile Solve(Pass pass)
    {
        PassConditions conditions = new PassConditions(MassFlow.FromKilogramsPerSecond(MassFlux * Area), Temperature.FromKelvins(500), Pressure.FromMegapascals(10), Power.FromWatts(LinearHeat * Length))
            .WithFeedEnthalpy(SpecificEnergy.FromJoulesPerKilogram(ConstantDensityFluid.Subcooled(Lacking)));
        return SteadyState.Solve(default(ConstantDensityFluid), pass, conditions, SteadyTarget.Profile, 0, Homogeneous, ConstantPressure);
    }

    private static double Held(PassProfile profile)
    {
        double sum = 0;
        foreach (NodePanel panel in new NodePanels(profile.Nodes)) sum += panel.Integral((in PassNode node) => node.Density) * Area;
        return sum;
    }
}
