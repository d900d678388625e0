using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// How volume follows from enthalpy in a cell: one branch, or two where a boundary stands in it.
internal sealed partial class Channel<TFluid>
{
    private static VolumeClosure ClosureOf(in Cell cell)
    {
        SaturatedPair steam = cell.Steam;
        double wet = (steam.VapourVolume - steam.LiquidVolume) / steam.LatentHeat, single = cell.SinglePhaseExpansion;
        return cell.Boundary switch
        {
            Boundary.Boiling => new() { Volume0 = steam.LiquidVolume, Enthalpy0 = steam.LiquidEnthalpy, Expansion0 = single, Boundary = steam.LiquidEnthalpy, Step = wet - single, Profile = cell.Profile },
            Boundary.Dew => new() { Volume0 = steam.VapourVolume, Enthalpy0 = steam.VapourEnthalpy, Expansion0 = wet, Boundary = steam.VapourEnthalpy, Step = single - wet, Profile = cell.Profile },
            _ when cell.FlowQuality > 0 && cell.FlowQuality < 1 => new() { Volume0 = steam.LiquidVolume, Enthalpy0 = steam.LiquidEnthalpy, Expansion0 = wet },
            _ => new() { Volume0 = cell.SinglePhaseVolume, Enthalpy0 = cell.HeldEnthalpy, Expansion0 = single },
        };
    }
}
