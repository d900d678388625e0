using TwoPhase.Flow;
using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// What a cell holds at its new pressure, and what flows out of such a mixture.
internal sealed partial class Channel<TFluid>
{
    // Nearer to saturation than this the tangent stands for the chord [J/kg].
    private const double Beside = 1e3;

    private void Decompose(double step, double outletPressure)
    {
        for (int i = 0; i < _cells.Length; i++)
        {
            ref Cell cell = ref _cells[i];
            cell.Head += cell.HeadChange;
            double pressure = outletPressure + cell.Head;
            cell.PressureRate = (pressure - cell.Steam.Pressure) / step;
            cell.Steam = _fluid.Saturated(pressure);
            cell.HeldEnthalpy = (cell.Energy + (pressure * cell.Volume)) / cell.Mass;
            cell.Spread = SpreadOf(cell, step);
            Decompose(ref cell);
            Warm(ref cell, step);
        }
    }

    private void Decompose(ref Cell cell)
    {
        FindBoundary(ref cell);
        double saturated = cell.BoundaryEnthalpy, quality = cell.Steam.Quality(cell.HeldEnthalpy);
        if (cell.Boundary != Boundary.None)
        {
            cell.FlowEnthalpy = saturated + cell.Profile.Flow(cell.HeldEnthalpy - saturated);
            MeetBoundary(ref cell);
        }
        else if (quality > 0 && quality < 1)
        {
            cell.Temperature = cell.Steam.Temperature;
            Part(ref cell, quality);
        }
        else
        {
            cell.FlowEnthalpy = cell.HeldEnthalpy;
            BeSinglePhase(ref cell, quality);
        }
    }

    private void BeSinglePhase(ref Cell cell, double quality)
    {
        FluidPoint point = _fluid.At(cell.Steam.Pressure, cell.HeldEnthalpy, cell.Steam);
        (cell.Temperature, cell.SinglePhaseVolume, cell.SinglePhaseExpansion) = (point.Temperature, point.SpecificVolume, point.VolumeByEnthalpy);
        cell.FlowQuality = quality <= 0 ? 0 : 1;
        cell.VoidByQuality = 0;
        cell.WaveFactor = 1;
    }

    private FlowState FlowOf(in Cell cell)
    {
        ref readonly Duct duct = ref _ducts[cell.Duct];
        return new()
        {
            Pressure = cell.Steam.Pressure,
            SaturationTemperature = cell.Steam.Temperature,
            LiquidDensity = 1 / cell.Steam.LiquidVolume,
            VapourDensity = 1 / cell.Steam.VapourVolume,
            LiquidViscosity = cell.Steam.LiquidViscosity,
            VapourViscosity = cell.Steam.VapourViscosity,
            LatentHeat = cell.Steam.LatentHeat,
            SurfaceTension = cell.Steam.SurfaceTension,
            Quality = cell.FlowQuality,
            MassFlux = cell.MassFlux,
            Bore = duct.Bore,
            Inclination = duct.Inclination,
        };
    }
}
