using System.Globalization;
using UnitsNet;
using UnitsNet.Units;

namespace TwoPhase.Units;

/// <summary>Units that our own table does not spell: asked of UnitsNet, in invariant culture, and taken at their size there.</summary>
internal static class UnitsNetFallback
{
    public static LinearMap? Find(string text, UnitKind kind) => kind switch
    {
        UnitKind.PressureDifference => Size<PressureUnit>(text, unit => new Pressure(1, unit).Si()),
        UnitKind.MassFlow => Size<MassFlowUnit>(text, unit => new MassFlow(1, unit).Si()),
        UnitKind.Length => Size<LengthUnit>(text, unit => new Length(1, unit).Si()),
        UnitKind.Area => Size<AreaUnit>(text, unit => new Area(1, unit).Si()),
        UnitKind.Volume => Size<VolumeUnit>(text, unit => new Volume(1, unit).Si()),
        UnitKind.Mass => Size<MassUnit>(text, unit => new Mass(1, unit).Si()),
        UnitKind.Duration => Size<DurationUnit>(text, unit => new Duration(1, unit).Si()),
        UnitKind.Angle => Size<AngleUnit>(text, unit => new Angle(1, unit).Si()),
        UnitKind.Power => Size<PowerUnit>(text, unit => new Power(1, unit).Si()),
        UnitKind.Density => Size<DensityUnit>(text, unit => new Density(1, unit).Si()),
        UnitKind.SpecificEnergy => Size<SpecificEnergyUnit>(text, unit => new SpecificEnergy(1, unit).Si()),
        _ => null,
    };

    private static LinearMap? Size<TUnit>(string text, Func<TUnit, double> si)
        where TUnit : struct, Enum =>
        UnitsNet.UnitParser.Default.TryParse(text, CultureInfo.InvariantCulture, out TUnit unit) ? new LinearMap(si(unit)) : null;
}
