namespace TwoPhase.Passes;

/// <summary>What a mole of fuel burns with and to, in moles: complete combustion with excess air.</summary>
/// <remarks>
/// <para>Dry air A = (ν + y D0) / (0.209476 − y): ν oxygen need [mol/mol], y oxygen in the dry flue gas [mol/mol], D0 what the fuel's own
/// atoms and nitrogen add to the dry flue gas, less ν [mol/mol].</para>
/// <para>Dry air: 0.209476 O2, 0.00934 Ar, 0.000314 CO2, the rest N2. Source: U.S. Standard Atmosphere, 1976, table 3.</para>
/// </remarks>
internal readonly struct FlueGas
{
    public const double OxygenInAir = 0.209476;

    private const double ArgonInAir = 0.00934, CarbonDioxideInAir = 0.000314, NitrogenInAir = 1 - OxygenInAir - ArgonInAir - CarbonDioxideInAir;
    private const double MolarMassOfAir = 28.9645, MolarMassOfWater = 18.01528;

    private readonly GasFigures _fuel;
    private readonly double _air;
    private readonly double _need;
    private readonly double _vapourInAir;

    /// <param name="fuel">The gas burnt.</param>
    /// <param name="excessOxygen">By dry volume.</param>
    /// <param name="humidity">kg of water in a kg of dry air.</param>
    public FlueGas(FuelGas fuel, double excessOxygen, double humidity)
    {
        _fuel = fuel.Figures;
        _need = fuel.OxygenNeed;
        _air = (_need + (excessOxygen * (_fuel.Carbon + _fuel.Sulphur + (_fuel.Nitrogen / 2) - _need))) / (OxygenInAir - excessOxygen);
        _vapourInAir = _air * humidity * MolarMassOfAir / MolarMassOfWater;
    }

    /// <summary>Air over the least air that burns the fuel, less 1.</summary>
    public double ExcessAir => (_air * OxygenInAir / _need) - 1;

    /// <summary>Share of water by mole in the wet flue gas.</summary>
    public double WaterShare => Water / (Water + Dry);

    private double Water => (_fuel.Hydrogen / 2) + _vapourInAir;

    private double Dry => _fuel.Carbon + _fuel.Sulphur + (_fuel.Nitrogen / 2) + _air - _need;

    /// <summary>What the air brings [J/mol of fuel].</summary>
    public double AirHeat(double t) => (_air * DryAir(t)) + (_vapourInAir * IdealGas.Water.Heat(t));

    /// <summary>What the flue gas carries away [J/mol of fuel], its water as vapour: the air that was not burnt, and what burning made.</summary>
    public double Heat(double t) =>
        (_air * DryAir(t)) - (_need * IdealGas.Oxygen.Heat(t))
        + (_fuel.Carbon * IdealGas.CarbonDioxide.Heat(t)) + (_fuel.Sulphur * IdealGas.SulphurDioxide.Heat(t))
        + (_fuel.Nitrogen / 2 * IdealGas.Nitrogen.Heat(t)) + (Water * IdealGas.Water.Heat(t));

    private static double DryAir(double t) =>
        (OxygenInAir * IdealGas.Oxygen.Heat(t)) + (ArgonInAir * IdealGas.Argon.Heat(t))
        + (CarbonDioxideInAir * IdealGas.CarbonDioxide.Heat(t)) + (NitrogenInAir * IdealGas.Nitrogen.Heat(t));
}
