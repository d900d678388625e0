using BenchmarkDotNet.Attributes;
using TwoPhase.Steam;

namespace TwoPhase.Benchmarks.Steam;

/// <summary>The same five properties from p and h, by the formulation and by the surface, in each phase.</summary>
[MemoryDiagnoser]
public class SurfaceBenchmarks
{
    private readonly double _pressure = 9.1e6;
    private static readonly SteamSurface Surface = SteamSurface.Default;

    [Params(600e3, 2100e3, 3100e3)]
    public double Enthalpy { get; set; }

    [Benchmark(Baseline = true)]
    public double Formulation() => Water.AtPressureEnthalpy(_pressure, Enthalpy).VolumeByPressure;

    [Benchmark]
    public double Table() => Surface.Evaluate(_pressure, Enthalpy).DensityByPressure;

    [Benchmark]
    public SteamSurface Build() => new(Surface.LowestPressure, Surface.HighestPressure, Surface.LowestEnthalpy, Surface.HighestEnthalpy);
}
