namespace TwoPhase.Dynamics;

/// <summary>What a linear view steps, each in a unit that is small for it.</summary>
public enum LinearInput
{
    /// <summary>Firing, the heat taken as proportional to it; per 1 % of what it is.</summary>
    Firing,

    /// <summary>Feed flow; per 1 % of what it is.</summary>
    FeedFlow,

    /// <summary>Feed temperature; per 1 K.</summary>
    FeedTemperature,
}
