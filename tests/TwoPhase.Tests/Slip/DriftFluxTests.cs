using TwoPhase.Flow;
using TwoPhase.Slip;
using UnitsNet;

namespace TwoPhase.Tests.Slip;

public class DriftFluxTests
{
    private static readonly FlowState Outlet = FlowStates.At(10e6, 0.78, 1000, 0.078, 0);

    public static TheoryData<VoidFractionModel, DistributionParameter, DriftVelocity> Pairs => new()
    {
        { VoidFractionModel.RouhaniAxelsson, DistributionParameter.RouhaniAxelsson, DriftVelocity.RouhaniAxelsson },
        { VoidFractionModel.RouhaniAxelssonMassFlux, DistributionParameter.RouhaniAxelssonMassFlux, DriftVelocity.RouhaniAxelsson },
        { VoidFractionModel.RouhaniAxelssonVertical, DistributionParameter.RouhaniAxelssonMassFlux, DriftVelocity.RouhaniAxelssonVertical },
        { VoidFractionModel.Steiner, DistributionParameter.Steiner, DriftVelocity.RouhaniAxelsson },
        { VoidFractionModel.ZuberFindlay, DistributionParameter.Constant(1.13), DriftVelocity.Churn },
        { VoidFractionModel.Dix, DistributionParameter.Dix, DriftVelocity.Dix },
        { VoidFractionModel.Bestion, DistributionParameter.Constant(1), DriftVelocity.Bestion },
        { VoidFractionModel.Homogeneous, DistributionParameter.Constant(1), DriftVelocity.None },
    };

    [Theory, MemberData(nameof(Pairs), DisableDiscoveryEnumeration = true)]
    public void DriftFlux_PairOfANamedModel_IsThatModel(VoidFractionModel model, DistributionParameter distribution, DriftVelocity drift)
    {
        VoidFractionModel pair = VoidFractionModel.DriftFlux(distribution, drift);
        for (double x = 0; x <= 1; x += 0.125)
            Approx.Relative(model.VoidFractionCore(Outlet with { Quality = x }), pair.VoidFractionCore(Outlet with { Quality = x }), 1e-15, model.Name);
    }

    [Fact]
    public void Check_DistributionParameterThatStaysAboveOne_IsFlaggedWithItsLimit()
    {
        Applicability finding = VoidFractionModel.DriftFlux(DistributionParameter.Constant(1.2), DriftVelocity.Slug).Check(new TwoPhaseFlow(Outlet));
        Assert.Equal(ApplicabilityLimits.DistributionParameter, finding.Exceeded);
        Assert.Equal(1.2, finding.FirstValue);
    }

    [Theory]
    [InlineData(0, true)]
    [InlineData(4.9, true)]
    [InlineData(5.1, false)]
    [InlineData(90, false)]
    public void Check_Steiner_IsInsideForLevelTubesOnly(double degrees, bool inside)
    {
        Applicability finding = VoidFractionModel.Steiner.Check(new TwoPhaseFlow(Outlet with { Inclination = degrees * Math.PI / 180 }));
        Assert.Equal(inside, finding.IsInside);
        if (!inside) Assert.Equal(ApplicabilityLimits.Inclination, finding.Exceeded);
    }

    // What the flag is for: at the outlet of a pass a fixed C0 leaves about three times the liquid.
    [Fact]
    public void DriftFlux_FixedDistributionParameterAtAPassOutlet_HoldsThreeTimesTheLiquid()
    {
        double good = 1 - VoidFractionModel.Steiner.VoidFractionCore(Outlet), bad = 1 - VoidFractionModel.ZuberFindlay.VoidFractionCore(Outlet);
        Assert.InRange(bad / good, 2.5, 3.5);
    }

