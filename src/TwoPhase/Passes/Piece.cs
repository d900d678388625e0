namespace TwoPhase.Passes;

/// <summary>A stretch of one section over which the heat flux is linear, seen from its downstream end.</summary>
internal readonly struct Piece(int duct, double end, double length, double enthalpy, double heatAtEnd, double heatAtBegin, double flow)
{
    public int Duct { get; } = duct;

    /// <summary>Position of its downstream end [m].</summary>
    public double End { get; } = end;

    public double Length { get; } = length;

    private readonly double _enthalpy = enthalpy, _heat = heatAtEnd, _slope = (heatAtBegin - heatAtEnd) / length, _flow = flow;

    /// <summary>h at a distance up from the downstream end [J/kg].</summary>
    public double EnthalpyAt(double distance) => _enthalpy - (distance * (_heat + (_slope * distance / 2)) / _flow);

    /// <summary>Heat per length there [W/m].</summary>
    public double LinearHeatAt(double distance) => _heat + (_slope * distance);
}
