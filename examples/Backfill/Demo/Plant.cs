using TwoPhase.Dynamics;
using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Slip;
using UnitsNet;

namespace Backfill.Demo;

/// <summary>The invented pass as it is, which is somewhat another than generator.json says: slip, heat split and bore differ.</summary>
internal static class Plant
{
    private static readonly SimulatorOptions Options = SimulatorOptions.Default.WithCells(60).WithModels(PassModels.Default.WithSlip(VoidFractionModel.Zivi));

    public static PassSimulator At(PassConditions conditions, QualityMeter meter) => new(
        new Pass("as it is", [Tubes("bank").AsConvective(), Tubes("coil")]).WithConvectiveShare(Ratio.FromPercent(40)).WithMeter(meter), conditions, Options);

    private static TubeSection Tubes(string name) =>
        new TubeSection(name, Length.FromMillimeters(79), Length.FromMillimeters(88.9), Length.FromMeters(330)).WithRoughness(Length.FromMicrometers(46));
}