    // Bestion's drift velocity for a 77.9 mm tube at 10 MPa by hand, g = 9.81 m/s² there: 0.555258 m/s.
    [Fact]
    public void Bestion_TubeByHand_IsThatVelocity()
    {
        FlowState tube = new() { LiquidDensity = 688.4, VapourDensity = 55.45, Bore = 0.0779 };
        Approx.Relative(0.555258 * Math.Sqrt(9.80665 / 9.81), DriftVelocity.Bestion.Of(new TwoPhaseFlow(tube)).MetersPerSecond, 1e-6);
    }

    // Viana et al., J. Fluid Mech. 494, 379 (2003), from all published measurements of long bubbles in standing liquid: U = 0.34 (g D)^(1/2) where neither
    // viscosity nor surface tension slows them, as air in water in 50 mm; Zuber and Findlay round the same law to 0.35.
    [Fact]
    public void Slug_LongBubbleInWater_RisesAsMeasured()
    {
        FlowState water = new() { LiquidDensity = 998, VapourDensity = 1.2, Bore = 0.05 };
        Approx.Relative(0.34 * Math.Sqrt(9.81 * 0.05), DriftVelocity.Slug.Of(new TwoPhaseFlow(water)).MetersPerSecond, 0.03);
    }

    // Phases of one density have no buoyancy.
    [Fact]
    public void Drift_AtTheCriticalPoint_IsNone()
    {
        DriftVelocity[] laws = [DriftVelocity.RouhaniAxelsson, DriftVelocity.RouhaniAxelssonVertical, DriftVelocity.Churn, DriftVelocity.Bubbly, DriftVelocity.Slug, DriftVelocity.Dix, DriftVelocity.Bestion];
        Assert.All(laws, law => Assert.Equal(0, law.Core(AnyFlow.Critical(0.5))));
    }

    public static TheoryData<VoidFractionModel> Vertical =>
        [VoidFractionModel.Premoli, VoidFractionModel.RouhaniAxelssonVertical, VoidFractionModel.ZuberFindlay, VoidFractionModel.Dix, VoidFractionModel.Bestion];

    // What their documents say of their range; the limit at 60° is our own reading of "vertical".
    [Theory, MemberData(nameof(Vertical), DisableDiscoveryEnumeration = true)]
    public void Check_ModelOfVerticalTubes_IsFlaggedBelowSixtyDegrees(VoidFractionModel model)
    {
        bool Flagged(double degrees) => (model.Check(new TwoPhaseFlow(Outlet with { Inclination = degrees * Math.PI / 180 })).Exceeded & ApplicabilityLimits.Inclination) != 0;
        Assert.Equal([true, true, false, false], new double[] { 0, 59, 61, 90 }.Select(Flagged));
    }

    [Fact]
    public void Laws_AtAFlow_ReadAsQuantities()
    {
        var flow = new TwoPhaseFlow(Outlet);
        Approx.Relative(1 + (0.12 * 0.22), DistributionParameter.Steiner.Of(flow), 1e-15);
        Approx.Relative(0.25, DriftVelocity.Constant(Speed.FromMetersPerSecond(0.25)).Of(flow).MetersPerSecond, 1e-15);
        Assert.Equal("Drift flux, C0 = 1.2 and drift 0.25 m/s", VoidFractionModel.DriftFlux(DistributionParameter.Constant(1.2), DriftVelocity.Constant(Speed.FromMetersPerSecond(0.25))).Name);
    }

    [Fact]
    public void Constant_BadValue_ThrowsNamingIt()
    {
        Assert.StartsWith("Distribution parameter = 0 must be greater than zero", Assert.Throws<ArgumentOutOfRangeException>(() => DistributionParameter.Constant(0)).Message, StringComparison.Ordinal);
        Assert.StartsWith("Drift velocity = -0.1 m/s must not be negative", Assert.Throws<ArgumentOutOfRangeException>(() => DriftVelocity.Constant(Speed.FromMetersPerSecond(-0.1))).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentNullException>(() => VoidFractionModel.DriftFlux(null!, DriftVelocity.None));
        Assert.Throws<ArgumentNullException>(() => VoidFractionModel.DriftFlux(DistributionParameter.Steiner, null!));
    }
}
