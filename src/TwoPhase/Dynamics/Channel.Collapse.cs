using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// Steam that runs into colder water: a slug of cold or early water between boiling water and the outlet. There the enthalpy does not slope
// through saturation but jumps, mixture behind and water ahead, and the cell holds both apart: what comes in joins the mixture, the metal that it
// sweeps over condenses some of it, and it drives out water until it has filled the cell. As one mean a cell would hold no steam until
// it is all but full, then swell at once: the slug would leave in blows, each of which raises the pressure behind it.
internal sealed partial class Channel<TFluid>
{
    // "Over" says how far what the cell before holds is above saturation.
    private bool FindCollapse(int i, double over)
    {
        ref Cell cell = ref _cells[i];
        double saturated = cell.Steam.LiquidEnthalpy;
        if (cell.Boundary != Boundary.Collapse)
        {
            if (_cells[i - 1].Boundary == Boundary.Collapse) return false;
            (cell.MixtureMass, cell.Behind) = (0, saturated + over);
        }

        double water = cell.Mass - cell.MixtureMass;
        cell.Ahead = ((cell.HeldEnthalpy * cell.Mass) - (cell.Behind * cell.MixtureMass)) / water;
        if (!(water > 0 && cell.Ahead < saturated && cell.Behind > saturated && cell.Behind < cell.Steam.VapourEnthalpy)) return false;
        FluidPoint point = _fluid.At(cell.Steam.Pressure, cell.Ahead, cell.Steam);
        cell.MixtureFills = cell.MixtureMass * FlowingVolume(cell.Steam, cell.Behind) / cell.Volume;
        (cell.VolumeByMass, cell.VolumeByEnthalpy) = (point.SpecificVolume - (point.VolumeByEnthalpy * cell.Ahead), point.VolumeByEnthalpy);
        cell.Temperature = point.Temperature + (cell.MixtureFills * (cell.Steam.Temperature - point.Temperature));
        (cell.Boundary, cell.FlowEnthalpy, cell.FlowQuality, cell.QualityByVoid, cell.WaveFactor) = (Boundary.Collapse, cell.Ahead, 0, 0, 1);
        return true;
    }

    private static double OverSaturation(in Cell cell) => cell.HeldEnthalpy - cell.Steam.LiquidEnthalpy;

    private static bool HoldsSteam(in Cell cell) => cell.Boundary is Boundary.Boiling or Boundary.Dew || cell.FlowQuality > 0;

    // Water leaves from its colder end: on a line through its mean and that of the next cell, whose warmer end does not boil.
    private double WaterLeaving(int i)
    {
        ref readonly Cell cell = ref _cells[i];
        if (i + 1 == _cells.Length) return cell.Ahead;
        double fills = Math.Max(0, 1 - cell.MixtureFills), fall = Math.Max(0, cell.Ahead - _cells[i + 1].FlowEnthalpy) * fills / (1 + fills);
        return cell.Ahead - Math.Min(fall, cell.Steam.LiquidEnthalpy - cell.Ahead);
    }

    /// <summary>Outflow of a cell that mixture sweeps, or enters in this step.</summary>
    /// <param name="i">Index of the cell.</param>
    /// <param name="step">Length of the step [s].</param>
    /// <param name="mass">Mass with the inflow of the step, before the outflow [kg].</param>
    /// <param name="content">Enthalpy likewise [J].</param>
    /// <param name="mixture">What came in as mixture, then what leaves so.</param>
    /// <param name="outEnthalpy">Enthalpy of the water that leaves [J/kg], then the mean of all that leaves.</param>
    private double Sweep(int i, double step, double mass, double content, ref Portion mixture, ref double outEnthalpy)
    {
        ref Cell cell = ref _cells[i];
        bool sweeps = cell.Boundary == Boundary.Collapse;
        if (!sweeps) (cell.MixtureMass, cell.Behind, cell.Ahead) = (0, 0, cell.HeldEnthalpy);
        double behind = cell.MixtureMass + mixture.Mass, water = mass - behind;
        double enthalpy = ((cell.MixtureMass * cell.Behind) + (mixture.Mass * mixture.Enthalpy) + (sweeps ? step * MixtureHeat(cell, step) : 0)) / behind;

        // Vapour that runs ahead of the mixture condenses in the water before it: what is held behind is no richer than in the cell before.
        double held = cell.Steam.LiquidEnthalpy + Math.Max(0, OverSaturation(_cells[i - 1]));
        if (sweeps && enthalpy > held)
        {
            double taken = Math.Min(water / 2, behind * (enthalpy - held) / (held - cell.Ahead));
            enthalpy += (cell.Ahead - enthalpy) * taken / (behind + taken);
            (behind, water) = (behind + taken, water - taken);
        }

        double volume = FlowingVolume(cell.Steam, enthalpy), a = cell.VolumeByMass, b = cell.VolumeByEnthalpy;
        double outflow = ((a * water) + (b * (content - (behind * enthalpy))) + (behind * volume) - cell.Volume) / (step * (a + (b * outEnthalpy)));
        mixture = default;
        cell.Boundary = enthalpy > cell.Steam.LiquidEnthalpy ? Boundary.Collapse : Boundary.None;
        if (step * outflow >= water)
        {
            // All water is gone within the step, and mixture follows it into the next cell.
            double left = cell.Volume / volume;
            outflow = (mass - left) / step;
            outEnthalpy = (content - (left * enthalpy)) / (step * outflow);
            if (enthalpy > cell.Steam.LiquidEnthalpy) mixture = new(behind - left, enthalpy);
            (behind, cell.Boundary) = (left, Boundary.None);
        }
        else
        {
            // Water taken from the colder end leaves warmer water, but none that boils.
            double boils = content - (behind * enthalpy) - (step * outflow * outEnthalpy) - ((water - (step * outflow)) * cell.Steam.LiquidEnthalpy);
            if (boils > 0 && outflow > 0) outEnthalpy += boils / (step * outflow);
        }

        (cell.MixtureMass, cell.Behind) = (behind, enthalpy);
        return outflow;
    }

    // Heat to the mixture [W]: it has saturation temperature, the cell the mean of both parts, and the metal one temperature.
    private double MixtureHeat(in Cell cell, double step)
    {
        double conductance = MetalStores ? cell.Capacity * cell.Decay / step : 0;
        return cell.MixtureFills * (cell.HeatToWater - (conductance * (cell.Steam.Temperature - cell.Temperature)));
    }

    /// <summary>Mass [kg] and its specific enthalpy [J/kg].</summary>
    private readonly record struct Portion(double Mass, double Enthalpy);
}
