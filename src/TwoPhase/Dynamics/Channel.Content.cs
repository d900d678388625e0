using System.Runtime.CompilerServices;
using TwoPhase.Flow;
using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// What a cell holds at its new pressure, and what flows out of such a mixture.
internal sealed partial class Channel<TFluid>
{
    // Nearer to saturation than this the tangent stands for the chord [J/kg].
    private const double Beside = 1e3;

    private void Decompose(double step)
    {
        double perStep = 1 / step;
        for (int i = 0; i < _cells.Length; i++)
        {
            ref Cell cell = ref _cells[i];
            cell.Spread = SpreadOf(cell, step);
            if (!FindCollapse(i)) Decompose(ref cell);
            Warm(ref cell, perStep);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void Decompose(ref Cell cell)
    {
        FindBoundary(ref cell);
        if (cell.Boundary != Boundary.None)
        {
            double saturated = cell.BoundaryEnthalpy;
            cell.FlowEnthalpy = saturated + cell.Profile.Flow(cell.HeldEnthalpy - saturated);
            MeetBoundary(ref cell);
        }
        else if (cell.HeldEnthalpy > cell.Steam.LiquidEnthalpy && cell.HeldEnthalpy < cell.Steam.VapourEnthalpy)
        {
            cell.Temperature = cell.Steam.Temperature;
            Part(ref cell);
        }
        else
        {
            cell.FlowEnthalpy = cell.HeldEnthalpy;
            BeSinglePhase(ref cell);
        }
    }

    private void BeSinglePhase(ref Cell cell)
    {
        FluidPoint point = _fluid.At(cell.Steam.Pressure, cell.HeldEnthalpy, cell.Steam);
        cell.Temperature = point.Temperature;
        (cell.VolumeByMass, cell.VolumeByEnthalpy) = (point.SpecificVolume - (point.VolumeByEnthalpy * cell.HeldEnthalpy), point.VolumeByEnthalpy);
        cell.FlowQuality = cell.HeldEnthalpy <= cell.Steam.LiquidEnthalpy ? 0 : 1;
        cell.QualityByVoid = 0;
        cell.WaveFactor = 1;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private FlowState FlowOf(in Cell cell, double quality)
    {
        ref readonly Duct duct = ref _ducts[cell.Duct];
        double perVolumes = 1 / (cell.Steam.LiquidVolume * cell.Steam.VapourVolume);
        return new()
        {
            Pressure = cell.Steam.Pressure,
            SaturationTemperature = cell.Steam.Temperature,
            LiquidDensity = cell.Steam.VapourVolume * perVolumes,
            VapourDensity = cell.Steam.LiquidVolume * perVolumes,
            LiquidViscosity = cell.Steam.LiquidViscosity,
            VapourViscosity = cell.Steam.VapourViscosity,
            LatentHeat = cell.Steam.LatentHeat,
            SurfaceTension = cell.Steam.SurfaceTension,
            Quality = quality,
            MassFlux = cell.MassFlux,
            Bore = duct.Bore,
            Inclination = duct.Inclination,
        };
    }
}
