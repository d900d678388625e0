using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.Friction;
using UnitsNet;
using static TwoPhase.Friction.FrictionModel;

namespace TwoPhase.Tests.Friction;

/// <summary>What physics asks of every friction model, and by name the models that are known not to give it.</summary>
[Properties(Arbitrary = [typeof(AnyFlow)])]
public class FrictionGradientPropertyTests
{
    private const double Roughness = 46e-6;

    // Its own smooth-tube factor, not Colebrook's.
    private static readonly FrictionModel[] BlindToRoughness = [LockhartMartinelli];

    // Grønnerud's vapour end is only nearly the vapour's own loss.
    private static readonly FrictionModel[] VapourEndIsRough = [LockhartMartinelli, Gronnerud];

    [Property]
    public void Gradient_AnyFlow_IsPositiveAndFinite(FlowState flow) =>
        Assert.All(All, model => Assert.InRange(model.GradientCore(flow, Roughness), 1e-9, 1e9));

    [Property]
    public void Gradient_LiquidOnly_IsThatOfTheLiquid(FlowState flow)
    {
        FlowState wet = flow with { Quality = 0 };
        double liquid = FrictionFactor.GradientCore(flow.MassFlux, flow.Bore, flow.LiquidDensity, flow.LiquidViscosity, Roughness);
        Assert.All(All.Except(BlindToRoughness), model => Approx.Relative(liquid, model.GradientCore(wet, Roughness), 1e-13, model.Name));
    }

    [Property]
    public void Gradient_VapourOnly_IsThatOfTheVapour(FlowState flow)
    {
        FlowState dry = flow with { Quality = 1 };
        double vapour = FrictionFactor.GradientCore(flow.MassFlux, flow.Bore, flow.VapourDensity, flow.VapourViscosity, Roughness);
        Assert.All(All.Except(VapourEndIsRough), model => Approx.Relative(vapour, model.GradientCore(dry, Roughness), 1e-13, model.Name));
    }

    [Property]
    public void MullerSteinhagenHeck_NamesOfThePhasesSwapped_SwapsTheEnds(FlowState flow)
    {
        FlowState swapped = flow with { LiquidDensity = flow.VapourDensity, VapourDensity = flow.LiquidDensity, LiquidViscosity = flow.VapourViscosity, VapourViscosity = flow.LiquidViscosity };
        Approx.Relative(MullerSteinhagenHeck.GradientCore(flow with { Quality = 0 }, Roughness), MullerSteinhagenHeck.GradientCore(swapped with { Quality = 1 }, Roughness), 1e-13);
        Approx.Relative(MullerSteinhagenHeck.GradientCore(flow with { Quality = 1 }, Roughness), MullerSteinhagenHeck.GradientCore(swapped with { Quality = 0 }, Roughness), 1e-13);
    }

    [Property]
    public void Gradient_NearTheEnds_IsContinuous(FlowState flow)
    {
        foreach (FrictionModel model in All.Except(BlindToRoughness))
        {
            Approx.Relative(model.GradientCore(flow with { Quality = 0 }, Roughness), model.GradientCore(flow with { Quality = 1e-12 }, Roughness), 1e-6, $"{model} at x = 0");
            Approx.Relative(model.GradientCore(flow with { Quality = 1 }, Roughness), model.GradientCore(flow with { Quality = 1 - 1e-12 }, Roughness), 0.02, $"{model} at x = 1");
        }
    }

    [Theory]
    [InlineData(0)]
    [InlineData(0.3)]
    [InlineData(0.78)]
    [InlineData(1)]
    public void Gradient_AtTheCriticalPoint_IsFiniteAndHomogeneousModelsSeeOneFluid(double quality)
    {
        FlowState flow = AnyFlow.Critical(quality);
        double one = FrictionFactor.GradientCore(flow.MassFlux, flow.Bore, 322, 4e-5, Roughness);
        Assert.All(All, model => Assert.InRange(model.GradientCore(flow, Roughness), 0.1 * one, 50 * one));
        foreach (FrictionModel model in new[] { HomogeneousMcAdams, HomogeneousCicchitti, HomogeneousDukler, ChisholmB })
            Approx.Relative(one, model.GradientCore(flow, Roughness), 1e-13, model.Name);
    }

    // Chisholm's B steps down where the ratio of the two gradients passes 9.5 and 28, as published, and roughness moves that ratio.
    [Property]
    public void Gradient_RougherTube_LosesMore(FlowState flow) => Assert.All(
        All.Except(BlindToRoughness).Except([ChisholmB]), model => Assert.True(model.GradientCore(flow, 46e-6) >= model.GradientCore(flow, 0) * (1 - 1e-12), model.Name));

    [Fact]
    public void Gradient_ThroughThePublicDoor_IsTheCoreAndRefusesBadRoughness()
    {
        FlowState state = ReferencePoint.At(0.78);
        var flow = new TwoPhaseFlow(state);
        Assert.Equal(Friedel.GradientCore(state, 46e-6), Friedel.Gradient(flow, Length.FromMicrometers(46)).PascalsPerMetre, 1e-9);
        Assert.StartsWith("Roughness = -0.001 mm must not be negative", Assert.Throws<ArgumentOutOfRangeException>(() => Friedel.Gradient(flow, Length.FromMicrometers(-1))).Message, StringComparison.Ordinal);
        Assert.StartsWith("Roughness = 39 mm must be below 38.95 mm", Assert.Throws<ArgumentOutOfRangeException>(() => Friedel.Gradient(flow, Length.FromMillimeters(39))).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Check_OutsideThePublishedRange_NamesTheLimit()
    {
        FlowState state = ReferencePoint.At(0.78);
        Assert.True(MullerSteinhagenHeck.Check(new TwoPhaseFlow(state)).IsInside);
        Assert.Equal(ApplicabilityLimits.Bore, MullerSteinhagenHeck.Check(new TwoPhaseFlow(state with { Bore = 0.5 })).Exceeded);
        Assert.Equal(ApplicabilityLimits.Inclination, Friedel.Check(new TwoPhaseFlow(state with { Inclination = -1 })).Exceeded);
        Assert.Equal(ApplicabilityLimits.ViscosityRatio, Friedel.Check(new TwoPhaseFlow(state with { LiquidViscosity = 0.1 })).Exceeded);
        Assert.Equal(ApplicabilityLimits.Bore | ApplicabilityLimits.Pressure, LockhartMartinelli.Check(new TwoPhaseFlow(state)).Exceeded);
        Assert.Equal(ApplicabilityLimits.MassFlux, HomogeneousMcAdams.Check(new TwoPhaseFlow(state)).Exceeded);
        Assert.Equal(ApplicabilityLimits.Quality, Gronnerud.Check(new TwoPhaseFlow(state with { Quality = 1 })).Exceeded);
    }

    public static TheoryData<FrictionModel> Models => [.. All];

    [Theory, MemberData(nameof(Models), DisableDiscoveryEnumeration = true)]
    public void Model_EveryDoor_AllocatesNothing(FrictionModel model)
    {
        FlowState state = ReferencePoint.At(0.78);
        var flow = new TwoPhaseFlow(state);
        Length roughness = Length.FromMicrometers(46);
        double sum = 0;
        Assert.Equal(0, AllocationProbe.Bytes(() => sum += model.GradientCore(state, Roughness) + model.Gradient(flow, roughness).PascalsPerMetre + model.Check(flow).FirstValue));
    }
}
