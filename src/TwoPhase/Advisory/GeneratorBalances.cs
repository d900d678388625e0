using TwoPhase.Metering;
using TwoPhase.Numerics;
using TwoPhase.Passes;
using TwoPhase.Steam;
using TwoPhase.Uncertainty;

namespace TwoPhase.Advisory;

/// <summary>The balances of a generator over its quantities, with first guesses and scales: what is reconciled.</summary>
/// <remarks>
/// <para>ṁ feed, Ṁ what a pass stores, x outlet quality, h = h′(p) + x·r(p), Q heat of a pass, E energy it stores, D the meter's relation:</para>
/// <para>feed Σṁ; heat of a pass Q = (ṁ − Ṁ)·h − ṁ·hf(p, Tf) + E; differential Δp = D(ṁ − Ṁ, p, x); separator S + W = Σ(ṁ − Ṁ) and S·h″ + W·h′ = Σ(ṁ − Ṁ)·h,
/// h′ and h″ at its own pressure, without loss of heat; separator quality S/(S + W); heat of all ΣQ; fuel heat times efficiency.</para>
/// </remarks>
internal sealed class GeneratorBalances
{
    private const double UsualQuality = 0.75, UsualFlow = 5, UsualFeedTemperature = 430, UsualEfficiency = 0.85;
    private const double Span = 2e6;   // of enthalpy over a pass [J/kg], to make balances of energy pure numbers

    private readonly GeneratorMeasurements _given;
    private readonly List<Instrument> _quantities = [];
    private readonly Dictionary<Instrument, int> _index = [];
    private readonly List<Balance> _balances = [];
    private readonly List<double> _start = [], _scales = [];
    private readonly double _flow;   // of all passes, as a scale

    public GeneratorBalances(GeneratorMeasurements given)
    {
        _given = given;
        int passes = given.Generator.Passes.Count;
        double[] flows = FirstFlows();
        _flow = flows.Sum();
        double x = Read(Instrument.SeparatorQuality) ?? FirstQuality() ?? UsualQuality;

        for (int i = 0; i < passes; i++) AddPass(i, flows[i], Read(Instrument.OutletQualityOf(i)) ?? x);
        AddTotalFeed();
        AddSeparator(x);
        AddHeat();
        if (given.Readings.ContainsKey(Instrument.CombinedDifferential)) AddCombinedMeter();
    }

    /// <summary>What each quantity is.</summary>
    public IReadOnlyList<Instrument> Quantities => _quantities;

    /// <summary>Usual size of a quantity [SI].</summary>
    public double Scale(int quantity) => _scales[quantity];

    /// <summary>Reconciles, with the readings of some instruments taken as off by a bias that is sought with the rest.</summary>
    /// <remarks>For each of those two quantities stand behind the others: the reading, measured, and its bias, not measured.</remarks>
    public NonlinearReconciliation Solve(IReadOnlyList<Instrument> biased)
    {
        List<Balance> balances = [.. _balances];
        List<double> start = [.. _start], scales = [.. _scales];
        List<int> measured = [];
        List<Instrument> instruments = [];
        for (int i = 0; i < _quantities.Count; i++)
        {
            if (!_given.Readings.ContainsKey(_quantities[i]) || biased.Contains(_quantities[i])) continue;
            measured.Add(i);
            instruments.Add(_quantities[i]);
        }

        foreach (Instrument instrument in biased)
        {
            int quantity = _index[instrument], reading = start.Count;
            double scale = scales[quantity];
            start.AddRange([_start[quantity], 0]);
            scales.AddRange([scale, scale]);
            balances.Add(new(v => (v[reading] - v[quantity] - v[reading + 1]) / scale, reading, quantity, reading + 1));
            measured.Add(reading);
            instruments.Add(instrument);
        }

        return NonlinearReconciliation.Solve([.. start], [.. scales], [.. measured], [.. instruments.Select(instrument => _given.Readings[instrument].Value)], _given.Covariance([.. instruments]), balances);
    }

    private double? Read(Instrument instrument) => _given.Readings.TryGetValue(instrument, out var reading) ? reading.Value : null;

