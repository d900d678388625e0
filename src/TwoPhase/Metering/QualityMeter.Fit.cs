using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>The same reading of another meter.</summary>
    internal QualityMeter With(DifferentialPressureMeter meter) => new QualityMeter(meter, Model).WithModelUncertainty(ModelUncertainty);

    /// <summary>C of the dry element at the Reynolds number of a wet flow [-].</summary>
    internal double DryCoefficient(MassFlow flow, Pressure pressure, MassFraction quality)
    {
        double p = pressure.Si();
        MeterSteam steam = MeterSteam.At(p, expansion: true, transport: true);
        MeterGeometry geometry = Meter.GeometryAt(steam.Temperature);
        return Meter.LawOf(geometry).At(Reynolds(geometry, State(geometry, steam, flow.Si(), p, 0), quality.Si()));
    }
}
