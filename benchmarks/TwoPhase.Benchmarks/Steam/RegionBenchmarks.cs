using BenchmarkDotNet.Attributes;
using TwoPhase.Steam;

namespace TwoPhase.Benchmarks.Steam;

/// <summary>One state of regions 1 and 2 and of the saturation line, against the printed sums with Math.Pow.</summary>
[MemoryDiagnoser]
public class RegionBenchmarks
{
    private readonly double _pressure = 9.1e6;
    private readonly double _liquid = 480;
    private readonly double _vapour = 690;

    [Benchmark(Baseline = true)]
    public double Region1ByMathPow() => PlainSums.Region1(_pressure, _liquid);

    [Benchmark]
    public double Region1Kernel() => Region1.At(_pressure, _liquid).BulkModulus;

    [Benchmark]
    public double Region2ByMathPow() => PlainSums.Region2(_pressure, _vapour);

    [Benchmark]
    public double Region2Kernel() => Region2.At(_pressure, _vapour).BulkModulus;

    [Benchmark]
    public double BothSaturatedPhases() => SaturationLine.AtPressure(_pressure).Vapour.Enthalpy;

    [Benchmark]
    public double BothSaturatedPhasesByTable() => SaturationTable.Phases(_pressure).VapourEnthalpy;
}
