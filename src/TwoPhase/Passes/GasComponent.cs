namespace TwoPhase.Passes;

/// <summary>What a fuel gas is made of.</summary>
public enum GasComponent
{
    /// <summary>Nothing; no component of a fuel.</summary>
    None = 0,

    /// <summary>CH4.</summary>
    Methane,

    /// <summary>C2H6.</summary>
    Ethane,

    /// <summary>C3H8.</summary>
    Propane,

    /// <summary>n-C4H10.</summary>
    NormalButane,

    /// <summary>i-C4H10.</summary>
    IsoButane,

    /// <summary>n-C5H12.</summary>
    NormalPentane,

    /// <summary>i-C5H12.</summary>
    IsoPentane,

    /// <summary>n-C6H14; also for what is heavier.</summary>
    NormalHexane,

    /// <summary>C2H4.</summary>
    Ethylene,

    /// <summary>H2.</summary>
    Hydrogen,

    /// <summary>CO.</summary>
    CarbonMonoxide,

    /// <summary>H2S.</summary>
    HydrogenSulphide,

    /// <summary>CO2.</summary>
    CarbonDioxide,

    /// <summary>N2.</summary>
    Nitrogen,

    /// <summary>O2.</summary>
    Oxygen,
}
