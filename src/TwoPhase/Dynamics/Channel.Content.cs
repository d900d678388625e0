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
        double over = 0;
        Span<Cell> cells = _cells;
        for (int i = 0; i < cells.Length; i++)
        {
            ref Cell cell = ref cells[i];
            cell.Spread = SpreadOf(cell, step);
            bool mayCollapse = cell.Boundary == Boundary.Collapse || (over > 0 && cell.HeldEnthalpy < cell.Steam.LiquidEnthalpy);
            if (!mayCollapse || !FindCollapse(i, over)) FindBoundary(ref cell);
            over = OverSaturation(cell);
        }

        DecomposeAlike();
    }

    // The cells in which no boundary stands, by themselves: surface and slip model are long chains, and only cells that follow closely are worked on together.
    [MethodImpl(MethodImplOptions.NoInlining)]
    private void DecomposeAlike()
    {
        foreach (ref Cell cell in _cells.AsSpan())
        {
            if (cell.Boundary != Boundary.None) continue;
            if (cell.HeldEnthalpy > cell.Steam.LiquidEnthalpy && cell.HeldEnthalpy < cell.Steam.VapourEnthalpy) Part(ref cell);
            else BeSinglePhase(ref cell);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private void BeSinglePhase(ref Cell cell)
    {
        FluidPoint point = _fluid.At(cell.Steam.Pressure, cell.HeldEnthalpy, cell.Steam);
        cell.FlowEnthalpy = cell.HeldEnthalpy;
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
            Quality = quality,
            MassFlux = cell.MassFlux,
            Bore = duct.Bore,
            Inclination = duct.Inclination,
        };
    }
}
