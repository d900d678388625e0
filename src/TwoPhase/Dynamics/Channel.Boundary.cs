using System.Runtime.CompilerServices;
using TwoPhase.Flow;
using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// A cell that boils, or has dried, in part. All that is found of it is a mean over both parts, so that nothing jumps while the boundary
// walks from cell to cell: a jump would be taken for a change of volume, and leave as a shock.
internal sealed partial class Channel<TFluid>
{
    // A profile that stands about a boundary turns no faster than new water comes in: were it to jump with the limiter, the cell's volume would.
    private static double SpreadOf(in Cell cell, double step)
    {
        double wanted = Math.Abs(cell.Slope);
        return cell.Boundary is Boundary.None or Boundary.Collapse ? wanted : cell.Spread + (Math.Min(1, step * cell.Outflow * cell.PerMass) * (wanted - cell.Spread));
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void FindBoundary(ref Cell cell)
    {
        cell.Boundary = Boundary.None;
        ref readonly SaturatedPair steam = ref cell.Steam;
        double spread = cell.Spread, boiling = cell.HeldEnthalpy - steam.LiquidEnthalpy, dew = cell.HeldEnthalpy - steam.VapourEnthalpy;
        if (cell.Slope > 0 && boiling > -spread / 2 && boiling < 2 * spread) Place(ref cell, Boundary.Boiling, new() { Spread = spread, Below = 1, Above = HeldByFlow(cell, Boundary.Boiling, spread) }, boiling);
        else if (dew < spread / 2 && dew > -2 * spread) Place(ref cell, Boundary.Dew, new() { Spread = spread, Below = HeldByFlow(cell, Boundary.Dew, spread), Above = 1 }, dew);
    }

    private void Place(ref Cell cell, Boundary boundary, BentProfile profile, double held)
    {
        if (!profile.Holds(held)) return;
        cell.Boundary = boundary;
        cell.Profile = profile;
        cell.FlowEnthalpy = cell.BoundaryEnthalpy + profile.Flow(held);
        MeetBoundary(ref cell);
    }

    // ∂h held / ∂h flowing beside a boundary: the chord to the middle of the wet part as the last step left it.
    private double HeldByFlow(in Cell cell, Boundary boundary, double spread)
    {
        ref readonly SaturatedPair steam = ref cell.Steam;
        bool boils = boundary == Boundary.Boiling;
        double part = boils ? cell.FlowEnthalpy - steam.LiquidEnthalpy : steam.VapourEnthalpy - cell.FlowEnthalpy;
        double middle = part > spread / 2 ? part : Math.Max(part + (spread / 2), spread / 50) / 2;
        double share = middle / steam.LatentHeat, x = boils ? share : 1 - share;
        double q = HeldQuality(steam, _models.Slip.VoidFractionCore(FlowOf(cell, x)));
        return boils ? q / x : (1 - q) / share;
    }

    private static double HeldQuality(in SaturatedPair steam, double alpha) => alpha / (alpha + ((1 - alpha) * steam.VapourVolume / steam.LiquidVolume));

    // Temperature, expansion of the single-phase part and speed of waves: means over both parts.
    private void MeetBoundary(ref Cell cell)
    {
        ref readonly SaturatedPair steam = ref cell.Steam;
        bool boils = cell.Boundary == Boundary.Boiling;
        double saturated = cell.BoundaryEnthalpy, sign = boils ? -1 : 1, single = Math.Max(1, sign * (cell.FlowEnthalpy - saturated) + (cell.Profile.Spread / 2)) / 2;
        FluidPoint point = _fluid.At(steam.Pressure, saturated + (sign * single), steam);
        bool chord = single > Beside;
        double heating = (point.Temperature - steam.Temperature) / (sign * single);
        cell.SinglePhaseExpansion = chord ? (point.SpecificVolume - (boils ? steam.LiquidVolume : steam.VapourVolume)) / (sign * single) : point.VolumeByEnthalpy;
        double held = cell.HeldEnthalpy - saturated, over = cell.Profile.Over(held, out _);
        double quality = steam.Quality(cell.FlowEnthalpy), share = ShareThatBoils(cell);
        cell.Temperature = steam.Temperature + (heating * (boils ? held - over : over));
        cell.FlowQuality = Math.Min(1, Math.Max(0, quality));
        cell.QualityByVoid = 0;
        cell.WaveFactor = 1 / ((1 - share) + (share * (boils ? cell.Profile.Above : cell.Profile.Below)));
    }

    // Part of the cell in which both phases flow.
    private static double ShareThatBoils(in Cell cell)
    {
        double spread = cell.Profile.Spread;
        return cell.Boundary switch
        {
            Boundary.Boiling => ((cell.FlowEnthalpy - cell.Steam.LiquidEnthalpy) / spread) + 0.5,
            Boundary.Dew => ((cell.Steam.VapourEnthalpy - cell.FlowEnthalpy) / spread) + 0.5,
            Boundary.Collapse => cell.MixtureMass / cell.Mass,
            _ => cell.FlowQuality > 0 && cell.FlowQuality < 1 ? 1 : 0,
        };
    }
}
