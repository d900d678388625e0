using TwoPhase.Dynamics;
using TwoPhase.Passes;
using TwoPhase.Slip;
using TwoPhase.Tests.Support;
using UnitsNet;

namespace TwoPhase.Tests.Dynamics;

/// <summary>The channel of the closed forms, at rest and ready for a step.</summary>
internal static class Channels
{
    public const double Flow = UniformChannel.MassFlux * UniformChannel.Area, Pressure = 10e6;

    public static Channel<ConstantDensityFluid> Uniform(int cells, VoidFractionModel? slip = null, double? lacking = null, double? heat = null, bool metal = false)
    {
        var pass = new Pass("1", [new TubeSection("tubes", Length.FromMeters(UniformChannel.Bore), Length.FromMillimeters(88.9), Length.FromMeters(UniformChannel.Length))]);

        // A lag without end keeps the pressure where it is: the closed forms hold at constant pressure.
        var channel = new Channel<ConstantDensityFluid>(default, pass.Ducts, new(slip ?? VoidFractionModel.Homogeneous), cells)
        {
            MetalStores = metal,
            HeadLag = double.PositiveInfinity,
            Heat = heat ?? (UniformChannel.LinearHeat * UniformChannel.Length),
            FeedEnthalpy = ConstantDensityFluid.Subcooled(lacking ?? UniformChannel.Lacking),
        };
        channel.Rest(Flow, Pressure);
        return channel;
    }

    public static double MetalCapacity { get; } = Uniform(10).Cells.ToArray().Sum(cell => cell.Capacity);

    public static ChannelAnswer Answer(Channel<ConstantDensityFluid> channel) => new(
        channel.Onset,
        channel.Outlet.Outflow / UniformChannel.Area,
        default(ConstantDensityFluid).Saturated(Pressure).Quality(channel.Outlet.OutEnthalpy));
}
