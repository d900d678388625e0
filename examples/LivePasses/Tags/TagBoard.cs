using TwoPhase.Metering;
using TwoPhase.Passes;
using TwoPhase.Units;

namespace LivePasses.Tags;

/// <summary>Turns tags that arrive one by one into readings of the generator, a second of plant time apart.</summary>
/// <remarks>
/// A second ends when two tags have values beyond it: one tag with a false clock moves nothing. A value counts in the second it was measured
/// in, never in an earlier one, and stands for its tag for a while (<see cref="LiveSettings.Hold"/>); then the tag is missing. Not for several threads at once.
/// </remarks>
internal sealed class TagBoard
{
    // Tags that must agree on the time, and messages in a row from the past by which a clock was set back.
    private const int Witnesses = 2, SetBack = 5;

    private readonly TimeSpan _hold;
    private readonly Dictionary<string, Slot> _byTopic = new(StringComparer.Ordinal);
    private readonly ReadingFormat[] _formats;
    private readonly int _witnesses;
    private DateTimeOffset _end = DateTimeOffset.MinValue;
    private bool _hasClosed;

    public TagBoard(LiveSettings settings)
    {
        _hold = settings.Hold;
        SteamGenerator generator = settings.Generator;
        _formats = new ReadingFormat[generator.Passes.Count];
        for (int i = 0; i < _formats.Length; i++)
        {
            TagSet<PassSignal> tags = generator.TagsOf(generator.Passes[i]);
            _formats[i] = new(tags, generator.Basis);
            foreach ((PassSignal signal, Tag tag) in tags) SlotOf(settings.Topics.Tag(tag.Name), tag).Uses.Add((i, signal));
        }

        _witnesses = Math.Min(Witnesses, _byTopic.Count);
    }

    /// <summary>Topics that carry a tag of the generator.</summary>
    public IReadOnlyCollection<string> Topics => _byTopic.Keys;

    /// <summary>Takes one message. Never throws.</summary>
    /// <param name="topic">Its topic.</param>
    /// <param name="message">What it says.</param>
    /// <param name="arrived">When it came: its time, where it has none of its own.</param>
    /// <param name="fault">Why it was not taken; empty where it was.</param>
    /// <returns>The reading of the second that it ends; null where it ends none.</returns>
    public GeneratorReading? Take(string topic, in TagMessage message, DateTimeOffset arrived, out string fault)
    {
        fault = "";
        if (!_byTopic.TryGetValue(topic, out Slot? slot)) fault = "no tag of this generator";
        else if (message.Unit is { } unit && unit != slot.Tag.Unit) fault = $"its unit is '{unit}', that of the tag '{slot.Tag.Unit}'";
        if (fault.Length > 0) return null;
        DateTimeOffset time = message.Time ?? arrived;

        // Until a second has ended, an earlier time brings its end back: the first message may have had the false clock.
        if (_end == DateTimeOffset.MinValue || (!_hasClosed && EndOf(time) < _end)) Begin(EndOf(time));
        slot!.Take(time, message.Value, _end);
        if (_byTopic.Values.Count(static tag => tag.Late >= SetBack) >= _witnesses) StartOver();
        return _byTopic.Values.Count(static tag => tag.IsAhead) >= _witnesses ? Close() : null;
    }

    private static DateTimeOffset EndOf(DateTimeOffset time) => new((time.UtcTicks / TimeSpan.TicksPerSecond * TimeSpan.TicksPerSecond) + TimeSpan.TicksPerSecond, TimeSpan.Zero);

    private Slot SlotOf(string topic, Tag tag)
    {
        if (!_byTopic.TryGetValue(topic, out Slot? slot)) _byTopic.Add(topic, slot = new(tag));
        else if (!slot.Tag.Equals(tag)) throw new SettingsException($"Tags '{slot.Tag}' and '{tag}' have one topic, {topic}.");
        return slot;
    }

    private void Begin(DateTimeOffset end)
    {
        _end = end;
        foreach (Slot slot in _byTopic.Values) slot.HoldBack(end);
    }

    private GeneratorReading Close()
    {
        _hasClosed = true;
        var passes = new PassReading[_formats.Length];
        for (int i = 0; i < passes.Length; i++) passes[i] = new(_end, null, null);
        foreach (Slot slot in _byTopic.Values)
        {
            double value = slot.At(_end, _hold);
            foreach ((int pass, PassSignal signal) in slot.Uses) passes[pass] = _formats[pass].Add(passes[pass], signal, value);
        }

        var reading = new GeneratorReading(_end, passes);

        // The last time that enough tags bear out; one that runs ahead of all others waits.
        DateTimeOffset reached = _byTopic.Values.Where(static slot => slot.IsAhead).Select(static slot => slot.NextTime).OrderDescending().ElementAt(_witnesses - 1);
        _end = EndOf(reached);
        foreach (Slot slot in _byTopic.Values) slot.MoveTo(_end);
        return reading;
    }

    private void StartOver()
    {
        foreach (Slot slot in _byTopic.Values) slot.Forget();
        (_end, _hasClosed) = (DateTimeOffset.MinValue, false);
    }

    private sealed class Slot(Tag tag)
    {
        private double _value = double.NaN, _next;
        private DateTimeOffset _time = DateTimeOffset.MinValue;
        private int _doubts;

        public Tag Tag { get; } = tag;

        public List<(int Pass, PassSignal Signal)> Uses { get; } = [];

        public bool IsAhead { get; private set; }

        public DateTimeOffset NextTime { get; private set; }

        public int Late { get; private set; }

        public void Take(DateTimeOffset time, double value, DateTimeOffset end)
        {
            Late = time < _time ? Late + 1 : 0;
            if (Late > 0) return;
            if (time < end)
            {
                (_value, _time) = (value, time);
                return;
            }

            // A value before the one that waits is out of order; a row of them says that the one that waits had a false clock.
            _doubts = IsAhead && time < NextTime ? _doubts + 1 : 0;
            if (_doubts is 0 or >= SetBack) (_next, NextTime, IsAhead, _doubts) = (value, time, true, 0);
        }

        /// <summary>Puts a value of later than an end behind it.</summary>
        public void HoldBack(DateTimeOffset end)
        {
            if (_time < end) return;
            if (!IsAhead) (_next, NextTime, IsAhead) = (_value, _time, true);
            (_value, _time) = (double.NaN, DateTimeOffset.MinValue);
        }

        public double At(DateTimeOffset end, TimeSpan hold) => end - _time <= hold ? _value : double.NaN;

        public void MoveTo(DateTimeOffset end)
        {
            if (IsAhead && NextTime < end) (_value, _time, IsAhead) = (_next, NextTime, false);
        }

        public void Forget() => (_value, _time, IsAhead, Late) = (double.NaN, DateTimeOffset.MinValue, false, 0);
    }
}
