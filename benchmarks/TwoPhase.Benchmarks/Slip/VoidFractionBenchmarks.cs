using BenchmarkDotNet.Attributes;
using TwoPhase.Flow;
using TwoPhase.Slip;

namespace TwoPhase.Benchmarks.Slip;

/// <summary>The default void-fraction model beside a plain power of the same kind of number.</summary>
[MemoryDiagnoser]
public class VoidFractionBenchmarks
{
    private static readonly FlowState State = FlowStates.At(10e6, 0.78, 1000, 0.078, 0);
    private static readonly TwoPhaseFlow Flow = new(State);

    [Benchmark(Baseline = true)]
    public double Power() => Math.Pow(State.LiquidDensity / State.VapourDensity, State.Quality);

    [Benchmark]
    public double Core() => VoidFractionModel.Steiner.VoidFractionCore(State);

    [Benchmark]
    public double Door() => VoidFractionModel.Steiner.VoidFraction(Flow).Value;

    [Benchmark]
    public double SplitOfPhases() => VoidFractionModel.Steiner.Split(Flow).SlipRatio;
}
