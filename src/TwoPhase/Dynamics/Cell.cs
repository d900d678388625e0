using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

/// <summary>One finite volume of a pass: what it is, what it holds, and what the last inner step found. SI doubles.</summary>
internal struct Cell
{
    /// <summary>Section that it belongs to.</summary>
    public int Duct;

    /// <summary>Water-side volume [m³], and that of the pass up to the inlet face.</summary>
    public double Volume, VolumeBefore;

    /// <summary>Length along the flow path [m], and distance of the inlet face from the inlet of the pass.</summary>
    public double Length, Start;

    /// <summary>Flow area of all parallel tubes [m²], and their inside surface [m²].</summary>
    public double Area, Surface;

    /// <summary>Heat capacity of its metal [J/K].</summary>
    public double Capacity;

    /// <summary>Share of the heat of the pass that it takes up, now and as the pass has it.</summary>
    public double HeatShare, OwnShare;

    /// <summary>Mass held [kg] and internal energy of that mass [J].</summary>
    public double Mass, Energy;

    /// <summary>Temperature of its metal [K].</summary>
    public double Wall;

    /// <summary>Film conductance between metal and water [W/K].</summary>
    public double Conductance;

    /// <summary>What the phase that it holds alone, or in part, carries heat with, and the enthalpy at which that was found [J/kg].</summary>
    public PhaseTransport Phase;

    public double PhaseEnthalpy;

    /// <summary>Pressure over that at the outlet [Pa], and where friction, weight and acceleration would have it now.</summary>
    public double Head, HeadTarget;

    /// <summary>By how much its pressure over that at the outlet changes in this inner step [Pa], and its pressure changed in the last [Pa/s].</summary>
    public double HeadChange, PressureRate;

    /// <summary>Loss from its middle to that of the next, or to the outlet [Pa], the outflow at which that was found [kg/s], and the loss of half of it per outflow [Pa·s/kg].</summary>
    public double Drop, DropFlow, Resistance;

    /// <summary>Loss over half of it [Pa].</summary>
    public double HalfLoss;

    /// <summary>Mass that it lets go per pressure [kg/Pa], and what comes out of it for each kilogram that comes in.</summary>
    public double Store, Swelling;

    /// <summary>How its outflow will follow: change [kg/s] at head zero, and less for each pascal of head.</summary>
    public double Follow, FollowHead;

    /// <summary>Both phases at its pressure.</summary>
    public SaturatedPair Steam;

    /// <summary>Specific enthalpy of what it holds, and of what flows, at its middle [J/kg].</summary>
    public double HeldEnthalpy, FlowEnthalpy;

    /// <summary>Change of the flowing enthalpy from face to face [J/kg], and its size as a boundary in the cell sees it.</summary>
    public double Slope, Spread;

    /// <summary>Flowing quality where it holds both phases, else 0 or 1, and void fraction.</summary>
    public double FlowQuality, VoidFraction;

    /// <summary>∂α/∂x of the slip model, 0 where not known, and the flowing quality that it was found at.</summary>
    public double VoidByQuality, SlopeQuality;

    /// <summary>∂h flowing / ∂h held: what turns the speed of mass into that of an enthalpy wave.</summary>
    public double WaveFactor;

    /// <summary>The phase boundary that stands in it, and the profile about that.</summary>
    public Boundary Boundary;

    public BentProfile Profile;

    /// <summary>Temperature of the water [K], and of one phase alone v [m³/kg] and (∂v/∂h)p [m³/J].</summary>
    public double Temperature, SinglePhaseVolume, SinglePhaseExpansion;

    /// <summary>Mass flow over the outlet face [kg/s] and the enthalpy that it carries [J/kg].</summary>
    public double Outflow, OutEnthalpy;

    /// <summary>Heat taken up by the water in the last inner step, mean over it [W].</summary>
    public double HeatToWater;

    /// <summary>Enthalpy of saturation at its boundary [J/kg]; without any, that of liquid.</summary>
    public readonly double BoundaryEnthalpy => Boundary == Boundary.Dew ? Steam.VapourEnthalpy : Steam.LiquidEnthalpy;

    public readonly double MassFlux => Outflow / Area;

    /// <summary>Where its metal comes to rest with a heat from the fire [K].</summary>
    public readonly double RestingWall(double fire) => Conductance > 0 ? Temperature + (fire / Conductance) : Temperature;
}
