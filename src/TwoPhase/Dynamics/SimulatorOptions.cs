using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>How a pass is simulated. Immutable; each <c>With…</c> method returns a changed copy.</summary>
public sealed class SimulatorOptions
{
    private const int FewestCells = 10, MostCells = 20_000;

    private double _pressureLag = 10, _sampling = 1;

    /// <summary>The defaults: 80 cells, default correlations, metal stores heat, pressure lag 10 s, rows every second.</summary>
    public static SimulatorOptions Default { get; } = new();

    /// <summary>The meter at the outlet; null for that of the pass.</summary>
    public QualityMeter? Meter { get; private set; }

    /// <summary>The correlations; the film is that of boiling flow between metal and water, single-phase water and steam follow Gnielinski.</summary>
    public PassModels Models { get; private set; } = PassModels.Default;

    /// <summary>Cells of about equal volume that the pass is cut into; each section has one at least.</summary>
    public int Cells { get; private set; } = 80;

    /// <summary>Whether the metal of the tubes stores heat.</summary>
    public bool MetalStoresHeat { get; private set; } = true;

    /// <summary>
    /// Time constant with which the pressure along the pass follows the friction of the moment: it stands for the seconds in which
    /// pressure waves run through wet steam and the flow gathers speed.
    /// </summary>
    public Duration PressureLag => Duration.FromSeconds(_pressureLag);

    /// <summary>Time between the rows of a history.</summary>
    public Duration Sampling => Duration.FromSeconds(_sampling);

    /// <summary>Lags of the instruments; none unless given.</summary>
    public SensorLags Lags { get; private set; }

    /// <summary>Lags of the absorbed heat behind the fire; none unless given.</summary>
    public HeatLags HeatLags { get; private set; }

    internal double RawPressureLag => _pressureLag;

    internal double RawSampling => _sampling;

    /// <summary>With a meter at the outlet in place of that of the pass.</summary>
    /// <param name="meter">The meter.</param>
    public SimulatorOptions WithMeter(QualityMeter meter)
    {
        Require.NotNull(meter, nameof(meter));
        return Changed(copy => copy.Meter = meter);
    }

    /// <summary>With other correlations.</summary>
    /// <param name="models">The correlations.</param>
    public SimulatorOptions WithModels(PassModels models)
    {
        Require.NotNull(models, nameof(models));
        return Changed(copy => copy.Models = models);
    }

    /// <summary>With another number of cells.</summary>
    /// <param name="cells">10 to 20,000.</param>
    /// <exception cref="ArgumentOutOfRangeException">The number is outside its limits.</exception>
    public SimulatorOptions WithCells(int cells)
    {
        Require.Within(cells, FewestCells, MostCells, "Number of cells", Scale.None, nameof(cells));
        return Changed(copy => copy.Cells = cells);
    }

    /// <summary>With metal that stores no heat, as the analytic solutions have it.</summary>
    public SimulatorOptions WithoutMetal() => Changed(copy => copy.MetalStoresHeat = false);

    /// <summary>With another lag of the pressure profile.</summary>
    /// <param name="lag">Zero or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">The lag is negative.</exception>
    public SimulatorOptions WithPressureLag(Duration lag)
    {
        double seconds = Require.NotNegative(lag.Si(), "Pressure lag", Scale.Seconds, nameof(lag));
        return Changed(copy => copy._pressureLag = seconds);
    }

    /// <summary>With another time between the rows of a history.</summary>
    /// <param name="sampling">Greater than zero.</param>
    /// <exception cref="ArgumentOutOfRangeException">The time is not greater than zero.</exception>
    public SimulatorOptions WithSampling(Duration sampling)
    {
        double seconds = Require.Positive(sampling.Si(), "Sampling", Scale.Seconds, nameof(sampling));
        return Changed(copy => copy._sampling = seconds);
    }

    /// <summary>With instruments that lag.</summary>
    /// <param name="lags">The lags.</param>
    public SimulatorOptions WithLags(SensorLags lags) => Changed(copy => copy.Lags = lags);

    /// <summary>With heat that lags behind the fire; the absorbed heat of conditions and schedules is then what the fire asks for.</summary>
    /// <param name="lags">The lags.</param>
    public SimulatorOptions WithHeatLags(HeatLags lags) => Changed(copy => copy.HeatLags = lags);

    private SimulatorOptions Changed(Action<SimulatorOptions> change)
    {
        var copy = (SimulatorOptions)MemberwiseClone();
        change(copy);
        return copy;
    }
}
