using FsCheck.Xunit;
using TwoPhase.Flow;
using TwoPhase.Slip;
using static TwoPhase.Slip.VoidFractionModel;

namespace TwoPhase.Tests.Slip;

/// <summary>What physics asks of every void-fraction model, and by name the models that are known not to give it.</summary>
[Properties(Arbitrary = [typeof(AnyFlow)])]
public class VoidFractionPropertyTests
{
    // Slip below 1 in part of the range: fits of low-pressure data, and C0 below 1 in Dix and what follows from it.
    private static readonly VoidFractionModel[] SlipMayBeBelowOne = [Baroczy, LockhartMartinelli, TurnerWallis, Dix, WoldesemayatGhajar];

    // A drift, or an excess of C0 over 1, that does not vanish with the liquid.
    private static readonly VoidFractionModel[] EndsBelowOne = [RouhaniAxelssonVertical, ZuberFindlay, Dix, Bestion, WoldesemayatGhajar];

    // A C0 or an exponent that takes no notice of the density ratio.
    private static readonly VoidFractionModel[] NotHomogeneousAtCriticalPressure =
        [Baroczy, LockhartMartinelli, TurnerWallis, ChisholmArmand, RouhaniAxelsson, RouhaniAxelssonMassFlux, RouhaniAxelssonVertical, Steiner, ZuberFindlay];

    [Property]
    public void VoidFraction_AnyFlow_LiesBetweenNothingAndHomogeneous(FlowState flow)
    {
        double homogeneous = Homogeneous.VoidFractionCore(flow);
        foreach (VoidFractionModel model in All)
        {
            double alpha = model.VoidFractionCore(flow), most = SlipMayBeBelowOne.Contains(model) ? 1 : homogeneous;
            Assert.True(alpha >= 0 && alpha <= most + 1e-14, $"{model}: {alpha} in {flow}");
        }
    }

    [Property]
    public void VoidFraction_MoreQuality_IsNotLess(FlowState flow)
    {
        FlowState more = flow with { Quality = flow.Quality + (0.01 * (1 - flow.Quality)) };
        Assert.All(All, model => Assert.True(model.VoidFractionCore(more) >= model.VoidFractionCore(flow) - 1e-15, $"{model} falls in {flow}"));
    }

    [Property]
    public void VoidFraction_LiquidOnly_IsZero(FlowState flow) =>
        Assert.All(All, model => Assert.Equal(0, model.VoidFractionCore(flow with { Quality = 0 })));

    [Property]
    public void VoidFraction_VapourOnly_IsOneButForTheKnownOnes(FlowState flow)
    {
        FlowState dry = flow with { Quality = 1 };
        Assert.All(All.Except(EndsBelowOne), model => Assert.Equal(1, model.VoidFractionCore(dry)));
        Assert.All(EndsBelowOne, model => Assert.InRange(model.VoidFractionCore(dry), 0.2, 0.9999999));
    }

    [Property]
    public void VoidFraction_NearTheEnds_IsContinuous(FlowState flow)
    {
        foreach (VoidFractionModel model in All)
        {
            Approx.Absolute(model.VoidFractionCore(flow with { Quality = 0 }), model.VoidFractionCore(flow with { Quality = 1e-14 }), 1e-6, $"{model} at x = 0");
            Approx.Absolute(model.VoidFractionCore(flow with { Quality = 1 }), model.VoidFractionCore(flow with { Quality = 1 - 1e-14 }), 1e-6, $"{model} at x = 1");
        }
    }

    [Theory]
    [InlineData(0)]
    [InlineData(1e-6)]
    [InlineData(0.3)]
    [InlineData(0.9)]
    [InlineData(1)]
    public void VoidFraction_AtTheCriticalPoint_IsHomogeneousButForTheKnownOnes(double quality)
    {
        FlowState flow = AnyFlow.Critical(quality);
        Assert.All(All.Except(NotHomogeneousAtCriticalPressure), model => Approx.Relative(quality, model.VoidFractionCore(flow), 1e-15, model.Name));
        Assert.All(NotHomogeneousAtCriticalPressure, model => Assert.InRange(model.VoidFractionCore(flow), 0, 1));
    }

    [Property]
    public void SlipRatio_AnyFlow_AgreesWithTheVoidFraction(FlowState flow)
    {
        if (flow.Quality is 0 or 1) return;
        double y = (1 - flow.Quality) / flow.Quality * flow.VapourDensity / flow.LiquidDensity;
        Assert.All(All, model => Approx.Relative(model.VoidFractionCore(flow), 1 / (1 + (model.SlipRatioCore(flow) * y)), 1e-12, model.Name));
    }

    [Property]
    public void SlipRatio_AtTheEnds_IsItsLimit(FlowState flow)
    {
        FlowState wet = flow with { Quality = 0 }, dry = flow with { Quality = 1 };
        foreach (VoidFractionModel model in All)
        {
            Assert.False(double.IsNaN(model.SlipRatioCore(wet)), model.Name);
            Assert.False(double.IsNaN(model.SlipRatioCore(dry)), model.Name);
        }

        Assert.Equal(1, Smith.SlipRatioCore(wet), 1e-12);
        Assert.Equal(Math.Sqrt(flow.LiquidDensity / flow.VapourDensity), Chisholm.SlipRatioCore(dry), 1e-12);
        Assert.Equal(0, Baroczy.SlipRatioCore(wet));
        Assert.Equal(double.PositiveInfinity, ZuberFindlay.SlipRatioCore(dry));
        Assert.Equal(double.PositiveInfinity, WoldesemayatGhajar.SlipRatioCore(dry));
        Assert.Equal(double.PositiveInfinity, Baroczy.SlipRatioCore(dry));
        Assert.Equal(double.PositiveInfinity, ChisholmArmand.SlipRatioCore(dry));
    }

    [Property]
    public void Quality_OfAVoidFraction_GivesItBack(FlowState flow)
    {
        foreach (VoidFractionModel model in All)
        {
            double alpha = model.VoidFractionCore(flow);
            Approx.Absolute(alpha, model.VoidFractionCore(flow with { Quality = model.QualityCore(flow, alpha) }), 1e-14, model.Name);
        }
    }
}
