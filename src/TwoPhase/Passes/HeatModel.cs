using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Passes;

/// <summary>From fuel and stack to the heat absorbed by the water, and its split between radiant section and convection bank.</summary>
/// <remarks>
/// <para>Indirect (heat loss) balance over 25 °C per mole of fuel: absorbed = net heating value + heat of the air − heat of the flue
/// gas at the stack − shell loss. Complete combustion, no condensation, and the fuel comes at 25 °C.
/// Source: the energy balance method of ASME PTC 4; gas enthalpies, air and heating values from the sources named at
/// <see cref="FiringConditions"/> and <see cref="FuelGas"/>.</para>
/// <para>Shell loss: a heat that does not change with firing, given as a share of the net release at full firing.</para>
/// <para>Split: the radiant section absorbs μ of the net release, μ = 1/(1 + S), where S = 1/μ − 1 grows as (air/air0) √(fuel/fuel0)
/// from full firing (index 0): more air or more fuel sends heat to the convection bank. Convective share = 1 − μ·release/absorbed,
/// kept within 0 and 1. Range: firing from about 30 % up, common practice, no source.
/// Source: Orrok and Hudson, as given by Kern, Process Heat Transfer (1950), chapter 19.</para>
/// </remarks>
public sealed class HeatModel
{
    private const double Atmosphere = 101325;

    private readonly double _fullAir;
    private readonly double _fullRatio;

    /// <summary>A model from one state at full firing.</summary>
    /// <param name="fuel">What is burnt.</param>
    /// <param name="fullFiring">Conditions at 100 % firing.</param>
    /// <param name="shellLoss">Loss through the casing at full firing over the net heat release, zero or more; your own figure.</param>
    /// <param name="convectiveShare">Share of the absorbed heat that the convection bank takes at full firing, within 0 and 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its limits, or no heat is left at full firing.</exception>
    public HeatModel(FuelGas fuel, FiringConditions fullFiring, Ratio shellLoss, Ratio convectiveShare)
    {
        Fuel = Require.NotNull(fuel, nameof(fuel));
        FullFiring = fullFiring;
        Require.Positive(fullFiring.RawFuelFlow, "Fuel flow at full firing", Scale.CubicMetresPerSecond, nameof(fullFiring));
        double share = RawConvectiveShare = convectiveShare.Si();
        if (share is not (> 0 and < 1)) throw Require.OutOfRange(share, "Convective share", Scale.None, nameof(convectiveShare), "must lie between 0 and 1");
        RawShellShare = Require.NotNegative(shellLoss.Si(), "Shell loss", Scale.None, nameof(shellLoss));
        RawShellLoss = RawShellShare * fullFiring.RawFuelFlow * fuel.MolesPerVolume * fuel.RawNet;
        FiredHeat full = Balance(fullFiring);
        if (full.RawAbsorbed <= 0) throw Require.OutOfRange(full.RawStackLoss + full.RawShellLoss, "Losses at full firing", Scale.Megawatts, nameof(fullFiring), $"must be below {Scale.Megawatts.Text(full.RawReleasedNet + full.RawAirHeat)}, the heat released");
        double radiant = (1 - share) * full.RawAbsorbed / full.RawReleasedNet;
        _fullRatio = Math.Max(0, (1 / radiant) - 1);
        _fullAir = 1 + full.RawExcessAir;
    }

    /// <summary>What is burnt.</summary>
    public FuelGas Fuel { get; }

    /// <summary>Conditions at 100 % firing.</summary>
    public FiringConditions FullFiring { get; }

    /// <summary>Loss through the casing.</summary>
    public Power ShellLoss => Power.FromWatts(RawShellLoss);

    /// <summary>The split law of your own; null for that of Orrok and Hudson.</summary>
    public Func<FiringConditions, Ratio>? Split { get; private set; }

    internal double RawShellShare { get; }

    internal double RawConvectiveShare { get; }

    private double RawShellLoss { get; }

    /// <summary>The model with a split law of your own.</summary>
    /// <param name="split">Share of the absorbed heat that the convection bank takes, 0 to 1.</param>
    public HeatModel WithSplit(Func<FiringConditions, Ratio> split)
    {
        var copy = (HeatModel)MemberwiseClone();
        copy.Split = Require.NotNull(split, nameof(split));
        return copy;
    }

    /// <summary>Conditions at another firing: its share of the fuel, all else as at full firing until a <c>With…</c> says otherwise.</summary>
    /// <param name="firing">Share of full firing, zero or more.</param>
    public FiringConditions AtFiring(Ratio firing) =>
        FullFiring with { RawFuelFlow = FullFiring.RawFuelFlow * Require.NotNegative(firing.Si(), "Firing", Scale.None, nameof(firing)) };

    /// <summary>The heat of a fire.</summary>
    /// <param name="conditions">Fuel and stack.</param>
    /// <exception cref="ArgumentException">The conditions are empty.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The split law of your own leaves 0 to 1.</exception>
    public FiredHeat Burn(FiringConditions conditions)
    {
        if (conditions == default) throw new ArgumentException("The firing conditions are empty.", nameof(conditions));
        FiredHeat heat = Balance(conditions);
        return heat.RawAbsorbed > 0 ? heat with { RawConvectiveShare = Share(conditions, heat) } : heat;
    }

    private FiredHeat Balance(FiringConditions conditions)
    {
        double moles = conditions.RawFuelFlow * Fuel.MolesPerVolume;
        var flue = new FlueGas(Fuel, conditions.RawExcessOxygen, conditions.RawAirHumidity);
        double net = moles * Fuel.RawNet, air = moles * flue.AirHeat(conditions.RawAirTemperature), stack = moles * flue.Heat(conditions.RawStackTemperature);
        double vapour = flue.WaterShare * Atmosphere;
        return new()
        {
            RawReleasedGross = moles * Fuel.RawGross,
            RawReleasedNet = net,
            RawAirHeat = air,
            RawStackLoss = stack,
            RawShellLoss = Math.Min(RawShellLoss, Math.Max(0, net + air - stack)),
            RawExcessAir = flue.ExcessAir,
            RawWaterDewPoint = vapour < SaturationLine.LowestPressure ? double.NaN : SaturationLine.Temperature(vapour),
        };
    }

    private double Share(FiringConditions conditions, FiredHeat heat)
    {
        if (Split is not null) return Require.Within(Split(conditions).Si(), 0, 1, "Convective share of the split law", Scale.None, nameof(conditions));
        double ratio = _fullRatio * (1 + heat.RawExcessAir) / _fullAir * Math.Sqrt(conditions.RawFuelFlow / FullFiring.RawFuelFlow);
        return Math.Min(1, Math.Max(0, 1 - (heat.RawReleasedNet / ((1 + ratio) * heat.RawAbsorbed))));
    }
}
