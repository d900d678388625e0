using TwoPhase.Numerics;
using TwoPhase.Uncertainty;
using TwoPhase.Units;

namespace TwoPhase.Advisory;

/// <summary>The measurements of a generator held against each other by mass and energy: adjusted values, tests, and the instrument that disagrees with the rest.</summary>
/// <remarks>
/// <para>Weighted least squares on the balances of feed, separator and heat and on the meter's relation of each pass; flow times enthalpy is linearised and solved
/// again until the values stay. Tests: global chi-square; measurement tests of greatest power. While the largest measurement test is beyond its critical value its
/// instrument is set aside (its bias becomes an unknown) and the rest is solved again.</para>
/// <para>Range: a generator at rest, or with its holdup motion given; readings of one time. A bias looks like a process event: a leak between meters is read as
/// a bias of one of them.</para>
/// <para>Accuracy: tests hold to first order in the errors. False alarms: at most α.</para>
/// <para>Source: Narasimhan and Jordache, Data Reconciliation and Gross Error Detection (2000), chapters 3 to 8; Mah and Tamhane, AIChE J. 28(5), 828-830 (1982);
/// serial elimination: Ripps, Chem. Eng. Prog. Symp. Ser. 61(55), 8-13 (1965), and Serth and Heenan, AIChE J. 32(5), 733-742 (1986).</para>
/// </remarks>
public static class GeneratorReconciliation
{
    private const double FoundWith = 0.9;

    /// <summary>Reconciles what was measured.</summary>
    /// <param name="measurements">The measurements; the pressure at every pass is among them.</param>
    /// <param name="significance">α, chance at most of a false alarm; 0.05 by default.</param>
    /// <exception cref="ArgumentException">A pressure is missing.</exception>
    /// <exception cref="ConvergenceException">No state of the generator is near the readings.</exception>
    public static ReconciledGenerator Solve(GeneratorMeasurements measurements, double significance = 0.05)
    {
        GeneratorBalances balances = new(Require.NotNull(measurements, nameof(measurements)));
        if (!(significance > 0 && significance < 1)) throw Require.OutOfRange(significance, "Significance α", Scale.None, nameof(significance), "must lie between 0 and 1, both excluded");

        List<Instrument> aside = [];
        List<IReadOnlyList<Suspect>> found = [];
        NonlinearReconciliation solution = balances.Solve(aside);
        ReconciledGenerator first = Table(measurements, balances, solution, aside, significance), last = first;
        while (BiasPower.Suspects(solution.Linear) is { Length: > 0 } suspects && Math.Abs(solution.Linear.MeasurementTests[suspects[0]]) > last.TestCriticalValue)
        {
            Instrument[] measured = Measured(measurements, balances, aside);
            Instrument worst = measured[suspects[0]];
            NonlinearReconciliation? without = Without(balances, [.. aside, worst]);
            if (without is null) break;

            found.Add([.. suspects.Select(j => SuspectOf(last.RowOf(measured[j]), solution.Linear.MeasurementTests[suspects[0]]))]);
            aside.Add(worst);
            solution = without;
            last = Table(measurements, balances, solution, aside, significance);
        }

        InstrumentFault[] faults = [.. found.Select(suspects => new InstrumentFault([SuspectOf(last.RowOf(suspects[0].Instrument), suspects[0].Test, suspects[0].Test), .. suspects.Skip(1)]))];
        ReconciliationVerdict verdict = first.DegreesOfFreedom == 0 ? ReconciliationVerdict.NotChecked
            : !Agrees(last) ? ReconciliationVerdict.Disagree
            : faults.Length > 0 ? ReconciliationVerdict.FaultNamed : ReconciliationVerdict.Agree;
        if (faults.Length == 0) return first.Judged(verdict, faults, null);
        last.Judged(Agrees(last) ? last.DegreesOfFreedom == 0 ? ReconciliationVerdict.NotChecked : ReconciliationVerdict.Agree : ReconciliationVerdict.Disagree, [], null);
        return first.Judged(verdict, faults, last);
    }

