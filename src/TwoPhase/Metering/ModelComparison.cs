using System.Globalization;
using System.Text;
using UnitsNet;

namespace TwoPhase.Metering;

/// <summary>What one wet-steam model reads.</summary>
public readonly record struct ModelAnswer
{
    internal ModelAnswer(WetSteamModel model, QualityReading reading) => (Model, Reading) = (model, reading);

    /// <summary>The model.</summary>
    public WetSteamModel Model { get; }

    /// <summary>Its reading, with whether meter and model are inside their published limits.</summary>
    public QualityReading Reading { get; }

    internal object ToDump() => ToString();

    /// <summary>The model's name and its reading.</summary>
    public override string ToString() => $"{Model?.Name}: {Reading}";
}

/// <summary>One reading through several wet-steam models side by side: how much of the answer is the choice of model.</summary>
public sealed class ModelComparison
{
    internal ModelComparison(IReadOnlyList<ModelAnswer> answers) => Answers = answers;

    /// <summary>Every answer, in the order of <see cref="WetSteamModel.All"/> or of the models asked for.</summary>
    public IReadOnlyList<ModelAnswer> Answers { get; }

    /// <summary>Lowest quality among the answers.</summary>
    public MassFraction Lowest => MassFraction.FromDecimalFractions(Answers.Min(answer => answer.Reading.QualityCore));

    /// <summary>Highest quality among the answers.</summary>
    public MassFraction Highest => MassFraction.FromDecimalFractions(Answers.Max(answer => answer.Reading.QualityCore));

    /// <summary>Highest less lowest quality.</summary>
    public MassFraction Spread => MassFraction.FromDecimalFractions(Highest.DecimalFractions - Lowest.DecimalFractions);

    internal object ToDump() => ToString();

    /// <summary>The answers as a table, invariant culture.</summary>
    public override string ToString()
    {
        var text = new StringBuilder();
        foreach (ModelAnswer answer in Answers)
            text.AppendLine(string.Format(CultureInfo.InvariantCulture, "{0,-40} {1:F4}  {2}", answer.Model.Name, answer.Reading.QualityCore, answer.Reading.Applicability));
        return text.Append(string.Format(CultureInfo.InvariantCulture, "spread {0:F4}", Spread.DecimalFractions)).ToString();
    }
}
