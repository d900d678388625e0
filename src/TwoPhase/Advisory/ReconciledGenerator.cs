using System.Globalization;
using System.Text;
using TwoPhase.Uncertainty;
using UnitsNet;

namespace TwoPhase.Advisory;

/// <summary>A generator with its measurements adjusted so that mass and energy balance, and what the tests say of them.</summary>
public sealed class ReconciledGenerator
{
    private readonly Dictionary<Instrument, ReconciledInstrument> _rows;

    internal ReconciledGenerator(GeneratorMeasurements measurements, IReadOnlyList<ReconciledInstrument> instruments, LinearReconciliation linear, double significance)
    {
        Measurements = measurements;
        Instruments = instruments;
        Significance = significance;
        _rows = instruments.ToDictionary(row => row.Instrument);
        GlobalStatistic = linear.GlobalStatistic;
        DegreesOfFreedom = linear.DegreesOfFreedom;
        GlobalCriticalValue = linear.GlobalCriticalValue(significance / 2);
        TestCriticalValue = CriticalTest(linear, significance);
        Passes = [.. measurements.Generator.Passes.Select((pass, i) => new ReconciledPass(
            pass.Name,
            Flow(Instrument.FeedFlowOf(i)),
            Quality(Instrument.OutletQualityOf(i)),
            Heat(Instrument.AbsorbedHeatOf(i))))];
        Remaining = this;
        Faults = [];
    }

    /// <summary>What was measured.</summary>
    public GeneratorMeasurements Measurements { get; }

    /// <summary>Every quantity, measured or not, with all instruments in use.</summary>
    public IReadOnlyList<ReconciledInstrument> Instruments { get; }

    /// <summary>The passes after adjustment.</summary>
    public IReadOnlyList<ReconciledPass> Passes { get; }

    /// <summary>Feed of all passes; null where it is not determined.</summary>
    public UncertainValue<MassFlow>? TotalFeed => Flow(Instrument.TotalFeed);

    /// <summary>Steam at the separator; null where it is not determined.</summary>
    public UncertainValue<MassFlow>? SeparatorSteam => Flow(Instrument.SeparatorSteam);

    /// <summary>Water at the separator; null where it is not determined.</summary>
    public UncertainValue<MassFlow>? SeparatorWater => Flow(Instrument.SeparatorWater);

    /// <summary>Quality at the separator; null where it is not determined.</summary>
    public UncertainValue<MassFraction>? SeparatorQuality => Quality(Instrument.SeparatorQuality);

    /// <summary>Heat absorbed by all passes; null where it is not determined.</summary>
    public UncertainValue<Power>? TotalHeat => Heat(Instrument.TotalHeat);

    /// <summary>α, the chance at most of any verdict but <see cref="ReconciliationVerdict.Agree"/> when nothing is wrong: half of it for the global test, half for the tests of single instruments.</summary>
    public double Significance { get; }

    /// <summary>Sum of squared adjustments in units of their uncertainty: chi-square with <see cref="DegreesOfFreedom"/> when nothing is wrong.</summary>
    public double GlobalStatistic { get; }

    /// <summary>Redundancy: how many independent balances check the measurements.</summary>
    public int DegreesOfFreedom { get; }

    /// <summary>What the global statistic stays below with probability 1 − α/2 when nothing is wrong.</summary>
    public double GlobalCriticalValue { get; }

    /// <summary>What the largest test of an instrument stays below with probability 1 − α/2 at least when nothing is wrong.</summary>
    public double TestCriticalValue { get; }

    /// <summary>Whether the measurements as a whole agree with the balances.</summary>
    public bool PassesGlobalTest => GlobalStatistic <= GlobalCriticalValue;

    /// <summary>What the tests come to, faults found one after the other included.</summary>
    public ReconciliationVerdict Verdict { get; private set; }

    /// <summary>The faults, in the order in which they were found; empty when none was.</summary>
    public IReadOnlyList<InstrumentFault> Faults { get; private set; }

    /// <summary>The same generator without the instruments named faulty: the values to use. This one itself when none was named.</summary>
    public ReconciledGenerator Remaining { get; private set; }

    /// <summary>The row of a quantity.</summary>
    /// <param name="instrument">Which.</param>
    /// <exception cref="ArgumentException">It has no row: no balance looks at it.</exception>
    public ReconciledInstrument RowOf(Instrument instrument) => _rows.TryGetValue(instrument, out ReconciledInstrument? row)
        ? row
        : throw new ArgumentException($"The reconciliation has no row for '{instrument}'.", nameof(instrument));

    internal static double CriticalTest(LinearReconciliation linear, double significance) =>
        LinearReconciliation.SimultaneousCriticalValue(Math.Max(1, BiasPower.DistinctTests(linear)), significance / 2);

    internal ReconciledGenerator Judged(ReconciliationVerdict verdict, IReadOnlyList<InstrumentFault> faults, ReconciledGenerator? remaining)
    {
        (Verdict, Faults, Remaining) = (verdict, faults, remaining ?? this);
        return this;
    }

    private UncertainValue<MassFlow>? Flow(Instrument instrument) => Found(instrument, static value => MassFlow.FromKilogramsPerSecond(value));

    private UncertainValue<MassFraction>? Quality(Instrument instrument) => Found(instrument, static value => MassFraction.FromDecimalFractions(value));

    private UncertainValue<Power>? Heat(Instrument instrument) => Found(instrument, static value => Power.FromWatts(value));

    private UncertainValue<TQuantity>? Found<TQuantity>(Instrument instrument, Func<double, TQuantity> quantity)
        where TQuantity : struct
    {
        ReconciledInstrument.Raw raw = _rows[instrument].Numbers;
        return double.IsNaN(raw.Adjusted) ? null : new(quantity(raw.Adjusted), quantity(raw.AdjustedUncertainty));
    }

    internal object ToDump() => ToString();

    /// <summary>Verdict, faults and table, invariant culture.</summary>
    public override string ToString()
    {
        StringBuilder text = new();
        text.AppendFormat(CultureInfo.InvariantCulture, "{0}: chi-square {1:F2} against {2:F2} with {3} degrees of freedom, tests against {4:F2}", Verdict, GlobalStatistic, GlobalCriticalValue, DegreesOfFreedom, TestCriticalValue).AppendLine();
        foreach (InstrumentFault fault in Faults) text.AppendLine(fault.ToString());
        text.AppendFormat(CultureInfo.InvariantCulture, "{0,-26} {1,12} {2,10} {3,12} {4,10} {5,7} {6,11}", "quantity", "measured", "u", "adjusted", "u", "test", "found, 90 %");
        foreach (ReconciledInstrument row in Instruments) text.AppendLine().Append(row);
        return text.ToString();
    }
}
