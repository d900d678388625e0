using TwoPhase.Passes;
using UnitsNet;

namespace Backfill.Demo;

/// <summary>An invented year: what is done to one pass of the invented generator at any second. No plant was ever run so.</summary>
internal sealed class Scenario
{
    // At rest, heat and feed of the design leave about 77 % of the feed as steam.
    private const double FullHeat = 8.2e6, DesignFeed = 4.8;

    // The feed follows the fire late, which moves the quality at each change of load.
    private const double FeedDelay = 60;

    private readonly LoadMoves _load;
    private readonly Wander _fire, _feed, _warmth, _header, _weeks;
    private readonly double _share;

    public Scenario(Chance seed, string pass)
    {
        Chance own = seed.Of(pass);
        _load = new(seed.Of("load"));
        _fire = new(seed.Of("fire"), 673, 2_239, 13_411);
        _feed = new(own.Of("feed"), 331, 1_847, 9_601);
        _warmth = new(seed.Of("warmth"), 5_003, 86_400);
        _header = new(seed.Of("header"), 2_503, 17_393);
        _weeks = new(own.Of("weeks"), 2.3 * 86_400, 9.1 * 86_400);
        _share = 0.985 + (0.03 * own.Of("share").Share);
    }

    /// <summary>Firing, share of full.</summary>
    public double Firing(double seconds) => _load.At(seconds) + (0.006 * _fire.At(seconds));

    public double FeedFlow(double seconds) => DesignFeed * _load.At(seconds - FeedDelay) * (1 + (0.006 * _feed.At(seconds)));

    public double FeedCelsius(double seconds) => 168 + (2 * _warmth.At(seconds));

    public double HeaderMegapascals(double seconds) => 9.2 + (0.06 * _header.At(seconds));

    /// <summary>What the pass takes up: its share of the fire, which heating value, soot and the burners' flames shift over the weeks.</summary>
    public double Heat(double seconds) => FullHeat * _share * Firing(seconds) * (1 + (0.006 * _weeks.At(seconds)));

    public PassConditions At(double seconds) => new(
        MassFlow.FromKilogramsPerSecond(FeedFlow(seconds)),
        Temperature.FromDegreesCelsius(FeedCelsius(seconds)),
        Pressure.FromMegapascals(HeaderMegapascals(seconds)),
        Power.FromWatts(Heat(seconds)));
}
