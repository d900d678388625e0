using TwoPhase.Flow;
using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

// The state of rest of the discrete equations, from which a run starts.
internal sealed partial class Channel<TFluid>
{
    private const int PressureSweeps = 60;

    /// <summary>Fills the cells with the state at rest for a feed flow [kg/s] and outlet pressure [Pa]; false where its pressure did not settle.</summary>
    public bool Rest(double feedFlow, double outletPressure)
    {
        OutletPressure = outletPressure;
        RestHeat();
        (_lastFeed, EndPressure, TimeShut) = (feedFlow, outletPressure, 0);
        double face = FeedEnthalpy;
        foreach (ref Cell cell in _cells.AsSpan())
        {
            cell.Head = 0;
            face += cell.HeatShare * Heat / feedFlow;
            (cell.Outflow, cell.OutEnthalpy, cell.HeatToWater) = (feedFlow, face, cell.HeatShare * Heat);
            cell.Spread = cell.Slope = cell.HeatToWater / feedFlow;
            cell.FlowEnthalpy = face - (cell.Slope / 2);
        }

        bool settled = false;
        for (int sweep = 0; sweep < PressureSweeps && !settled; sweep++)
        {
            AimPressure(outletPressure);
            double change = 0;
            foreach (ref Cell cell in _cells.AsSpan())
            {
                change = Math.Max(change, Math.Abs(cell.HeadTarget - cell.Head));
                cell.Head = cell.HeadTarget;
            }

            settled = change < 1e-9 * outletPressure;
        }

        foreach (ref Cell cell in _cells.AsSpan()) Fill(ref cell, outletPressure + cell.Head);
        RenewFilms();
        double rate = 0;
        foreach (ref Cell cell in _cells.AsSpan())
        {
            cell.Wall = cell.RestingWall(cell.HeatToWater);
            rate = Math.Max(rate, cell.WaveFactor * cell.Outflow / cell.Mass);
        }

        CourantRate = rate;
        _beyond = face;
        (Time, _feedFlow, _heat, _lastHeat, _lastStep, Stagnant) = (0, feedFlow, Heat, Heat, 0, -1);
        (_outletRate, _lastJump) = (0, -TimesFiner);
        (MeteredFlow, MeteredEnthalpy) = (feedFlow, _cells[MeteredCell].OutEnthalpy);
        OpenBooks();
        return settled;
    }

    private void Fill(ref Cell cell, double pressure)
    {
        cell.Steam = _fluid.Saturated(pressure);
        cell.PressureRate = 0;
        ref readonly SaturatedPair steam = ref cell.Steam;
        double quality = steam.Quality(cell.FlowEnthalpy), half = Math.Abs(cell.Slope) / 2;
        cell.Boundary = Math.Abs(cell.FlowEnthalpy - steam.LiquidEnthalpy) < half ? Boundary.Boiling : Math.Abs(cell.FlowEnthalpy - steam.VapourEnthalpy) < half ? Boundary.Dew : Boundary.None;
        cell.FlowQuality = Math.Min(1, Math.Max(0, quality));
        if (cell.Boundary != Boundary.None)
        {
            double held = HeldByFlow(cell, cell.Boundary, 2 * half);
            cell.Profile = new() { Spread = 2 * half, Below = cell.Boundary == Boundary.Boiling ? 1 : held, Above = cell.Boundary == Boundary.Boiling ? held : 1 };
            cell.HeldEnthalpy = cell.BoundaryEnthalpy + cell.Profile.Held(cell.FlowEnthalpy - cell.BoundaryEnthalpy);
            MeetBoundary(ref cell);
        }
        else if (quality > 0 && quality < 1)
        {
            FlowState flow = FlowOf(cell, quality);
            double alpha = _models.Slip.VoidFractionCore(flow), perMixture = (alpha / steam.VapourVolume) + ((1 - alpha) / steam.LiquidVolume);
            cell.HeldEnthalpy = steam.LiquidEnthalpy + (HeldQuality(steam, alpha) * steam.LatentHeat);
            (cell.VoidFraction, cell.QualityByVoid, cell.SlopeQuality) = (alpha, QualityByVoidAt(flow, quality, alpha), quality);
            cell.WaveFactor = WaveFactorOf(steam, perMixture, cell.QualityByVoid);
            cell.VolumeByEnthalpy = (steam.VapourVolume - steam.LiquidVolume) / steam.LatentHeat;
            cell.VolumeByMass = steam.LiquidVolume - (cell.VolumeByEnthalpy * steam.LiquidEnthalpy);
            cell.Temperature = steam.Temperature;
        }
        else
        {
            cell.HeldEnthalpy = cell.FlowEnthalpy;
            BeSinglePhase(ref cell);
        }

        cell.Mass = cell.Volume / VolumeOf(cell);
        cell.PerMass = 1 / cell.Mass;
        cell.Energy = (cell.Mass * cell.HeldEnthalpy) - (pressure * cell.Volume);
    }
}
