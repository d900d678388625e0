using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// How volume follows from enthalpy in a cell: one branch, or two where a boundary stands in it.
internal sealed partial class Channel<TFluid>
{
    // Outflow that leaves a cell without a boundary exactly full after a step: V = a M + b H there, so what swells in the cell, and the volume of what
    // comes in, is the volume of what goes out. That carries the enthalpy "still", less "lead" for each kilogram a second that comes in.
    private static double OutflowOf(in Cell cell, double perStep, double heated, double inflow, double inEnthalpy, double still, double lead)
    {
        double a = cell.VolumeByMass, b = cell.VolumeByEnthalpy;
        double swelling = ((a * cell.Mass) + (b * (heated + (cell.Steam.Pressure * cell.Volume))) - cell.Volume) * perStep;
        return (swelling + (inflow * (a + (b * inEnthalpy)))) / (a + (b * still) - (b * lead * inflow));
    }

    private static double VolumeOf(in Cell cell) => cell.Boundary != Boundary.None
        ? ClosureOf(cell).Volume(cell.HeldEnthalpy, out _)
        : cell.VolumeByMass + (cell.VolumeByEnthalpy * cell.HeldEnthalpy);

    private static VolumeClosure ClosureOf(in Cell cell)
    {
        ref readonly SaturatedPair steam = ref cell.Steam;
        double wet = (steam.VapourVolume - steam.LiquidVolume) / steam.LatentHeat, single = cell.SinglePhaseExpansion;
        return cell.Boundary == Boundary.Boiling
            ? new() { Volume0 = steam.LiquidVolume, Boundary = steam.LiquidEnthalpy, Expansion0 = single, Step = wet - single, Profile = cell.Profile }
            : new() { Volume0 = steam.VapourVolume, Boundary = steam.VapourEnthalpy, Expansion0 = wet, Step = single - wet, Profile = cell.Profile };
    }
}
