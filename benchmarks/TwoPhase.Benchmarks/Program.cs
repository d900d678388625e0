using BenchmarkDotNet.Running;
using TwoPhase.Benchmarks.Ratios;

switch (args)
{
    case ["ratios", .. string[] names]:
        RatioReport.Print(RatioSuites.Named(names));
        break;
    case ["cold", string name]:
        ColdStart.MeasureHere(name);
        break;
    default:
        BenchmarkSwitcher.FromAssembly(typeof(RatioReport).Assembly).Run(args);
        break;
}
