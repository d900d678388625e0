using BenchmarkDotNet.Attributes;
using TwoPhase.Flow;
using TwoPhase.Friction;
using UnitsNet;

namespace TwoPhase.Benchmarks.Friction;

/// <summary>The default friction model beside a plain power of the same kind of number.</summary>
[MemoryDiagnoser]
public class FrictionGradientBenchmarks
{
    private static readonly FlowState State = FlowStates.At(10e6, 0.78, 1000, 0.078, 0);
    private static readonly TwoPhaseFlow Flow = new(State);
    private static readonly Length Roughness = Length.FromMicrometers(46);

    [Benchmark(Baseline = true)]
    public double Power() => Math.Pow(State.LiquidDensity / State.VapourDensity, State.Quality);

    [Benchmark]
    public double Core() => FrictionModel.MullerSteinhagenHeck.GradientCore(State, 46e-6);

    [Benchmark]
    public double Door() => FrictionModel.MullerSteinhagenHeck.Gradient(Flow, Roughness).PascalsPerMetre;
}
