using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>The quality that one reading gives through every model that can stand over this meter, side by side.</summary>
    /// <remarks>At 10 MPa the models read one differential as 0.73 to 0.91: more than any error of an instrument. Whether a model is inside its published range is in each answer.</remarks>
    /// <param name="flow">ṁ, total mass flow through the meter, greater than zero.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping, on the saturation line of water.</param>
    /// <param name="differential">Δp, greater than zero and below the pressure.</param>
    /// <param name="models">The models to compare; every model of <see cref="WetSteamModel.All"/> when left out. Those that need a geometry are passed over when the meter has none.</param>
    /// <exception cref="ArgumentOutOfRangeException">An argument is outside its limits.</exception>
    /// <exception cref="ArgumentException">None of the models can stand over this meter.</exception>
    public ModelComparison CompareModels(MassFlow flow, Pressure pressure, Pressure differential, IEnumerable<WetSteamModel>? models = null)
    {
        ModelAnswer[] answers = [.. (models ?? WetSteamModel.All)
            .Where(model => Meter.HasGeometry || !Require.NotNull(model, nameof(models)).NeedsGeometry)
            .Select(model => new ModelAnswer(model, new QualityMeter(Meter, model).Quality(flow, pressure, differential)))];
        return answers.Length > 0
            ? new ModelComparison(answers)
            : throw new ArgumentException($"None of the models can stand over a {Meter.Name}.", nameof(models));
    }
}
