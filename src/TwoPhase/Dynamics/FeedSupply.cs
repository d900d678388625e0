using TwoPhase.Units;
using UnitsNet;

namespace TwoPhase.Dynamics;

/// <summary>
/// A feed header that the passes draw from through their valves: what each passes follows from its opening and from the pressure drop
/// that header and pass leave it. A pass without a valve here is on flow control: it gets what its own schedule says.
/// </summary>
/// <remarks>
/// <para>A valve passes ṁ = ṁ0 · (φ/φ0) · a · √(ρ Δp / (ρ0 Δp0)): φ its characteristic, a its free share (1 unless something blocks it), Δp header
/// minus inlet of the pass, 0 the start. So neither size nor unit of its flow coefficient is asked for.</para>
/// <para>Not modelled: cavitation and choking in the valve, the head of a centrifugal pump between both kinds of header, lines and check valves.</para>
/// <para>Immutable; each method returns a changed copy. A valve that sticks is one whose opening is left alone.</para>
/// </remarks>
public sealed class FeedSupply
{
    private Dictionary<string, FeedValve> _valves = [];

    private FeedSupply(double pressure, bool keepsTotal) => (RawPressure, KeepsTotal, PressureCurve) = (pressure, keepsTotal, TimeCurve.Constant(pressure));

    /// <summary>Pressure of the header at the start.</summary>
    public Pressure StartPressure => Pressure.FromPascals(RawPressure);

    /// <summary>Whether the total feed is what is kept, as by displacement pumps; otherwise it is the pressure.</summary>
    public bool KeepsTotal { get; }

    /// <summary>Names of the passes that a valve feeds.</summary>
    public IReadOnlyCollection<string> Passes => _valves.Keys;

    internal double RawPressure { get; }

    internal TimeCurve PressureCurve { get; private set; }

    /// <summary>Total feed of all passes over that at the start.</summary>
    internal TimeCurve TotalCurve { get; private set; } = TimeCurve.Constant(1);

    /// <summary>A header whose pressure is kept.</summary>
    /// <param name="pressure">Absolute pressure of the header, above the inlet pressure of every pass.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="pressure"/> is not greater than zero.</exception>
    public static FeedSupply AtPressure(Pressure pressure) => new(Header(pressure, nameof(pressure)), keepsTotal: false);

    /// <summary>A header whose total feed is kept, that of the start until <see cref="RampTotal"/>: what one valve no longer passes, the others must.</summary>
    /// <param name="startPressure">Absolute pressure of the header at the start, above the inlet pressure of every pass.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="startPressure"/> is not greater than zero.</exception>
    public static FeedSupply AtTotal(Pressure startPressure) => new(Header(startPressure, nameof(startPressure)), keepsTotal: true);

    /// <summary>With a valve in front of a pass.</summary>
    /// <param name="pass">Name of the pass.</param>
    /// <param name="characteristic">Its characteristic.</param>
    /// <param name="opening">Its opening at the start, above 0 up to 100 %.</param>
    /// <exception cref="ArgumentOutOfRangeException">The opening is outside its limits, or the valve passes nothing at it.</exception>
    public FeedSupply WithValve(string pass, ValveCharacteristic characteristic, Ratio opening)
    {
        Require.NotNull(pass, nameof(pass));
        Require.Positive(Require.NotNull(characteristic, nameof(characteristic)).RelativeFlow(opening), "Relative flow of a valve at the start", Scale.None, nameof(opening));
        return Changed(copy => copy._valves = new(_valves) { [pass] = new(characteristic, TimeCurve.Constant(opening.Si()), TimeCurve.Constant(1)) });
    }

    /// <summary>A ramp of a valve's opening.</summary>
    /// <param name="pass">Name of the pass.</param>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Opening at its end, 0 to 100 %.</param>
    /// <exception cref="ArgumentException">The pass has no valve here.</exception>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public FeedSupply RampOpening(string pass, Duration from, Duration over, Ratio to)
    {
        FeedValve valve = Valve(pass, nameof(pass));
        double value = Require.Within(to.Si(), 0, 1, "Valve opening", Scale.None, nameof(to));
        return With(pass, valve with { Opening = valve.Opening.Ramp(from, over, value, "valve opening") });
    }

    /// <summary>A ramp of the share of a valve's passage that is free: something blocks it, or is washed out again.</summary>
    /// <param name="pass">Name of the pass.</param>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Free share at its end; 100 % as at the start.</param>
    /// <exception cref="ArgumentException">The pass has no valve here.</exception>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public FeedSupply RampFreeShare(string pass, Duration from, Duration over, Ratio to)
    {
        FeedValve valve = Valve(pass, nameof(pass));
        double value = Require.NotNegative(to.Si(), "Free share of a valve", Scale.None, nameof(to));
        return With(pass, valve with { FreeShare = valve.FreeShare.Ramp(from, over, value, "free share of a valve") });
    }

    /// <summary>A ramp of the header's pressure.</summary>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="to">Absolute pressure at its end.</param>
    /// <exception cref="InvalidOperationException">The header keeps its total feed: its pressure follows from that.</exception>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public FeedSupply RampPressure(Duration from, Duration over, Pressure to)
    {
        if (KeepsTotal) throw new InvalidOperationException("This header keeps its total feed; its pressure follows from that.");
        double value = Header(to, nameof(to));
        return Changed(copy => copy.PressureCurve = PressureCurve.Ramp(from, over, value, "feed pressure"));
    }

    /// <summary>A ramp of the total feed of all passes, those on flow control included.</summary>
    /// <param name="from">When it begins.</param>
    /// <param name="over">How long it takes; zero for a step.</param>
    /// <param name="ofStart">Total at its end over that at the start, greater than zero.</param>
    /// <exception cref="InvalidOperationException">The header keeps its pressure: the total follows from that.</exception>
    /// <exception cref="ArgumentOutOfRangeException">It begins before the change before it ends, or a value is outside its limits.</exception>
    public FeedSupply RampTotal(Duration from, Duration over, Ratio ofStart)
    {
        if (!KeepsTotal) throw new InvalidOperationException("This header keeps its pressure; its total feed follows from that.");
        double value = Require.Positive(ofStart.Si(), "Total feed over that at the start", Scale.None, nameof(ofStart));
        return Changed(copy => copy.TotalCurve = TotalCurve.Ramp(from, over, value, "total feed"));
    }

    /// <summary>The valve of a pass; null where flow control feeds it.</summary>
    internal FeedValve? ValveOf(string pass) => _valves.TryGetValue(pass, out FeedValve? valve) ? valve : null;

    private static double Header(Pressure pressure, string parameter) => Require.Positive(pressure.Si(), "Feed pressure", Scale.Megapascals, parameter);

    private FeedValve Valve(string pass, string parameter) =>
        ValveOf(Require.NotNull(pass, parameter)) ?? throw new ArgumentException($"Pass '{pass}' has no valve here; those with one are {string.Join(", ", _valves.Keys.Select(name => $"'{name}'"))}.", parameter);

    private FeedSupply With(string pass, FeedValve valve) => Changed(copy => copy._valves = new(_valves) { [pass] = valve });

    private FeedSupply Changed(Action<FeedSupply> change)
    {
        var copy = (FeedSupply)MemberwiseClone();
        change(copy);
        return copy;
    }
}
