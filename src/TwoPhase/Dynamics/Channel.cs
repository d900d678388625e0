using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

/// <summary>Mass, energy and metal energy along a pass in time.</summary>
/// <remarks>
/// <para>Finite volumes that hold mass M and internal energy U. Per inner step, from inlet to outlet: dM/dt = ṁin − ṁout,
/// dU/dt = ṁin hin − ṁout hout + Q, and ṁout from the volume V = M v̄(p, (U + p V)/M) that the cell keeps full. Inside the dome that is
/// linear, V = a(p) M + b(p) H, so mass, energy and volume close to round-off without a global solve.</para>
/// <para>The enthalpy that flows out is reconstructed to second order (limiters: van Leer, J. Comput. Phys. 23, 276-299 (1977); Roe,
/// Annu. Rev. Fluid Mech. 18, 337-365 (1986)) and centred in time (Hancock's half step). Slip enters the flux only: what flows is richer in vapour than what is held.</para>
/// <para>A cell in which a phase boundary stands is the mean over both parts (<see cref="BentProfile"/>), volume, film and temperature alike, so
/// that nothing jumps while the boundary walks from cell to cell.</para>
/// <para>Metal: C dTw/dt = Qfire − U A (Tw − T), in closed form over a step.</para>
/// </remarks>
internal sealed partial class Channel<TFluid>
    where TFluid : struct, IPassFluid
{
    private readonly TFluid _fluid;
    private readonly Duct[] _ducts;
    private readonly Cell[] _cells;
    private readonly PassModels _models;
    private double _lastFeed;

    public Channel(in TFluid fluid, Duct[] ducts, PassModels models, int cells)
    {
        _fluid = fluid;
        _ducts = ducts;
        _models = models;
        _cells = Mesh.Cut(ducts, cells);
        MeteredCell = _cells.Length - 1;
    }

    /// <summary>The cells from inlet to outlet.</summary>
    public ReadOnlySpan<Cell> Cells => _cells;

    /// <summary>Heat that the fire asks for [W], at rest what the pass takes up.</summary>
    public double Heat { get; set; }

    /// <summary>Enthalpy of the feed [J/kg].</summary>
    public double FeedEnthalpy { get; set; }

    /// <summary>Whether the metal stores heat; without, all heat goes straight into the water.</summary>
    public bool MetalStores { get; set; } = true;

    /// <summary>The highest Courant number per second of step [1/s]: a step must stay below its inverse.</summary>
    public double CourantRate { get; private set; }

    /// <summary>Index of the cell whose outflow stagnated, reversed or would have emptied it in the last step; −1 for none.</summary>
    public int Stagnant { get; private set; } = -1;

    public ref readonly Cell Outlet => ref _cells[^1];

    /// <summary>Pressure at the inlet face [Pa].</summary>
    public double InletPressure => EndPressure + _cells[0].Head + _cells[0].HalfLoss;

    /// <summary>One inner step; the pressure at the end of the pass is that at its end.</summary>
    public void Step(double step, double feedFlow, double endPressure)
    {
        Stagnant = -1;
        RenewDecay(step);
        ForeseeFlow(step, feedFlow, (endPressure - EndPressure) / step);
        MovePressure(step, endPressure);
        Decompose(step);
        WarmMetal(step);
        March(step, feedFlow);
        (_lastFeed, EndPressure) = (feedFlow, endPressure);
    }
}