    // A pass without a flow gets an equal part of what the others leave of the total, or else what the others have.
    private double[] FirstFlows()
    {
        int passes = _given.Generator.Passes.Count;
        double?[] read = [.. Enumerable.Range(0, passes).Select(i => Read(Instrument.FeedFlowOf(i)))];
        int missing = read.Count(flow => flow is null);
        double known = read.Sum() ?? 0;
        double? total = Read(Instrument.TotalFeed) ?? (Read(Instrument.SeparatorSteam) + Read(Instrument.SeparatorWater));
        double rest = missing > 0 && total > known ? (total.Value - known) / missing : missing < passes ? known / (passes - missing) : UsualFlow;
        return [.. read.Select(flow => flow ?? rest)];
    }

    private double? FirstQuality() => Read(Instrument.SeparatorSteam) is { } steam && Read(Instrument.SeparatorWater) is { } water ? steam / (steam + water)
        : Read(Instrument.SeparatorSteam) is { } alone && alone < _flow ? alone / _flow
        : null;

    private void AddPass(int pass, double flow, double x)
    {
        (double storedMass, double storedEnergy) = _given.HoldupRate(pass);
        int m = Add(Instrument.FeedFlowOf(pass), flow, flow), quality = Add(Instrument.OutletQualityOf(pass), x, 1), p = Pressure(pass), t = FeedTemperature(pass);
        int heat = Add(Instrument.AbsorbedHeatOf(pass), Heat(_start), flow * Span);
        _balances.Add(new(v => (v[heat] - Heat(v)) / (flow * Span), heat, m, quality, p, t));
        if (Read(Instrument.DifferentialOf(pass)) is { } reading)
        {
            QualityMeter meter = _given.Generator.Passes[pass].Meter!;
            int differential = Add(Instrument.DifferentialOf(pass), reading, reading);
            _balances.Add(new(v => (v[differential] - Differential(meter, v[m] - storedMass, v[p], v[quality])) / reading, differential, m, p, quality));
        }

        double Heat(IReadOnlyList<double> v) => ((v[m] - storedMass) * Wet(v[p], v[quality])) - (v[m] * default(SteamFluid).LiquidEnthalpy(v[p], v[t])) + storedEnergy;
    }

    private void AddTotalFeed()
    {
        int total = Add(Instrument.TotalFeed, _flow, _flow);
        int[] flows = OfPasses(Instrument.FeedFlowOf);
        _balances.Add(new(v => (v[total] - flows.Sum(i => v[i])) / _flow, [total, .. flows]));
    }

    private void AddSeparator(double x)
    {
        int steam = Add(Instrument.SeparatorSteam, _flow * x, _flow), water = Add(Instrument.SeparatorWater, _flow * (1 - x), _flow), quality = Add(Instrument.SeparatorQuality, x, 1);
        SaturationCore separator = SaturationLine.AtPressure(_given.RawSeparatorPressure);
        (int[] seen, Func<double[], (double Mass, double Energy)> outlet) = Outlet();
        _balances.Add(new(v => (v[steam] + v[water] - outlet(v).Mass) / _flow, [steam, water, .. OfPasses(Instrument.FeedFlowOf)]));
        _balances.Add(new(v => ((v[steam] * separator.Vapour.Enthalpy) + (v[water] * separator.Liquid.Enthalpy) - outlet(v).Energy) / (_flow * Span), [steam, water, .. seen]));
        _balances.Add(new(v => (v[steam] - (v[quality] * (v[steam] + v[water]))) / _flow, steam, water, quality));
    }

    private void AddHeat()
    {
        int[] heats = OfPasses(Instrument.AbsorbedHeatOf);
        double first = heats.Sum(i => _start[i]), scale = _flow * Span;
        int total = Add(Instrument.TotalHeat, first, scale);
        _balances.Add(new(v => (v[total] - heats.Sum(i => v[i])) / scale, [total, .. heats]));

        double? fuelRead = Read(Instrument.FuelHeat);
        if (fuelRead is null && Read(Instrument.Efficiency) is null) return;
        double share = Read(Instrument.Efficiency) ?? (first > 0 && fuelRead > first ? first / fuelRead.Value : UsualEfficiency);
        int fuel = Add(Instrument.FuelHeat, Math.Max(first, 0.01 * scale) / share, scale), efficiency = Add(Instrument.Efficiency, share, 1);
        _balances.Add(new(v => ((v[fuel] * v[efficiency]) - v[total]) / scale, fuel, efficiency, total));
    }

