namespace TwoPhase.Steam;

/// <summary>What the surface gives at one p and h, raw SI; NaN throughout where the surface does not reach.</summary>
internal readonly record struct SurfacePoint(double Temperature, double SpecificVolume, double Quality, double DensityByEnthalpy, double DensityByPressure)
{
    public static SurfacePoint NaN => new(double.NaN, double.NaN, double.NaN, double.NaN, double.NaN);
}
