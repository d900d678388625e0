using TwoPhase.Passes;

namespace TwoPhase.Dynamics;

/// <summary>One finite volume of a pass: what it is, what it holds, and what the last inner step found. SI doubles.</summary>
internal struct Cell
{
    /// <summary>Section that it belongs to.</summary>
    public int Duct;

    /// <summary>Water-side volume [m³].</summary>
    public double Volume;

    /// <summary>Length along the flow path [m], and distance of the inlet face from the inlet of the pass.</summary>
    public double Length, Start;

    /// <summary>One over the flow area of all parallel tubes [1/m²], and their inside surface [m²].</summary>
    public double PerArea, Surface;

    /// <summary>One over the volume from its middle to that of the next cell [1/m³]; of the last one, over its own volume.</summary>
    public double PerSpacing;

    /// <summary>Heat capacity of its metal [J/K].</summary>
    public double Capacity;

    /// <summary>Share of the heat of the pass that it takes up, now and as the pass has it.</summary>
    public double HeatShare, OwnShare;

    /// <summary>Mass held [kg] and internal energy of that mass [J].</summary>
    public double Mass, Energy;

    /// <summary>Temperature of its metal [K].</summary>
    public double Wall;

    /// <summary>Film resistance between metal and water [K/W], 0 where the metal follows the water; and the share of a departure from rest that the metal loses in a step.</summary>
    public double FilmResistance, Decay;

    /// <summary>What the phase that it holds alone, or in part, carries heat with a little below and a little above its enthalpy, and the lower of both [J/kg].</summary>
    public PhaseTransport Phase, NextPhase;

    public double PhaseEnthalpy;

    /// <summary>Pressure over that at the outlet [Pa], and where friction, weight and acceleration would have it now.</summary>
    public double Head, HeadTarget;

    /// <summary>How fast its pressure changed in the last inner step [Pa/s].</summary>
    public double PressureRate;

    /// <summary>Loss from its middle to that of the next, or to the outlet [Pa], the outflow at which that was found [kg/s], and the loss of half of it per outflow [Pa·s/kg].</summary>
    public double Drop, DropFlow, Resistance;

    /// <summary>Loss over half of it [Pa].</summary>
    public double HalfLoss;

    /// <summary>Mass that it lets go per pressure [kg/Pa], and what comes out of it for each kilogram that comes in.</summary>
    public double Store, Swelling;

    /// <summary>Mass that each joule drives out of it [kg/J], and what its metal lets go per pressure over the share that reaches the water within a step [kg/Pa].</summary>
    public double Thrust, MetalStore;

    /// <summary>By how much its water warms with pressure where it boils, mean over the cell [K/Pa].</summary>
    public double WarmsBy;

    /// <summary>How its outflow will follow: change [kg/s] at head zero, and less for each pascal of head, both over a common divisor.</summary>
    public double Follow, FollowHead, FollowOver;

    /// <summary>Both phases at its pressure.</summary>
    public SaturatedPair Steam;

    /// <summary>One over the mass held [1/kg].</summary>
    public double PerMass;

    /// <summary>Specific enthalpy of what it holds, and of what flows, at its middle [J/kg].</summary>
    public double HeldEnthalpy, FlowEnthalpy;

    /// <summary>Change of the flowing enthalpy from face to face [J/kg], and its size as a boundary in the cell sees it.</summary>
    public double Slope, Spread;

    /// <summary>Flowing quality where it holds both phases, else 0 or 1, and void fraction.</summary>
    public double FlowQuality, VoidFraction;

    /// <summary>∂x/∂α of the slip model, 0 where not known, and the flowing quality that it was found at.</summary>
    public double QualityByVoid, SlopeQuality;

    /// <summary>∂h flowing / ∂h held: what turns the speed of mass into that of an enthalpy wave.</summary>
    public double WaveFactor;

    /// <summary>The phase boundary that stands in it, and the profile about that.</summary>
    public Boundary Boundary;

    public BentProfile Profile;

    /// <summary>Where steam runs into colder water: enthalpy of the water ahead and of the mixture behind [J/kg], mass of that [kg] and share of the volume that it fills.</summary>
    public double Ahead, Behind, MixtureMass, MixtureFills;

    /// <summary>Temperature of the water [K]; where a boundary stands (∂v/∂h)p of the part with one phase [m³/J].</summary>
    public double Temperature, SinglePhaseExpansion;

    /// <summary>a [m³/kg] and b [m³/J] of V = a M + b H, where no boundary stands; of the water where steam runs into it.</summary>
    public double VolumeByMass, VolumeByEnthalpy;

    /// <summary>Enthalpy that leaves where nothing comes in [J/kg], and by how much less for each kilogram a second that does [J·s/kg²].</summary>
    public double Still, Lead;

    /// <summary>Mass flow over the outlet face [kg/s] and the enthalpy that it carries [J/kg].</summary>
    public double Outflow, OutEnthalpy;

    /// <summary>Heat taken up by the water in the last inner step, mean over it [W].</summary>
    public double HeatToWater;

    /// <summary>Enthalpy of saturation at its boundary [J/kg]; without any, that of liquid.</summary>
    public readonly double BoundaryEnthalpy => Boundary == Boundary.Dew ? Steam.VapourEnthalpy : Steam.LiquidEnthalpy;

    public readonly double MassFlux => Outflow * PerArea;

    /// <summary>Where its metal comes to rest with a heat from the fire [K].</summary>
    public readonly double RestingWall(double fire) => Temperature + (fire * FilmResistance);
}