    private void AddCombinedMeter()
    {
        double reading = Read(Instrument.CombinedDifferential)!.Value;
        QualityMeter meter = _given.CombinedMeter!;
        int differential = Add(Instrument.CombinedDifferential, reading, reading), p = HeaderPressure("the meter on the combined outlet");
        (int[] seen, Func<double[], (double Mass, double Energy)> outlet) = Outlet();
        _balances.Add(new(
            v =>
            {
                (double mass, double energy) = outlet(v);
                return (v[differential] - Differential(meter, mass, v[p], SaturationLine.AtPressure(v[p]).EquilibriumQuality(energy / mass))) / reading;
            },
            [differential, .. seen.Append(p).Distinct()]));
    }

    // Mass and energy that leave all passes, and the quantities that they depend on.
    private (int[] Seen, Func<double[], (double Mass, double Energy)> Sum) Outlet()
    {
        int[] flows = OfPasses(Instrument.FeedFlowOf), qualities = OfPasses(Instrument.OutletQualityOf), pressures = [.. Enumerable.Range(0, flows.Length).Select(Pressure)];
        return ([.. flows.Concat(qualities).Concat(pressures).Distinct()], v =>
        {
            double mass = 0, energy = 0;
            for (int i = 0; i < flows.Length; i++)
            {
                double leaves = v[flows[i]] - _given.HoldupRate(i).Mass;
                mass += leaves;
                energy += leaves * Wet(v[pressures[i]], v[qualities[i]]);
            }

            return (mass, energy);
        }
        );
    }

    private int[] OfPasses(Func<int, Instrument> instrument) => [.. Enumerable.Range(0, _given.Generator.Passes.Count).Select(i => _index[instrument(i)])];

    private int Pressure(int pass)
    {
        Instrument own = Instrument.OutletPressureOf(pass);
        return Read(own) is { } reading ? Add(own, reading, reading) : HeaderPressure($"pass '{_given.Generator.Passes[pass].Name}'");
    }

    private int HeaderPressure(string user) => Read(Instrument.HeaderPressure) is { } reading
        ? Add(Instrument.HeaderPressure, reading, reading)
        : throw new ArgumentException($"The pressure at {user} is not given, nor that of the header: no balance can be drawn up without.");

    private int FeedTemperature(int pass)
    {
        Instrument own = Instrument.FeedTemperatureOf(pass);
        return Read(own) is { } reading ? Add(own, reading, 100) : Add(Instrument.FeedTemperature, Read(Instrument.FeedTemperature) ?? UsualFeedTemperature, 100);
    }

    private int Add(Instrument instrument, double start, double scale)
    {
        if (_index.TryGetValue(instrument, out int known)) return known;
        _index.Add(instrument, _quantities.Count);
        _quantities.Add(instrument);
        _start.Add(start);
        _scales.Add(Fast.IsFinite(scale) && scale > 0 ? scale : 1);
        return _quantities.Count - 1;
    }

    // NaN where the meter has no differential, and the reconciliation then says that it does not settle.
    private static double Differential(QualityMeter meter, double flow, double pressure, double quality)
    {
        try
        {
            return flow > 0 ? meter.DifferentialOrNaN(flow, pressure, quality) : double.NaN;
        }
        catch (ArgumentOutOfRangeException)
        {
            return double.NaN;   // a quality so low that no volume is left
        }
    }

    // The line through both saturated enthalpies is straight in x beyond 0 and 1 too, as the meters are.
    private static double Wet(double pressure, double quality)
    {
        SaturationCore steam = SaturationLine.AtPressure(pressure);
        return steam.Liquid.Enthalpy + (quality * steam.LatentHeat);
    }
}