    // Null where the rest has no state near by, or could no longer tell one fault from another.
    private static NonlinearReconciliation? Without(GeneratorBalances balances, Instrument[] aside)
    {
        try
        {
            NonlinearReconciliation solution = balances.Solve(aside);
            return Enumerable.Range(0, aside.Length).All(k => solution.IsDetermined(Bias(balances, k))) ? solution : null;
        }
        catch (ConvergenceException)
        {
            return null;
        }
    }

    private static bool Agrees(ReconciledGenerator result) =>
        result.DegreesOfFreedom == 0 || (result.PassesGlobalTest && result.Instruments.All(row => !(Math.Abs(row.Test ?? 0) > result.TestCriticalValue)));

    // In the order in which the solver has them.
    private static Instrument[] Measured(GeneratorMeasurements measurements, GeneratorBalances balances, List<Instrument> aside) =>
        [.. balances.Quantities.Where(quantity => measurements.Readings.ContainsKey(quantity) && !aside.Contains(quantity)), .. aside];

    private static int Bias(GeneratorBalances balances, int which) => balances.Quantities.Count + (2 * which) + 1;

    private static Suspect SuspectOf(ReconciledInstrument row, double best) => SuspectOf(row, row.Numbers.Test, best);

    private static Suspect SuspectOf(ReconciledInstrument row, double test, double best) =>
        new(row.Instrument, row.Name, row.Numbers.Bias, row.Numbers.BiasUncertainty, test, BiasPower.RelativeLikelihood(test, best));

    private static ReconciledGenerator Table(GeneratorMeasurements measurements, GeneratorBalances balances, NonlinearReconciliation solution, List<Instrument> aside, double significance)
    {
        LinearReconciliation linear = solution.Linear;
        Instrument[] measured = Measured(measurements, balances, aside);
        Lazy<double[]> smallest = new(() => BiasPower.SmallestBiases(linear, ReconciledGenerator.CriticalTest(linear, significance), FoundWith));
        List<ReconciledInstrument> rows = [];
        for (int quantity = 0; quantity < balances.Quantities.Count; quantity++)
        {
            Instrument instrument = balances.Quantities[quantity];
            bool isRead = measurements.Readings.TryGetValue(instrument, out var reading), isDetermined = solution.IsDetermined(quantity);
            int place = solution.Measurement(quantity) ?? -1, put = aside.IndexOf(instrument);
            bool isChecked = place >= 0 && linear.IsRedundant[place];
            double scale = balances.Scale(quantity);
            ReconciledInstrument.Raw raw = new(
                isRead ? reading.Value : double.NaN,
                isRead ? Math.Sqrt(measurements.Covariance([instrument])[0, 0]) : double.NaN,
                isDetermined ? solution[quantity] : double.NaN,
                isDetermined ? solution.Uncertainty(quantity) : double.NaN,
                isChecked ? linear.MeasurementTests[place] : double.NaN,
                put >= 0 ? solution[Bias(balances, put)] : isChecked ? scale * linear.Biases[place].Size : double.NaN,
                put >= 0 ? solution.Uncertainty(Bias(balances, put)) : isChecked ? scale * linear.Biases[place].StandardUncertainty : double.NaN);
            InstrumentStanding standing = put >= 0 ? InstrumentStanding.SetAside : isChecked ? InstrumentStanding.Checked : isRead ? InstrumentStanding.Unchecked
                : isDetermined ? InstrumentStanding.Inferred : InstrumentStanding.NotObservable;
            Instrument[] equivalents = isChecked ? [.. Enumerable.Range(0, measured.Length).Where(other => other != place && BiasPower.AreAlike(linear, place, other)).Select(other => measured[other])] : [];
            rows.Add(new(instrument, instrument.NameIn(measurements.Generator.Passes), standing, raw, equivalents, new(() => isChecked ? scale * smallest.Value[place] : double.NaN)));
        }

        return new(measurements, rows, linear, significance);
    }
}
