using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Steam;
using TwoPhase.Units;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>Highest relative residual of the flow equation at an accepted root.</summary>
    private const double Residual = 1e-12;

    /// <summary>A reading with its applicability; <see cref="ReadingStatus.NotSolved"/> in place of an exception. SI, arguments checked.</summary>
    private QualityReading ReadCore(double flow, double pressure, double differential)
    {
        if (HasLumpedForm && SaturationTable.Covers(pressure))
        {
            double lumped = LumpedHomogeneous.Quality(_lumpedSquare, flow, pressure, differential);
            return new QualityReading(lumped, flow * flow / (_lumpedSquare * differential), StatusOf(lumped), Applicability.Inside);
        }

        MeterSteam steam = MeterSteam.At(pressure, Meter.HasGeometry, Model.NeedsTransport);
        MeterGeometry geometry = Meter.GeometryAt(steam.Temperature);
        MeterState state = State(geometry, steam, flow, pressure, differential);
        QualitySolution solution = SolveQuality(geometry, state);
        if (solution.Status == ReadingStatus.NotSolved) return new QualityReading(0, 0, solution.Status, default);

        double x = solution.Quality;
        double density = 1 / Model.EffectiveVolume(state, x);
        return new QualityReading(x, density, solution.Status, CheckCore(geometry, state, solution));
    }

    private Applicability CheckCore(in MeterGeometry geometry, in MeterState state, in QualitySolution solution)
    {
        double x = solution.Quality;
        // The second root comes first, so that its value is kept beside the flag.
        Applicability found = double.IsNaN(solution.Other)
            ? Applicability.Inside
            : Applicability.Inside.Check(ApplicabilityLimits.SecondRoot, solution.Other, 0, x);
        found = found.And(Model.CheckCore(state, x));
        return Meter.HasGeometry
            ? found.And(Meter.CheckCore(geometry, Reynolds(geometry, state, x), 1 - (state.Differential / state.Pressure)))
            : found;
    }

    private double DifferentialCore(double flow, double pressure, double quality)
    {
        double differential = TryDifferential(flow, pressure, quality, out Exception? fault);
        return fault is null ? differential : throw fault;
    }

    /// <summary>Δp [Pa] that a flow makes; NaN where the meter would choke or the model gives none. SI, quality not so low that no volume is left.</summary>
    internal double DifferentialOrNaN(double flow, double pressure, double quality) => TryDifferential(flow, pressure, quality, out _);

    private double TryDifferential(double flow, double pressure, double quality, out Exception? fault)
    {
        fault = null;
        MeterSteam steam = MeterSteam.At(pressure, Meter.HasGeometry, Model.NeedsTransport);
        MeterGeometry geometry = Meter.GeometryAt(steam.Temperature);
        MeterState state = WithCoefficient(geometry, State(geometry, steam, flow, pressure, 0), quality);
        double volume = CheckedVolume(state, quality);
        double root = flow / (Model.DischargeCoefficientCore(state, Model.Inside(quality)) * geometry.FlowArea);
        double incompressible = root * root / 2 * volume;

        // ε ≤ 1 puts the differential at or above the incompressible one; a quarter of it leaves room for a model that reads Δp.
        double ceiling = Meter.LargestDifferentialRatio * pressure;
        var balance = new FlowBalance(this, geometry, state, quality);
        double low = Math.Min(incompressible, ceiling) / 4;
        double atCeiling = balance.Value(ceiling);
        if (atCeiling < 0)
        {
            fault = Require.OutOfRange(flow, "Mass flow", Scale.KilogramsPerSecond, nameof(flow), $"would need a differential above {Scale.Kilopascals.Text(ceiling)} at a static pressure of {Scale.Kilopascals.Text(pressure)}: the meter chokes before that");
            return double.NaN;
        }

        RootResult result = BracketedRoot.TryFind(balance, low, balance.Value(low), ceiling, atCeiling, 1e-16 * incompressible);
        if (Accepted(result)) return result.X;
        fault = NotSolved("differential", flow, pressure, result.X);
        return double.NaN;
    }

    private double TotalFlowCore(double pressure, double quality, double differential)
    {
        MeterSteam steam = MeterSteam.At(pressure, Meter.HasGeometry, Model.NeedsTransport);
        MeterGeometry geometry = Meter.GeometryAt(steam.Temperature);
        MeterState state = State(geometry, steam, 0, pressure, differential);
        double root = Fast.Sqrt(2 * differential) * state.Expansibility * geometry.FlowArea;
        if (!Model.DependsOnFlow && !Meter.CoefficientDependsOnReynolds)
            return Model.DischargeCoefficientCore(state, Model.Inside(quality)) * root / Fast.Sqrt(CheckedVolume(state, quality));

        // What a Froude or a Reynolds number does to the flow of the homogeneous mixture stays far inside a factor of four either way.
        double x = Model.Inside(quality);
        double homogeneous = root * Fast.Sqrt(1 / ((x / state.VapourDensity) + ((1 - x) / state.LiquidDensity)));
        CoefficientLaw law = Meter.LawOf(geometry);
        double first = FlowFrom(geometry, law, state with { TotalMassFlow = homogeneous }, quality, root);
        var balance = new FlowFixedPoint(this, geometry, law, state, quality, root);
        RootResult result = BracketedRoot.TryFind(balance, first / 4, first * 4, 1e-16 * first);
        return Accepted(result) ? result.X : throw NotSolved("flow", result.X, pressure, differential);
    }

    private static bool Accepted(in RootResult result) => result.Converged && Math.Abs(result.Residual) <= Residual;

    private double CheckedVolume(in MeterState state, double quality)
    {
        double volume = Model.EffectiveVolume(state, quality);
        return !(volume <= 0) ? volume : throw Require.OutOfRange(quality, "Quality", Scale.None, nameof(quality), $"is so low that the model '{Model.Name}' leaves no effective volume");
    }

    private MeterState State(in MeterGeometry geometry, in MeterSteam steam, double flow, double pressure, double differential) => new()
    {
        Pressure = pressure,
        Differential = differential,
        LiquidDensity = steam.LiquidDensity,
        VapourDensity = steam.VapourDensity,
        IsentropicExponent = steam.IsentropicExponent,
        LiquidViscosity = steam.LiquidViscosity,
        VapourViscosity = steam.VapourViscosity,
        SurfaceTension = steam.SurfaceTension,
        TotalMassFlow = flow,
        PipeDiameter = geometry.PipeDiameter,
        ThroatDiameter = geometry.ThroatDiameter,
        DiameterRatio = geometry.DiameterRatio,
        DischargeCoefficient = Meter.CoefficientDependsOnReynolds ? double.NaN : Meter.LawOf(geometry).Limit,
        Expansibility = differential > 0 ? Meter.ExpansibilityCore(geometry, pressure, differential, steam.IsentropicExponent) : 1,
    };

    /// <summary>The state with the dry coefficient at the Reynolds number of a quality; unchanged for a meter whose coefficient is constant.</summary>
    private MeterState WithCoefficient(in MeterGeometry geometry, in MeterState state, double quality) =>
        Meter.CoefficientDependsOnReynolds ? WithCoefficient(geometry, Meter.LawOf(geometry), state, quality) : state;

    private MeterState WithCoefficient(in MeterGeometry geometry, in CoefficientLaw law, in MeterState state, double quality) =>
        state with { DischargeCoefficient = law.At(Reynolds(geometry, state, Model.Inside(quality))) };

    /// <summary>Reynolds number of the wet stream: the sum of what liquid and vapour would have alone in the pipe.</summary>
    private static double Reynolds(in MeterGeometry geometry, in MeterState state, double quality)
    {
        double x = Fast.Clamp(quality, 0, 1);
        return 4 * state.TotalMassFlow / (Math.PI * geometry.PipeDiameter) * ((x / state.VapourViscosity) + ((1 - x) / state.LiquidViscosity));
    }

    /// <summary>C/√(2 ve) · √2 times <paramref name="root"/> = ε E A √(2 Δp): the flow that a trial flow implies.</summary>
    private double FlowFrom(in MeterGeometry geometry, in CoefficientLaw law, in MeterState trial, double quality, double root)
    {
        MeterState state = WithCoefficient(geometry, law, trial, quality);
        return Model.DischargeCoefficientCore(state, Model.Inside(quality)) * root / Fast.Sqrt(CheckedVolume(state, quality));
    }

    /// <summary>Zero where a differential passes the flow of the state.</summary>
    private readonly struct FlowBalance(QualityMeter owner, MeterGeometry geometry, MeterState state, double quality) : IScalarFunction
    {
        public double Value(double x)
        {
            MeterState trial = state with
            {
                Differential = x,
                Expansibility = owner.Meter.ExpansibilityCore(geometry, state.Pressure, x, state.IsentropicExponent),
            };
            double root = Fast.Sqrt(2 * x) * trial.Expansibility * geometry.FlowArea;
            double flow = owner.Model.DischargeCoefficientCore(trial, owner.Model.Inside(quality)) * root / Fast.Sqrt(owner.Model.EffectiveVolume(trial, quality));
            return (flow / state.TotalMassFlow) - 1;
        }
    }

    /// <summary>Zero where a flow implies itself.</summary>
    private readonly struct FlowFixedPoint(QualityMeter owner, MeterGeometry geometry, CoefficientLaw law, MeterState state, double quality, double root) : IScalarFunction
    {
        public double Value(double x) => (owner.FlowFrom(geometry, law, state with { TotalMassFlow = x }, quality, root) / x) - 1;
    }
}
