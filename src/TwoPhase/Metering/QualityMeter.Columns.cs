using TwoPhase.Flow;
using TwoPhase.Numerics;
using TwoPhase.Steam;
using TwoPhase.Units;
using UnitsNet.Units;

namespace TwoPhase.Metering;

public sealed partial class QualityMeter
{
    /// <summary>The quality of every sample of a history. Never throws for a sample: NaN and a status, and the next goes on.</summary>
    /// <param name="flow">ṁ, total mass flow.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping.</param>
    /// <param name="differential">Δp.</param>
    /// <param name="quality">Receives x [kg/kg]; NaN where there is none.</param>
    /// <param name="status">Receives what each reading is.</param>
    /// <exception cref="ArgumentException">The columns differ in length.</exception>
    public void Quality(Column<MassFlowUnit> flow, Column<PressureUnit> pressure, Column<PressureUnit> differential, Span<double> quality, Span<ReadingStatus> status)
    {
        CheckLengths(flow.Length, pressure.Length, differential.Length, quality.Length, status.Length);
        LinearMap toFlow = flow.Unit.ToSi(), toPressure = pressure.Unit.ToSi(), toDifferential = differential.Unit.ToSi();
        for (int i = 0; i < quality.Length;)
        {
#if NET
            if (HasLumpedForm && TwoCurves.IsVectorised)
                i += LumpedHomogeneous.Batch(_lumpedSquare, flow.Values[i..], toFlow, pressure.Values[i..], toPressure, differential.Values[i..], toDifferential, quality[i..], status[i..]);
#endif
            int end = Math.Min(quality.Length, i + LumpedHomogeneous.Lanes);
            for (; i < end; i++) quality[i] = SampleCore(toFlow.Map(flow.Values[i]), toPressure.Map(pressure.Values[i]), toDifferential.Map(differential.Values[i]), out status[i]);
        }
    }

    /// <summary>The quality of every sample of a history, with the applicability of each. Slower than without: the Reynolds number needs viscosities.</summary>
    /// <param name="flow">ṁ, total mass flow.</param>
    /// <param name="pressure">p, absolute static pressure at the upstream tapping.</param>
    /// <param name="differential">Δp.</param>
    /// <param name="quality">Receives x [kg/kg]; NaN where there is none.</param>
    /// <param name="status">Receives what each reading is.</param>
    /// <param name="applicability">Receives whether each reading lies inside the published limits; <c>default</c>, not checked, where there is no quality.</param>
    /// <exception cref="ArgumentException">The columns differ in length.</exception>
    public void Quality(Column<MassFlowUnit> flow, Column<PressureUnit> pressure, Column<PressureUnit> differential, Span<double> quality, Span<ReadingStatus> status, Span<Applicability> applicability)
    {
        CheckLengths(flow.Length, pressure.Length, differential.Length, quality.Length, status.Length);
        CheckLength(applicability.Length, flow.Length, nameof(applicability));
        LinearMap toFlow = flow.Unit.ToSi(), toPressure = pressure.Unit.ToSi(), toDifferential = differential.Unit.ToSi();
        for (int i = 0; i < quality.Length; i++)
        {
            double m = toFlow.Map(flow.Values[i]), p = toPressure.Map(pressure.Values[i]), dp = toDifferential.Map(differential.Values[i]);
            status[i] = StatusOf(m, p, dp);
            QualityReading reading = status[i] == ReadingStatus.None ? ReadCore(m, p, dp) : default;
            if (status[i] == ReadingStatus.None) status[i] = reading.Status;
            quality[i] = HasQuality(status[i]) ? reading.QualityCore : double.NaN;
            applicability[i] = reading.Applicability;
        }
    }

    private static bool HasQuality(ReadingStatus status) =>
        status is ReadingStatus.WetSteam or ReadingStatus.SubcooledOutlet or ReadingStatus.SuperheatedOutlet;

    /// <summary>One sample, SI, unchecked: a quality and what it is, or NaN and why not.</summary>
    internal double SampleCore(double flow, double pressure, double differential, out ReadingStatus status)
    {
        if (HasLumpedForm && SaturationTable.Covers(pressure) && IsSound(flow, pressure, differential))
        {
            double lumped = LumpedHomogeneous.Quality(_lumpedSquare, flow, pressure, differential);
            status = StatusOf(lumped);
            return lumped;
        }

        status = StatusOf(flow, pressure, differential);
        if (status != ReadingStatus.None) return double.NaN;
        MeterSteam steam = MeterSteam.At(pressure, Meter.HasGeometry, Model.NeedsTransport);
        MeterGeometry geometry = Meter.GeometryAt(steam.Temperature);
        QualitySolution solution = SolveQuality(geometry, State(geometry, steam, flow, pressure, differential));
        status = solution.Status;
        return solution.Quality;
    }

    private static void CheckLengths(int flow, int pressure, int differential, int quality, int status)
    {
        CheckLength(pressure, flow, nameof(pressure));
        CheckLength(differential, flow, nameof(differential));
        CheckLength(quality, flow, nameof(quality));
        CheckLength(status, flow, nameof(status));
    }

    private static void CheckLength(int length, int flow, string parameter)
    {
        if (length != flow)
            throw new ArgumentException(FormattableString.Invariant($"{length} samples where the column of flow has {flow}."), parameter);
    }
}
