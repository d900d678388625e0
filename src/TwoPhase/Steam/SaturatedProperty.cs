namespace TwoPhase.Steam;

/// <summary>What a column of pressures is turned into.</summary>
internal enum SaturatedProperty
{
    Temperature,
    LiquidEnthalpy,
    VapourEnthalpy,
    LiquidVolume,
    VapourVolume,
}
